import { countComments } from '@/db/queries/comments';
import { listCorrections, type CorrectionRow } from '@/db/queries/corrections';
import { listFindings, type FindingRow } from '@/db/queries/findings';
import { listFixes, type FixRow } from '@/db/queries/fixes';
import { lockSubmission, type SubmissionRow } from '@/db/queries/submissions';
import type { Tx } from '@/db/scope';
import type { OfficeContext } from '@/lib/access/context';
import { Conflict } from '@/lib/contract/errors';
import type { Sheet } from '@/lib/schedule/sheet';
import { found, inOffice } from '@/lib/services/in-office';
import { loadState, receivedSheets } from '@/lib/services/schedule/load';
import type { ReadState } from '@/lib/services/schedule/state';
import { requireSubmission } from '@/lib/services/submissions/require';

/** All that a change of a submission starts from, as of one version. */
export interface Standing {
  readonly row: SubmissionRow;
  readonly received: readonly Sheet[];
  readonly corrected: ReadState;
  readonly findings: readonly FindingRow[];
  readonly fixes: readonly FixRow[];
  readonly corrections: readonly CorrectionRow[];
  readonly commented: ReadonlySet<string>;
}

/** Reads the version first: whatever changes meanwhile makes `claim` refuse. */
export async function readStanding(
  ctx: OfficeContext,
  id: string,
  version: number | undefined,
): Promise<Standing> {
  return inOffice(ctx, async (tx) => {
    const row = await requireSubmission(tx, id);
    requireChangeable(row.submission, version);
    return {
      row,
      received: await receivedSheets(tx, row.submission),
      corrected: await loadState(tx, row.submission, 'corrected'),
      findings: await listFindings(tx, id),
      fixes: await listFixes(tx, id),
      corrections: await listCorrections(tx, id),
      commented: new Set((await countComments(tx, id)).keys()),
    };
  });
}

/** Locks the submission for the rest of the transaction; refuses where it is no longer as it was read. */
export async function claim(tx: Tx, { row }: Standing): Promise<void> {
  const now = found(await lockSubmission(tx, row.submission.id), 'submission');
  requireChangeable(now, row.submission.version);
}

function requireChangeable(
  { status, version }: Pick<SubmissionRow['submission'], 'status' | 'version'>,
  expected: number | undefined,
): void {
  if (status === 'accepted' || status === 'superseded') {
    throw new Conflict(
      status === 'accepted'
        ? 'This revision is accepted, so it is corrected no more.'
        : 'A later revision has superseded this one, so it is corrected no more.',
    );
  }
  if (expected !== undefined && expected !== version) {
    throw new Conflict(
      'Someone else changed this submission first. Look at what is there now, and try again.',
      {
        members: { version },
      },
    );
  }
}
