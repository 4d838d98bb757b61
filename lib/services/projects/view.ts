import { countFindings, listLatest, type ProjectRow } from '@/db/queries/projects';
import type { Tx } from '@/db/scope';
import type { ProjectView } from '@/lib/contract/project';
import { countsOf } from '@/lib/services/submissions/counts';
import { redated, type ProjectDates } from '@/lib/services/submissions/figures';

export function datesOfProject({ project }: ProjectRow): ProjectDates {
  const { start, targetFinish, workingDays, holidays } = project;
  return { start, targetFinish, calendar: { workingDays, holidays } };
}

/** Each with its latest revision. */
export async function projectViews(tx: Tx, rows: readonly ProjectRow[]): Promise<ProjectView[]> {
  const latest = await listLatest(
    tx,
    rows.map((row) => row.project.id),
  );
  const counts = await countFindings(
    tx,
    latest.map((submission) => submission.id),
  );
  const byProject = new Map(latest.map((submission) => [submission.project, submission]));
  return rows.map((row) => {
    const { workingDays, holidays, ...project } = row.project;
    const submission = byProject.get(project.id);
    return {
      ...project,
      contractor: row.contractor,
      calendar: { workingDays, holidays },
      latest: submission
        ? {
            id: submission.id,
            revision: submission.revision,
            status: submission.status,
            receivedAt: submission.receivedAt.toISOString(),
            open: countsOf(counts, submission.id).open,
            figures: redated(submission.summary.corrected, datesOfProject(row)),
          }
        : null,
    };
  });
}
