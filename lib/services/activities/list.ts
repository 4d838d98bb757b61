import type { z } from 'zod';
import { listActivities as query } from '@/db/queries/activities';
import type { Tx } from '@/db/scope';
import type { SubmissionRow } from '@/db/queries/submissions';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import { checked } from '@/lib/contract/errors';
import { activitiesQuery, type ActivityView } from '@/lib/contract/submission';
import type { ScheduleState } from '@/lib/schedule/weight';
import { idOf, inOffice } from '@/lib/services/in-office';
import { loadState } from '@/lib/services/schedule/load';
import { requireSubmission } from '@/lib/services/submissions/require';
import { listedActivities, type ListedActivity } from './view';

/** The activities in a state of the schedule: as received from where they are kept, else as computed. */
export async function listActivities(
  ctx: OfficeContext,
  { path, query: sent }: { path: { submission: string }; query: z.input<typeof activitiesQuery> },
): Promise<{ items: ActivityView[] }> {
  requirePermission(ctx, 'submissions:read');
  const id = idOf(path.submission, 'submission');
  const { state } = checked(activitiesQuery, sent);
  const rows = await inOffice(ctx, async (tx) => {
    const { submission } = await requireSubmission(tx, id);
    return activitiesIn(tx, submission, state);
  });
  return { items: rows.map(toView) };
}

async function activitiesIn(
  tx: Tx,
  submission: SubmissionRow['submission'],
  state: ScheduleState,
): Promise<readonly ListedActivity[]> {
  if (state === 'received') return query(tx, submission.id);
  return listedActivities((await loadState(tx, submission, state)).list);
}

function toView({ data, ...activity }: ListedActivity): ActivityView {
  const { predecessors, cells, ...estimates } = data;
  return { ...activity, ...estimates, predecessors: [...predecessors], cells: { ...cells } };
}
