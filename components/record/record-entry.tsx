import { DateText } from '@/components/ui/date-text';
import type { RecordEntryView } from '@/lib/contract/submission';

/** So much of a hash tells entries apart at a glance; the whole stands in the title. */
const SHORT = 12;

export function RecordEntry({ entry: { sequence, at, by, summary, hash } }: { entry: RecordEntryView }) {
  return (
    <li className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-4 border-b border-hair py-2 sm:grid-cols-[3rem_11rem_minmax(0,1fr)_auto]">
      <span className="text-right text-slate">
        <span className="sr-only">Entry </span>
        {sequence}
      </span>
      <span className="text-slate">
        <DateText value={at} time />
      </span>
      <span className="min-w-0 max-sm:col-start-2">
        <b className="font-semibold">{by}</b>
        <span className="text-slate"> · </span>
        {summary}
      </span>
      <code className="font-sans text-slate max-sm:col-start-2" title={hash}>
        <span className="sr-only">Hash </span>
        {hash.slice(0, SHORT)}
      </code>
    </li>
  );
}
