'use client';

import Link from 'next/link';
import { useState } from 'react';
import { useOfficeView } from '@/components/shell/office-context';
import { Button } from '@/components/ui/button';
import { useFormat } from '@/components/ui/locale';
import { Panel } from '@/components/ui/panel';
import { columnLetters } from '@/lib/schedule/cell';
import { FIELDS, type Field } from '@/lib/schedule/field';
import { assign, choiceOf, obstacles, shownSheet } from './matching';
import { SampleTable } from './sample-table';
import { SheetChoice } from './sheet-choice';
import { SheetTable } from './sheet-table';
import type { Stage, useIntake } from './use-intake';

interface Props {
  stage: Extract<Stage, { at: 'matching' }>;
  intake: ReturnType<typeof useIntake>;
}

/** The sheet as detected, with what each column holds above it; below, the first rows as they will be read. */
export function MatchingStage({ stage, intake }: Props) {
  const { file, view, draft } = stage;
  const [said, setSaid] = useState('');
  const shown = shownSheet(view, draft.sheets);
  const format = useFormat();

  const setField = (column: number, field: Field | null) => {
    const { draft: next, from } = assign(draft, column, field);
    setSaid(field && from !== null ? moved(field, from, column) : '');
    void intake.change(file, view, next, choiceOf(next));
  };
  const setHeader = (headerRow: number) => {
    setSaid('');
    void intake.change(file, view, { ...draft, headerRow }, { sheets: draft.sheets, headerRow });
  };
  const setSheets = (sheets: readonly string[]) => {
    setSaid('');
    void intake.change(file, view, { ...draft, sheets }, { sheets });
  };

  return (
    <div className="flex flex-col gap-5">
      <Standing stage={stage} intake={intake} />
      <Panel
        title="How the sheet is read"
        sub={`${file.name}, ${format.bytes(file.size)}${shown ? `. ${format.plural(shown.rows, 'row', 'rows')} below the header.` : ''}`}
        bench
      >
        {view.sheets.length > 1 && (
          <SheetChoice sheets={view.sheets} chosen={draft.sheets} onChange={setSheets} />
        )}
        <p role="status" className="min-h-5 text-slate">
          {said || (stage.rereading ? 'Reading it anew …' : '')}
        </p>
        {shown && (
          <SheetTable view={view} sheet={shown} draft={draft} onField={setField} onHeader={setHeader} />
        )}
      </Panel>
      <Panel
        title="The first rows, as they will be read"
        sub={stage.rereading ? 'Reading it anew …' : undefined}
      >
        <SampleTable sample={view.sample} stale={stage.rereading} />
      </Panel>
    </div>
  );
}

/** What stands in the way, what went wrong, and the button that hands the list in. */
function Standing({ stage, intake }: Props) {
  const { file, view, draft, rereading, trouble } = stage;
  const { slug } = useOfficeView();
  const missing = obstacles(draft);
  return (
    <div className="border border-l-4 border-hair border-l-cord bg-leaf p-4">
      {trouble && (
        <p role="alert" className="mb-3 border-l-4 border-umber py-1 pl-3 font-semibold">
          {trouble.sentence}{' '}
          {trouble.existing && (
            <Link href={`/${slug}/submissions/${trouble.existing.id}`}>
              Go to Rev {trouble.existing.revision}
            </Link>
          )}
        </p>
      )}
      <Question missing={missing} doubts={rereading ? [] : view.problems} />
      <div className="mt-3 flex flex-wrap gap-2">
        <Button
          disabled={missing.length > 0}
          busy={rereading}
          onClick={() =>
            void intake.send(file, view, draft, { straight: false, again: Boolean(trouble?.existing) })
          }
        >
          {trouble?.existing ? 'Hand it in all the same' : 'Hand it in'}
        </Button>
        <Button variant="quiet" onClick={intake.cancel}>
          Take another file
        </Button>
      </div>
    </div>
  );
}

/** What must be settled; else what was in doubt and now stands as it is left; else whether all of it is right. */
function Question({ missing, doubts }: { missing: readonly string[]; doubts: readonly string[] }) {
  if (missing.length > 0) {
    return (
      <>
        <p className="text-base font-semibold">Some columns are still to be settled</p>
        <Sentences of={missing} />
      </>
    );
  }
  if (doubts.length > 0) {
    return (
      <>
        <p className="text-base font-semibold">Are the columns right? They could not be told for sure.</p>
        <Sentences of={doubts} />
        <p className="text-slate">The list is read with what you leave above the columns.</p>
      </>
    );
  }
  return (
    <>
      <p className="text-base font-semibold">Is this how the list is meant?</p>
      <p className="max-w-prose text-slate">
        Check the columns and the rows below. Handing it in makes a revision; the file itself is kept as it
        came.
      </p>
    </>
  );
}

function Sentences({ of }: { of: readonly string[] }) {
  return (
    <ul className="mt-1 max-w-prose list-inside list-['–_']">
      {of.map((sentence) => (
        <li key={sentence}>{sentence}</li>
      ))}
    </ul>
  );
}

function moved(field: Field, from: number, to: number): string {
  return `${FIELDS[field]} was in column ${columnLetters(from)}; it is now in column ${columnLetters(to)}.`;
}
