import { listContractors as query } from '@/db/queries/contractors';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import type { ContractorView } from '@/lib/contract/office';
import { inOffice } from '@/lib/services/in-office';

export async function listContractors(ctx: OfficeContext): Promise<{ items: ContractorView[] }> {
  requirePermission(ctx, 'contractors:read');
  return { items: await inOffice(ctx, query) };
}
