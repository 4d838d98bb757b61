'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { useFormat } from '@/components/ui/locale';
import { Panel } from '@/components/ui/panel';
import { EmptyState, ErrorState, Loading } from '@/components/ui/states';
import { useRecord } from '@/lib/client/record';
import { RecordEntry } from './record-entry';

/** Entries shown at first, and added each time more are asked for. */
const PAGE = 100;

/** Who did what and when, the latest first. */
export function RecordPage({ office, submission }: { office: string; submission: string }) {
  const { data: entries, error, refetch } = useRecord(office, submission);
  const format = useFormat();
  const [shown, setShown] = useState(PAGE);
  if (error && !entries) {
    return <ErrorState error={error} retry={() => void refetch()} title="The record could not be fetched" />;
  }
  if (!entries) return <Loading label="Fetching the record" rows={6} />;
  if (entries.length === 0) {
    return (
      <EmptyState title="Nothing is on the record yet">
        What is done with this submission will stand here: who did it, when, and what it was.
      </EmptyState>
    );
  }
  return (
    <Panel
      title={`${format.plural(entries.length, 'entry', 'entries')}, the latest first`}
      sub="Entries are only ever added. Each is sealed with a hash over itself and the hash of the one before, so that a later change to any of them would show."
    >
      <ol className="border-t border-ink">
        {entries.slice(0, shown).map((entry) => (
          <RecordEntry key={entry.sequence} entry={entry} />
        ))}
      </ol>
      {entries.length > shown && (
        <Button variant="ghost" className="mt-3" onClick={() => setShown(shown + PAGE)}>
          Show {format.count(Math.min(PAGE, entries.length - shown))} older ones
        </Button>
      )}
    </Panel>
  );
}
