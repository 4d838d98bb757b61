import { findProject } from '@/db/queries/projects';
import { listSubmissions as query } from '@/db/queries/submissions';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import type { SubmissionView } from '@/lib/contract/submission';
import { found, idOf, inOffice } from '@/lib/services/in-office';
import { submissionViews } from './view';

/** The revisions of a project, the first one first. */
export async function listSubmissions(
  ctx: OfficeContext,
  { path }: { path: { project: string } },
): Promise<{ items: SubmissionView[] }> {
  requirePermission(ctx, 'submissions:read');
  const project = idOf(path.project, 'project');
  return inOffice(ctx, async (tx) => {
    found(await findProject(tx, project), 'project');
    return { items: await submissionViews(tx, await query(tx, project)) };
  });
}
