'use client';

import { Popover } from 'radix-ui';
import { DateText } from '@/components/ui/date-text';
import { useFormat } from '@/components/ui/locale';
import { StateWord } from '@/components/ui/state-word';
import type { SubmissionView } from '@/lib/contract/submission';
import { BlockedNotice } from './blocked-notice';
import { HeadFigures } from './head-figures';
import { rowsSentence } from './rows-sentence';

/** What every page of a submission begins with: which one it is, how its rows were read, and its three figures. */
export function SubmissionHead({ office, view }: { office: string; view: SubmissionView }) {
  const { locale } = useFormat();
  return (
    <header className="mb-4 border-b border-hair pb-4">
      <div className="flex flex-wrap items-start justify-between gap-x-7 gap-y-4">
        <div className="min-w-0">
          <h1 className="text-lg font-semibold">
            {view.project.name}, Rev {view.revision}
          </h1>
          <p className="mt-1 text-slate">
            <StateWord state={view.status} capital /> · from {view.project.contractor.name}, received{' '}
            <DateText value={view.receivedAt} />
          </p>
          <p className="text-slate">
            {rowsSentence(view.rows, locale)}
            {view.refusedRows.length > 0 && <RefusedRows rows={view.refusedRows} />}
          </p>
        </div>
        <HeadFigures office={office} view={view} />
      </div>
      {!view.figures.corrected.computable && <BlockedNotice office={office} view={view} />}
    </header>
  );
}

function RefusedRows({ rows }: { rows: SubmissionView['refusedRows'] }) {
  return (
    <>
      {' · '}
      <Popover.Root>
        <Popover.Trigger className="worked text-ink hover:border-solid">which were refused</Popover.Trigger>
        <Popover.Portal>
          <Popover.Content
            sideOffset={6}
            collisionPadding={12}
            aria-label="Refused rows"
            className="z-40 max-h-80 w-96 max-w-[calc(100vw-24px)] overflow-auto border border-t-2 border-hair border-t-ink bg-leaf p-4 shadow-lift"
          >
            <ul className="flex flex-col gap-2">
              {rows.map(({ sheet, row, reason }) => (
                <li key={`${sheet} ${String(row)}`}>
                  <span className="font-semibold">
                    {sheet}, row {row}.
                  </span>{' '}
                  {reason}
                </li>
              ))}
            </ul>
          </Popover.Content>
        </Popover.Portal>
      </Popover.Root>
    </>
  );
}
