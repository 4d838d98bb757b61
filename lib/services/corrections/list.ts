import { listCorrections as query } from '@/db/queries/corrections';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import type { CorrectionView } from '@/lib/contract/submission';
import { idOf, inOffice } from '@/lib/services/in-office';
import { requireSubmission } from '@/lib/services/submissions/require';
import { correctionView } from './view';

/** Those that hold, in the order in which they are applied. */
export async function listCorrections(
  ctx: OfficeContext,
  { path }: { path: { submission: string } },
): Promise<{ items: CorrectionView[] }> {
  requirePermission(ctx, 'submissions:read');
  const id = idOf(path.submission, 'submission');
  const rows = await inOffice(ctx, async (tx) => {
    await requireSubmission(tx, id);
    return query(tx, id);
  });
  return { items: rows.map(correctionView) };
}
