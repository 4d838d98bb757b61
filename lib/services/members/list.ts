import { listMembers as query } from '@/db/queries/members';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import type { MemberView } from '@/lib/contract/office';
import { inOffice } from '@/lib/services/in-office';
import { memberViews } from './view';

export async function listMembers(ctx: OfficeContext): Promise<{ items: MemberView[] }> {
  requirePermission(ctx, 'members:read');
  return { items: await memberViews(await inOffice(ctx, query)) };
}
