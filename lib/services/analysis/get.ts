import type { z } from 'zod';
import { listFindingIds } from '@/db/queries/findings';
import type { Tx } from '@/db/scope';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import { checked } from '@/lib/contract/errors';
import { analysisQuery, type AnalysisView } from '@/lib/contract/submission';
import { idOf, inOffice } from '@/lib/services/in-office';
import { loadState } from '@/lib/services/schedule/load';
import { blockingOf, computed, loopsOf, type ReadState } from '@/lib/services/schedule/state';
import { requireSubmission } from '@/lib/services/submissions/require';
import { datesOf } from '@/lib/services/submissions/view';
import { analysisView } from './view';

/** The recomputed network in a state of the schedule, or what stands in its way. */
export async function getAnalysis(
  ctx: OfficeContext,
  { path, query }: { path: { submission: string }; query: z.input<typeof analysisQuery> },
): Promise<AnalysisView> {
  requirePermission(ctx, 'submissions:read');
  const id = idOf(path.submission, 'submission');
  const { state } = checked(analysisQuery, query);
  return inOffice(ctx, async (tx) => {
    const row = await requireSubmission(tx, id);
    const read = await loadState(tx, row.submission, state);
    const analysis = computed(read);
    if (analysis) return analysisView(state, read.list, analysis, datesOf(row));
    return { computable: false, state, loops: loopsOf(read), because: await because(tx, id, read) };
  });
}

/** Ids of the findings in the way; of a proposed state those that are known by their key. */
export function because(tx: Tx, id: string, read: ReadState): Promise<string[]> {
  return listFindingIds(
    tx,
    id,
    blockingOf(read).map(({ key }) => key),
  );
}
