import type { z } from 'zod';
import { insertContractor } from '@/db/queries/contractors';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import { checked, Conflict } from '@/lib/contract/errors';
import { contractorCreate, type ContractorView } from '@/lib/contract/office';
import { inOffice } from '@/lib/services/in-office';
import { appendRecord } from '@/lib/services/record/append';

export async function createContractor(
  ctx: OfficeContext,
  { body }: { body: z.input<typeof contractorCreate> },
): Promise<ContractorView> {
  requirePermission(ctx, 'contractors:create');
  const { name } = checked(contractorCreate, body);
  return inOffice(ctx, async (tx) => {
    const contractor = await insertContractor(tx, { officeId: ctx.office.id, name });
    if (!contractor) throw new Conflict(`There is a contractor named ${name} already.`);
    const event = { verb: 'contractor added', data: { contractor: contractor.id, name } } as const;
    await appendRecord(tx, ctx, event, { submission: null });
    return { ...contractor, projects: 0 };
  });
}
