import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import type { FindingView } from '@/lib/contract/submission';
import { idOf, inOffice } from '@/lib/services/in-office';
import { requireSubmission } from '@/lib/services/submissions/require';
import { findingViews } from './view';

export async function listFindings(
  ctx: OfficeContext,
  { path }: { path: { submission: string } },
): Promise<{ items: FindingView[] }> {
  requirePermission(ctx, 'submissions:read');
  const id = idOf(path.submission, 'submission');
  return inOffice(ctx, async (tx) => {
    await requireSubmission(tx, id);
    return { items: await findingViews(tx, id) };
  });
}
