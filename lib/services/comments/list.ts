import { listComments as query } from '@/db/queries/comments';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import type { CommentView } from '@/lib/contract/submission';
import { idOf, inOffice } from '@/lib/services/in-office';
import { requireSubmission } from '@/lib/services/submissions/require';
import { commentView } from './view';

/** The oldest first; a scheduler sees the shared ones. */
export async function listComments(
  ctx: OfficeContext,
  { path }: { path: { submission: string } },
): Promise<{ items: CommentView[] }> {
  requirePermission(ctx, 'comments:read');
  const id = idOf(path.submission, 'submission');
  const rows = await inOffice(ctx, async (tx) => {
    await requireSubmission(tx, id);
    return query(tx, id);
  });
  return { items: rows.map(commentView) };
}
