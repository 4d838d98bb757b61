import type { z } from 'zod';
import { findContractor } from '@/db/queries/contractors';
import { isDuplicate } from '@/db/queries/duplicate';
import { findMember, insertMembership, insertUser } from '@/db/queries/members';
import type { Tx } from '@/db/scope';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import { checked, Conflict, Invalid } from '@/lib/contract/errors';
import { memberCreate, type InvitationView } from '@/lib/contract/office';
import { found, inOffice } from '@/lib/services/in-office';
import { appendRecord } from '@/lib/services/record/append';
import { accountOf, invite } from './invitation';
import { memberView } from './view';

/** Adds a person, who may have an account from another office; the answer's link is shown once. */
export async function createMember(
  ctx: OfficeContext,
  { body, origin = '' }: { body: z.input<typeof memberCreate>; origin?: string },
): Promise<InvitationView> {
  requirePermission(ctx, 'members:create');
  const wanted = checked(memberCreate, body);
  const email = wanted.email.toLowerCase();
  const account = await accountOf(ctx, email);
  return inOffice(ctx, async (tx) => {
    if (wanted.contractor && !(await findContractor(tx, wanted.contractor))) {
      throw Invalid.field('contractor', 'There is no such contractor in this office.');
    }
    const user = account?.id ?? (await addUser(tx, email, wanted.name));
    const { id } = await addMembership(tx, ctx, user, wanted);
    const link = await invite(tx, ctx, user, account, origin);
    const row = found(await findMember(tx, id), 'member');
    const data = { member: id, name: row.user.name, email, role: wanted.role };
    await appendRecord(tx, ctx, { verb: 'member added', data }, { submission: null });
    return { member: memberView(row, account?.hasPassword ?? false), ...link };
  });
}

async function addUser(tx: Tx, email: string, name: string): Promise<string> {
  const id = crypto.randomUUID();
  try {
    await insertUser(tx, { id, email, name });
  } catch (error) {
    if (isDuplicate(error, 'users_email_unique'))
      throw new Conflict(`${email} was added a moment ago. Try again.`);
    throw error;
  }
  return id;
}

async function addMembership(
  tx: Tx,
  ctx: OfficeContext,
  user: string,
  wanted: z.output<typeof memberCreate>,
) {
  const values = {
    officeId: ctx.office.id,
    userId: user,
    role: wanted.role,
    contractorId: wanted.contractor ?? null,
  };
  const membership = await insertMembership(tx, values);
  if (!membership) throw new Conflict(`${wanted.email} belongs to this office already.`);
  return membership;
}
