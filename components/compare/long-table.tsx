'use client';

import { useState, type ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import { useFormat } from '@/components/ui/locale';
import { Table, Th } from '@/components/ui/table';

const PAGE = 100;

interface LongTableProps<T> {
  label: string;
  head: readonly string[];
  rows: readonly T[];
  row: (entry: T) => ReactNode;
}

/** A table that begins with a hundred rows and shows more when asked. */
export function LongTable<T>({ label, head, rows, row }: LongTableProps<T>) {
  const format = useFormat();
  const [shown, setShown] = useState(PAGE);
  return (
    <>
      <Table label={label}>
        <thead>
          <tr>
            {head.map((name) => (
              <Th key={name}>{name}</Th>
            ))}
          </tr>
        </thead>
        <tbody>{rows.slice(0, shown).map(row)}</tbody>
      </Table>
      {rows.length > shown && (
        <Button variant="ghost" className="mt-3" onClick={() => setShown(shown + PAGE)}>
          Show {format.count(Math.min(PAGE, rows.length - shown))} more of {format.count(rows.length)}
        </Button>
      )}
    </>
  );
}
