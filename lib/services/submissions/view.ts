import { countFindings } from '@/db/queries/projects';
import { countBelongings, type SubmissionRow } from '@/db/queries/submissions';
import type { Tx } from '@/db/scope';
import type { SubmissionView } from '@/lib/contract/submission';
import { countsOf, type FindingCounts } from './counts';
import { redated, type ProjectDates } from './figures';

export const SOMEBODY = 'Somebody no longer with us';

type Belongings = Awaited<ReturnType<typeof countBelongings>>;

export async function submissionViews(tx: Tx, rows: readonly SubmissionRow[]): Promise<SubmissionView[]> {
  const counts = await countFindings(
    tx,
    rows.map((row) => row.submission.id),
  );
  const views: SubmissionView[] = [];
  for (const row of rows) {
    const belongings = await countBelongings(tx, row.submission.id);
    views.push(toView(row, countsOf(counts, row.submission.id), belongings));
  }
  return views;
}

export async function submissionView(tx: Tx, row: SubmissionRow): Promise<SubmissionView> {
  const { id } = row.submission;
  return toView(row, countsOf(await countFindings(tx, [id]), id), await countBelongings(tx, id));
}

export function datesOf({ project }: SubmissionRow): ProjectDates {
  const { start, targetFinish, workingDays, holidays } = project;
  return { start, targetFinish, calendar: { workingDays, holidays } };
}

function toView(row: SubmissionRow, counts: FindingCounts, belongings: Belongings): SubmissionView {
  const { submission, contractor, receiver } = row;
  const { id, code, name, start, targetFinish, unit, hoursPerDay } = row.project;
  const { received, corrected, proposed } = submission.summary;
  const dates = datesOf(row);
  return {
    id: submission.id,
    project: { id, code, name, contractor, start, targetFinish, unit, hoursPerDay },
    revision: submission.revision,
    status: submission.status,
    receivedAt: submission.receivedAt.toISOString(),
    receivedBy: receiver?.name ?? SOMEBODY,
    file: { name: submission.fileName, sha256: submission.fileSha256, bytes: submission.fileBytes },
    rows: submission.rows.counts,
    refusedRows: [...submission.rows.refused],
    findings: counts.all,
    open: counts.open,
    ...belongings,
    figures: {
      received: redated(received, dates),
      corrected: redated(corrected, dates),
      proposed: proposed && redated(proposed, dates),
    },
    version: submission.version,
  };
}
