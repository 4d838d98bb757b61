import { findMember } from '@/db/queries/members';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import { Conflict } from '@/lib/contract/errors';
import type { InvitationView } from '@/lib/contract/office';
import { found, idOf, inOffice } from '@/lib/services/in-office';
import { appendRecord } from '@/lib/services/record/append';
import { accountOf, invite } from './invitation';
import { memberView } from './view';

/** A new one-time link, for a first password or in place of a forgotten one. */
export async function inviteMember(
  ctx: OfficeContext,
  { path, origin = '' }: { path: { member: string }; origin?: string },
): Promise<InvitationView> {
  requirePermission(ctx, 'members:update');
  const id = idOf(path.member, 'member');
  const row = found(await inOffice(ctx, (tx) => findMember(tx, id)), 'member');
  if (row.member.disabledAt)
    throw new Conflict('Give the membership back before you invite this person again.');
  const account = await accountOf(ctx, row.user.email);
  return inOffice(ctx, async (tx) => {
    const link = await invite(tx, ctx, row.user.id, account, origin);
    const { name, email } = row.user;
    const data = { member: id, name, email, role: row.member.role };
    await appendRecord(tx, ctx, { verb: 'member invited again', data }, { submission: null });
    return { member: memberView(row, account?.hasPassword ?? false), ...link };
  });
}
