import { notify } from '@/db/listen';
import { insertActivities } from '@/db/queries/activities';
import { insertFindings, type NewFinding } from '@/db/queries/findings';
import { insertFixes, type FixValues } from '@/db/queries/fixes';
import { findLatest, lockProject, supersedeEarlier } from '@/db/queries/submissions';
import type { Tx } from '@/db/scope';
import type { OfficeContext } from '@/lib/access/context';
import { Conflict } from '@/lib/contract/errors';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { listedActivities } from '@/lib/services/activities/view';
import { appendRecord } from '@/lib/services/record/append';

/** What the sender knew of the latest revision, and says of a file that is the same. */
interface Repeat {
  readonly arrived: Date;
  readonly seen: { readonly id: string } | null;
  /** `true`: it is meant; `false`: it is not; else it is taken to be, unless it is a second click. */
  readonly again: string | undefined;
}

/**
 * The number of the next revision, for which this transaction alone holds the project from here on. The very
 * file that came last is refused where it came while this one was on its way, which is a second click.
 */
export async function nextRevision(tx: Tx, project: string, sha256: string, repeat: Repeat): Promise<number> {
  await lockProject(tx, project);
  const latest = await findLatest(tx, project);
  if (!latest) return 0;
  const cameMeanwhile = latest.id !== repeat.seen?.id || latest.receivedAt >= repeat.arrived;
  const isUnmeant = repeat.again === 'false' || (repeat.again !== 'true' && cameMeanwhile);
  if (latest.fileSha256 === sha256 && isUnmeant) {
    throw new Conflict(`This very file is already Rev ${latest.revision}.`, {
      members: { submission: latest.id, revision: latest.revision },
    });
  }
  return latest.revision + 1;
}

interface FirstAudit {
  readonly findings: readonly NewFinding[];
  readonly fixes: readonly FixValues[];
}

/** The activities as received, and what the audit found. */
export async function storeList(
  tx: Tx,
  { office }: OfficeContext,
  submission: string,
  list: ActivityList,
  { findings, fixes }: FirstAudit,
): Promise<void> {
  const rows = listedActivities(list).map(({ id, ...activity }, position) => ({
    ...activity,
    position,
    activity_id: id,
  }));
  await insertActivities(tx, office.id, submission, rows);
  await insertFindings(tx, office.id, submission, findings);
  await insertFixes(tx, office.id, submission, fixes);
}

export async function recordReceived(
  tx: Tx,
  ctx: OfficeContext,
  submission: string,
  data: { revision: number; file: string; sha256: string; findings: number },
): Promise<void> {
  await appendRecord(tx, ctx, { verb: 'submission received', data }, { submission });
}

/** Earlier revisions that nobody decided on give way to the new one. */
export async function supersede(
  tx: Tx,
  ctx: OfficeContext,
  project: string,
  latest: string,
  revision: number,
): Promise<void> {
  for (const earlier of await supersedeEarlier(tx, project, latest)) {
    await appendRecord(
      tx,
      ctx,
      { verb: 'submission superseded', data: { revision } },
      { submission: earlier.id },
    );
    await notify(tx, earlier.id, { kind: 'status', version: earlier.version });
  }
}
