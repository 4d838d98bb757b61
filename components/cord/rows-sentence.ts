import type { SubmissionView } from '@/lib/contract/submission';
import { formatCount, plural } from '@/lib/client/format';

type Rows = SubmissionView['rows'];

/** What a row can be, in one and in many. */
const KINDS: readonly (readonly [Exclude<keyof Rows, 'read'>, string, string])[] = [
  ['activities', 'activity', 'activities'],
  ['headings', 'heading', 'headings'],
  ['continued', 'continued', 'continued'],
  ['blank', 'blank', 'blank'],
  ['notes', 'note', 'notes'],
  ['refused', 'refused', 'refused'],
];

/** "214 rows read = 196 activities + 15 headings + 3 blank + 0 refused": each kind there is, and always the refused. */
export function rowsSentence(rows: Rows, locale: string): string {
  const parts = KINDS.filter(([kind]) => rows[kind] > 0 || kind === 'activities' || kind === 'refused').map(
    ([kind, one, many]) => plural(rows[kind], one, many, locale),
  );
  const read = `${formatCount(rows.read, locale)} ${rows.read === 1 ? 'row' : 'rows'} read`;
  return `${read} = ${parts.join(' + ')}`;
}
