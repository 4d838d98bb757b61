import { findProject } from '@/db/queries/projects';
import type { Tx } from '@/db/scope';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import type { ProjectView } from '@/lib/contract/project';
import { found, idOf, inOffice } from '@/lib/services/in-office';
import { projectViews } from './view';

export async function getProject(
  ctx: OfficeContext,
  { path }: { path: { project: string } },
): Promise<ProjectView> {
  requirePermission(ctx, 'projects:read');
  const id = idOf(path.project, 'project');
  return inOffice(ctx, (tx) => readProject(tx, id));
}

export async function readProject(tx: Tx, id: string): Promise<ProjectView> {
  const row = found(await findProject(tx, id), 'project');
  const [view] = await projectViews(tx, [row]);
  return found(view, 'project');
}
