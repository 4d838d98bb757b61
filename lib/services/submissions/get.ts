import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import type { SubmissionView } from '@/lib/contract/submission';
import { idOf, inOffice } from '@/lib/services/in-office';
import { requireSubmission } from './require';
import { submissionView } from './view';

export async function getSubmission(
  ctx: OfficeContext,
  { path }: { path: { submission: string } },
): Promise<SubmissionView> {
  requirePermission(ctx, 'submissions:read');
  const id = idOf(path.submission, 'submission');
  return inOffice(ctx, async (tx) => submissionView(tx, await requireSubmission(tx, id)));
}
