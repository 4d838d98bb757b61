import type { z } from 'zod';
import { findMember, lockAdministrators, setDisabled } from '@/db/queries/members';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import { checked, Conflict } from '@/lib/contract/errors';
import { memberUpdate, type MemberView } from '@/lib/contract/office';
import { found, idOf, inOffice } from '@/lib/services/in-office';
import { appendRecord } from '@/lib/services/record/append';
import { memberViews } from './view';

/** Takes a membership away at once, or gives it back; what the person did stays. */
export async function updateMember(
  ctx: OfficeContext,
  { path, body }: { path: { member: string }; body: z.input<typeof memberUpdate> },
): Promise<MemberView> {
  requirePermission(ctx, 'members:update');
  const id = idOf(path.member, 'member');
  const { disabled } = checked(memberUpdate, body);
  const row = await inOffice(ctx, async (tx) => {
    const administrators = await lockAdministrators(tx);
    const before = found(await findMember(tx, id), 'member');
    if ((before.member.disabledAt !== null) === disabled) return before;
    if (disabled && administrators.length === 1 && administrators[0] === id) {
      throw new Conflict('Nobody would be left to run the office: add another administrator first.');
    }
    await setDisabled(tx, id, disabled);
    const data = { member: id, name: before.user.name, email: before.user.email, role: before.member.role };
    const verb = disabled ? 'member disabled' : 'member enabled';
    await appendRecord(tx, ctx, { verb, data }, { submission: null });
    return found(await findMember(tx, id), 'member');
  });
  const [view] = await memberViews([row]);
  return found(view, 'member');
}
