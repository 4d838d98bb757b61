import { listRecord } from '@/db/queries/record';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import type { RecordEntryView } from '@/lib/contract/submission';
import { idOf, inOffice } from '@/lib/services/in-office';
import { requireSubmission } from '@/lib/services/submissions/require';
import { recordSentence } from './sentence';

/** In order; a scheduler sees the entries that are not about what was said inside the office. */
export async function getRecord(
  ctx: OfficeContext,
  { path }: { path: { submission: string } },
): Promise<{ items: RecordEntryView[] }> {
  requirePermission(ctx, 'record:read');
  const id = idOf(path.submission, 'submission');
  const rows = await inOffice(ctx, async (tx) => {
    await requireSubmission(tx, id);
    return listRecord(tx, id);
  });
  const items = rows.map(({ sequence, at, by, verb, data, hash }) => ({
    sequence,
    at: at.toISOString(),
    by,
    verb,
    summary: recordSentence(verb, data),
    hash,
  }));
  return { items };
}
