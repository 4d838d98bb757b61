'use client';

import { useFormat } from '@/components/ui/locale';
import type { IntakeSheet } from './matching';

interface Props {
  sheets: readonly IntakeSheet[];
  chosen: readonly string[];
  onChange: (sheets: readonly string[]) => void;
}

/** Which sheet holds the list, or which several, where it goes on over more than one. */
export function SheetChoice({ sheets, chosen, onChange }: Props) {
  const format = useFormat();
  const toggle = (name: string, on: boolean) => {
    const next = sheets
      .map((sheet) => sheet.name)
      .filter((other) => (other === name ? on : chosen.includes(other)));
    if (next.length > 0) onChange(next);
  };
  return (
    <fieldset className="mb-3">
      <legend className="mb-1 font-semibold">Sheets that hold the list</legend>
      <div className="flex flex-wrap gap-x-5 gap-y-1">
        {sheets.map(({ name, rows, hidden }) => {
          const on = chosen.includes(name);
          const only = on && chosen.length === 1;
          return (
            <label key={name} className="flex min-h-6 items-center gap-2">
              <input
                type="checkbox"
                className="accent-cord"
                checked={on}
                onChange={(event) => toggle(name, event.target.checked)}
                aria-disabled={only || undefined}
              />
              <span>
                {name}
                <span className="text-slate">
                  {' '}
                  · {format.plural(rows, 'row', 'rows')}
                  {hidden && ' · hidden'}
                </span>
              </span>
            </label>
          );
        })}
      </div>
      <p className="mt-1 text-slate">
        The sheet shown below is the first of them. A list that goes on over several sheets has the same
        columns in each.
      </p>
    </fieldset>
  );
}
