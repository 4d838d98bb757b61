import { listProjects as query } from '@/db/queries/projects';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import type { ProjectView } from '@/lib/contract/project';
import { inOffice } from '@/lib/services/in-office';
import { projectViews } from './view';

/** A scheduler sees its contractor's; row-level security sees to it. */
export async function listProjects(ctx: OfficeContext): Promise<{ items: ProjectView[] }> {
  requirePermission(ctx, 'projects:read');
  return inOffice(ctx, async (tx) => ({ items: await projectViews(tx, await query(tx)) }));
}
