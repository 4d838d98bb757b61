'use client';

import { DateText } from '@/components/ui/date-text';
import { useFormat } from '@/components/ui/locale';
import { Table, Td, Th } from '@/components/ui/table';
import type { Nearby } from './nearby';

/** Week by week around the day asked about. */
export function NearbyTable({ rows, asked }: { rows: readonly Nearby[]; asked: number }) {
  const format = useFormat();
  return (
    <Table label="Chance week by week">
      <thead>
        <tr>
          <Th numeric>working days</Th>
          <Th>by the end of</Th>
          <Th numeric>finished</Th>
          <Th numeric>later</Th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={row.days} className={row.days === asked ? 'bg-tint font-semibold' : undefined}>
            <Td numeric>{format.number(row.days, 1)}</Td>
            <Td>
              <DateText value={row.date} />
            </Td>
            <Td numeric>{format.number(row.before, 4)}</Td>
            <Td numeric>{format.number(1 - row.before, 4)}</Td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}
