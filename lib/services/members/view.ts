import { listActive, type MemberRow } from '@/db/queries/members';
import { withIdentity } from '@/db/scope';
import type { MemberView } from '@/lib/contract/office';

export async function memberViews(rows: readonly MemberRow[]): Promise<MemberView[]> {
  const ids = rows.map((row) => row.user.id);
  const active = await withIdentity((tx) => listActive(tx, ids));
  return rows.map((row) => memberView(row, active.has(row.user.id)));
}

export function memberView({ member, user, contractor }: MemberRow, active: boolean): MemberView {
  return {
    id: member.id,
    name: user.name,
    email: user.email,
    role: member.role,
    contractor,
    active,
    disabled: member.disabledAt !== null,
  };
}
