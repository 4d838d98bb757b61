import type { z } from 'zod';
import { isDuplicate } from '@/db/queries/duplicate';
import { findProject, updateProject as query, type ProjectChange } from '@/db/queries/projects';
import type { Tx } from '@/db/scope';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import { checked, Conflict } from '@/lib/contract/errors';
import { projectUpdate, type ProjectView } from '@/lib/contract/project';
import { found, idOf, inOffice } from '@/lib/services/in-office';
import { appendRecord } from '@/lib/services/record/append';
import { requireOrder, tidyCalendar } from './dates';
import { readProject } from './get';

/**
 * Changes what is named. Start, target and calendar move the dates of every revision; unit and hours hold for
 * those received from now on.
 */
export async function updateProject(
  ctx: OfficeContext,
  { path, body }: { path: { project: string }; body: z.input<typeof projectUpdate> },
): Promise<ProjectView> {
  requirePermission(ctx, 'projects:update');
  const id = idOf(path.project, 'project');
  const wanted = checked(projectUpdate, body);
  const change = toChange(wanted);
  return inOffice(ctx, async (tx) => {
    const { project } = found(await findProject(tx, id), 'project');
    const { start, targetFinish } = { ...project, ...change };
    requireOrder(start, targetFinish);
    const fields = Object.keys(wanted);
    if (fields.length > 0) {
      await write(tx, id, change);
      const data = { project: id, code: change.code ?? project.code, fields };
      await appendRecord(tx, ctx, { verb: 'project changed', data }, { submission: null });
    }
    return readProject(tx, id);
  });
}

function toChange({ calendar, ...plain }: z.output<typeof projectUpdate>): ProjectChange {
  return { ...plain, ...(calendar && tidyCalendar(calendar)) };
}

async function write(tx: Tx, id: string, change: ProjectChange): Promise<void> {
  try {
    await query(tx, id, change);
  } catch (error) {
    if (!isDuplicate(error, 'projects_office_code')) throw error;
    throw new Conflict(`There is a project with the code ${change.code} already.`);
  }
}
