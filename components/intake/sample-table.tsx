'use client';

import { classes } from '@/components/ui/classes';
import { useFormat } from '@/components/ui/locale';
import { Table, Td, Th } from '@/components/ui/table';
import type { IntakeView } from '@/lib/contract/intake';

type Row = IntakeView['sample'][number];

const KINDS: Record<Row['kind'], string> = {
  activity: 'activity',
  heading: 'heading',
  continued: 'goes on from above',
  blank: 'blank',
  note: 'note',
  refused: 'cannot be read',
};

/** What becomes of the first rows; durations in working days. */
export function SampleTable({ sample, stale }: { sample: readonly Row[]; stale: boolean }) {
  const format = useFormat();
  if (sample.length === 0) {
    return <p className="text-slate">No row can be read yet. Set the header row and the columns above.</p>;
  }
  const days = (value: number | null) => (value === null ? '' : format.days(value));
  return (
    <div aria-busy={stale} className={stale ? 'opacity-60' : ''}>
      <Table label="Table of the first rows">
        <thead>
          <tr>
            <Th numeric>Row</Th>
            <Th className="whitespace-nowrap">Read as</Th>
            <Th>ID</Th>
            <Th className="w-full">Name</Th>
            <Th numeric>a</Th>
            <Th numeric>m</Th>
            <Th numeric>b</Th>
            <Th className="whitespace-nowrap">Waits for</Th>
          </tr>
        </thead>
        <tbody>
          {sample.map((row) => (
            <tr key={row.row}>
              <Td numeric className="text-slate">
                {row.row}
              </Td>
              <Td
                className={classes(
                  row.kind === 'refused' && 'font-semibold text-umber',
                  row.reason ? 'min-w-60' : 'whitespace-nowrap',
                )}
              >
                {KINDS[row.kind]}
                {row.reason && <span className="block font-normal text-slate">{row.reason}</span>}
              </Td>
              <Td className="font-semibold whitespace-nowrap">{row.id}</Td>
              <Td className="min-w-40">{row.name}</Td>
              <Td numeric>{days(row.optimistic)}</Td>
              <Td numeric>{days(row.likely)}</Td>
              <Td numeric>{days(row.pessimistic)}</Td>
              <Td>{row.predecessors}</Td>
            </tr>
          ))}
        </tbody>
      </Table>
    </div>
  );
}
