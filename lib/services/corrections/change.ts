import { notify } from '@/db/listen';
import { deleteFindings, insertFindings, updateFindings } from '@/db/queries/findings';
import { deleteFixes, insertFixes, updateFixes } from '@/db/queries/fixes';
import { updateSubmission } from '@/db/queries/submissions';
import type { SubmissionSummary } from '@/db/schema/submissions';
import type { Tx } from '@/db/scope';
import type { OfficeContext } from '@/lib/access/context';
import type { Sheet } from '@/lib/schedule/sheet';
import type { CorrectionResult } from '@/lib/contract/submission';
import { reconcile, type Reconciliation } from '@/lib/services/findings/reconcile';
import { draftFindings } from '@/lib/services/findings/rows';
import { findingViews } from '@/lib/services/findings/view';
import { readState, type ReadState } from '@/lib/services/schedule/state';
import { correctedFigures } from '@/lib/services/submissions/figures';
import { requireSubmission } from '@/lib/services/submissions/require';
import { datesOf, submissionView } from '@/lib/services/submissions/view';
import { recalculate } from '@/parsers/workbook';
import type { Standing } from './standing';

/** What changed cells come to: the list read, audited and computed anew, and what has to be written. */
export interface Change {
  readonly corrected: ReadState;
  readonly reconciliation: Reconciliation;
  readonly summary: SubmissionSummary;
}

/** The corrections that will hold: by fix and finding. */
interface Holding {
  readonly fix: string | null;
  readonly finding: string | null;
}

/** Pure but for the ids of new findings. */
export async function workOutChange(
  ctx: OfficeContext,
  standing: Standing,
  sheets: readonly Sheet[],
  holding: readonly Holding[],
): Promise<Change> {
  const { submission } = standing.row;
  const corrected = await readState(recalculate(standing.received, sheets).sheets, submission);
  const reconciliation = reconcile(
    {
      findings: standing.findings,
      fixes: standing.fixes,
      adopted: new Set(holding.flatMap(({ fix }) => (fix ? [fix] : []))),
      needed: neededFindings(ctx, standing, holding),
    },
    draftFindings(corrected),
  );
  const figures = await correctedFigures(
    corrected,
    submission,
    reconciliation.declined,
    datesOf(standing.row),
  );
  return { corrected, reconciliation, summary: { ...submission.summary, ...figures } };
}

/** A scheduler cannot know what was said about a finding inside the office, so it erases none. */
function neededFindings(
  ctx: OfficeContext,
  { findings, commented }: Standing,
  holding: readonly Holding[],
): Set<string> {
  if (ctx.contractor !== null) return new Set(findings.map(({ id }) => id));
  return new Set([...commented, ...holding.flatMap(({ finding }) => (finding ? [finding] : []))]);
}

/** Writes the change and gives the submission's new version. Locked by `claim` before. */
export async function writeChange(
  tx: Tx,
  ctx: OfficeContext,
  { row }: Standing,
  { reconciliation, summary }: Pick<Change, 'reconciliation' | 'summary'>,
): Promise<number> {
  const { id, status } = row.submission;
  const { findings, fixes } = reconciliation;
  await deleteFixes(tx, id, fixes.erase);
  await deleteFindings(tx, id, findings.erase);
  await updateFindings(tx, findings.update);
  await insertFindings(tx, ctx.office.id, id, findings.insert);
  await updateFixes(tx, fixes.update);
  await insertFixes(tx, ctx.office.id, id, fixes.insert);
  // Received is not reviewed: it is under review once somebody of the office works on it.
  const underReview = status === 'received' && ctx.contractor === null;
  return updateSubmission(tx, id, { summary, ...(underReview && { status: 'under review' as const }) });
}

/** Tells those who listen, and the asker what came of it. */
export async function announce(
  tx: Tx,
  { row }: Standing,
  { reconciliation }: Pick<Change, 'reconciliation'>,
  event: { kind: 'correction' | 'fix'; id: string },
  parts: Pick<CorrectionResult, 'batch' | 'items' | 'skipped' | 'inapplicable' | 'version'>,
): Promise<CorrectionResult> {
  const { id } = row.submission;
  await notify(tx, id, { ...event, version: parts.version });
  return {
    ...parts,
    submission: await submissionView(tx, await requireSubmission(tx, id)),
    changed: await findingViews(tx, id, reconciliation.changed),
    gone: reconciliation.findings.erase,
  };
}
