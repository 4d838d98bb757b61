import type { OfficeContext } from '@/lib/access/context';
import { permissionsOf, requirePermission } from '@/lib/access/permissions';
import type { OfficeView } from '@/lib/contract/office';

export async function getOffice(ctx: OfficeContext): Promise<OfficeView> {
  requirePermission(ctx, 'office:read');
  const { office, user, role, contractor, readOnly } = ctx;
  const permissions = permissionsOf(role).filter((name) => !readOnly || name.endsWith(':read'));
  return { ...office, me: { ...user, role, contractor, permissions } };
}
