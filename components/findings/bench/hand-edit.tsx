'use client';

import { useState, type FormEvent, type Ref } from 'react';
import { Button } from '@/components/ui/button';
import { Field, Input } from '@/components/ui/field';
import type { HandEdit } from '@/lib/client/corrections';
import type { SheetRowsView } from '@/lib/contract/sheet-rows';
import { handProblem, handValue } from '../hand-value';
import { columnTitle, currentText } from './sheet-cells';

interface HandEditFormProps {
  sheet: string;
  cells: readonly string[];
  piece: SheetRowsView;
  /** By address, what is typed so far; kept while one looks at another finding. */
  typed: ReadonlyMap<string, string>;
  onType: (cell: string, text: string) => void;
  onSend: (edits: HandEdit[]) => void;
  busy: boolean;
  first: Ref<HTMLInputElement>;
}

/** New values for single cells, each beside what stands there now. */
export function HandEditForm(props: HandEditFormProps) {
  const { sheet, cells, piece, typed, onType, onSend, busy, first } = props;
  const [problems, setProblems] = useState<ReadonlyMap<string, string>>(new Map());

  const send = (event: FormEvent) => {
    event.preventDefault();
    if (busy) return;
    const changed = cells.filter((cell) => typed.has(cell) && typed.get(cell) !== currentText(piece, cell));
    const found = new Map<string, string>();
    const edits = changed.map((cell) => {
      const text = typed.get(cell) ?? '';
      const from = contentOf(currentText(piece, cell));
      const problem = handProblem(text, from);
      if (problem) found.set(cell, problem);
      return { sheet, cell, to: handValue(text, from) };
    });
    const [only] = cells;
    if (edits.length === 0 && only) found.set(only, 'Type another value first.');
    setProblems(found);
    if (found.size === 0) onSend(edits);
  };

  return (
    <form onSubmit={send} className="flex flex-col gap-3" noValidate>
      {cells.map((cell, index) => {
        const current = currentText(piece, cell) ?? '';
        return (
          <Field
            key={cell}
            required
            label={`${cell} ${columnTitle(piece, cell) ?? ''}`}
            hint={current === '' ? 'It is empty now.' : `It holds ${current} now.`}
            error={problems.get(cell)}
          >
            {(aria) => (
              <Input
                {...aria}
                ref={index === 0 ? first : undefined}
                value={typed.get(cell) ?? current}
                onChange={(event) => onType(cell, event.target.value)}
                autoComplete="off"
                spellCheck={false}
              />
            )}
          </Field>
        );
      })}
      <Button type="submit" busy={busy} className="self-start">
        {busy ? 'Writing …' : 'Write this by hand'}
      </Button>
    </form>
  );
}

/** The sheet shows texts; what looks like a plain number was one. */
function contentOf(text: string | undefined): string | number | null {
  if (text === undefined || text === '') return null;
  return /^-?\d+(\.\d+)?$/.test(text) && String(Number(text)) === text ? Number(text) : text;
}
