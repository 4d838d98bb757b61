import type { z } from 'zod';
import { findContractor } from '@/db/queries/contractors';
import { insertProject } from '@/db/queries/projects';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import { checked, Conflict, Invalid } from '@/lib/contract/errors';
import { projectCreate, type ProjectView } from '@/lib/contract/project';
import { inOffice } from '@/lib/services/in-office';
import { appendRecord } from '@/lib/services/record/append';
import { requireOrder, tidyCalendar } from './dates';
import { readProject } from './get';

export async function createProject(
  ctx: OfficeContext,
  { body }: { body: z.input<typeof projectCreate> },
): Promise<ProjectView> {
  requirePermission(ctx, 'projects:create');
  const { contractor, calendar, ...wanted } = checked(projectCreate, body);
  requireOrder(wanted.start, wanted.targetFinish);
  return inOffice(ctx, async (tx) => {
    if (!(await findContractor(tx, contractor))) {
      throw Invalid.field('contractor', 'There is no such contractor in this office.');
    }
    const id = await insertProject(tx, {
      ...wanted,
      ...(calendar && tidyCalendar(calendar)),
      contractorId: contractor,
      officeId: ctx.office.id,
      createdBy: ctx.user.id,
    });
    if (!id) throw new Conflict(`There is a project with the code ${wanted.code} already.`);
    const data = { project: id, code: wanted.code };
    await appendRecord(tx, ctx, { verb: 'project added', data }, { submission: null });
    return readProject(tx, id);
  });
}
