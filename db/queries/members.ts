import { and, asc, eq, inArray, isNotNull, isNull, ne, sql } from 'drizzle-orm';
import type { Tx } from '../client';
import { contractors, invitations, memberships, users } from '../schema';

const columns = {
  member: { id: memberships.id, role: memberships.role, disabledAt: memberships.disabledAt },
  user: { id: users.id, name: users.name, email: users.email },
  contractor: { id: contractors.id, name: contractors.name },
};
export type MemberRow = Awaited<ReturnType<typeof listMembers>>[number];

export async function listMembers(tx: Tx) {
  return tx
    .select(columns)
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .leftJoin(contractors, eq(contractors.id, memberships.contractorId))
    .orderBy(asc(users.name), asc(users.email));
}

export async function findMember(tx: Tx, id: string): Promise<MemberRow | null> {
  const [row] = await tx
    .select(columns)
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .leftJoin(contractors, eq(contractors.id, memberships.contractorId))
    .where(eq(memberships.id, id));
  return row ?? null;
}

/** Of those users the ones who have set a password; needs `withIdentity`. */
export async function listActive(tx: Tx, userIds: readonly string[]): Promise<Set<string>> {
  if (userIds.length === 0) return new Set();
  const rows = await tx
    .select({ id: users.id })
    .from(users)
    .where(and(inArray(users.id, [...userIds]), isNotNull(users.passwordHash)));
  return new Set(rows.map((row) => row.id));
}

/** The account behind an address, and whether it belongs to other offices than this; needs `withIdentity`. */
export async function findAccount(tx: Tx, email: string, officeId: string) {
  const [row] = await tx
    .select({
      id: users.id,
      name: users.name,
      hasPassword: sql<boolean>`${users.passwordHash} is not null`,
      elsewhere: sql<boolean>`exists (${tx
        .select({ id: memberships.id })
        .from(memberships)
        .where(and(eq(memberships.userId, users.id), ne(memberships.officeId, officeId)))})`,
    })
    .from(users)
    .where(eq(users.email, email));
  return row ?? null;
}

/** Named columns only: the role may write no other. Not returned: nobody sees a user before they are a member. */
export async function insertUser(tx: Tx, user: { id: string; email: string; name: string }): Promise<void> {
  await tx.execute(sql`insert into users (id, email, name) values (${user.id}, ${user.email}, ${user.name})`);
}

/** Null where the person is a member already. */
export async function insertMembership(
  tx: Tx,
  values: Pick<typeof memberships.$inferInsert, 'officeId' | 'userId' | 'role' | 'contractorId'>,
) {
  const [row] = await tx
    .insert(memberships)
    .values(values)
    .onConflictDoNothing({ target: [memberships.officeId, memberships.userId] })
    .returning({ id: memberships.id });
  return row ?? null;
}

/** The administrators whose memberships hold, locked, so that two cannot take each other away at once. */
export async function lockAdministrators(tx: Tx): Promise<string[]> {
  const rows = await tx
    .select({ id: memberships.id })
    .from(memberships)
    .where(and(eq(memberships.role, 'administrator'), isNull(memberships.disabledAt)))
    .orderBy(asc(memberships.id))
    .for('update');
  return rows.map((row) => row.id);
}

export async function setDisabled(tx: Tx, id: string, disabled: boolean): Promise<void> {
  await tx
    .update(memberships)
    .set({ disabledAt: disabled ? sql`now()` : null })
    .where(eq(memberships.id, id));
}

/** A new link; those before it stop working. */
export async function replaceInvitation(
  tx: Tx,
  values: Pick<
    typeof invitations.$inferInsert,
    'officeId' | 'userId' | 'tokenHash' | 'expiresAt' | 'createdBy'
  >,
): Promise<void> {
  await tx
    .update(invitations)
    .set({ expiresAt: sql`now()` })
    .where(
      and(
        eq(invitations.officeId, values.officeId),
        eq(invitations.userId, values.userId),
        isNull(invitations.usedAt),
      ),
    );
  await tx.insert(invitations).values(values);
}
