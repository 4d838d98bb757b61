import { and, eq, gt, isNull, lt, ne, notExists, or, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { Tx } from '../client';
import { apiTokens, invitations, memberships, offices, users } from '../schema';

/** What happens before an office is known; run these in `withIdentity`. */

const person = { id: users.id, name: users.name, email: users.email, sessionEpoch: users.sessionEpoch };
const member = { id: memberships.id, role: memberships.role, contractor: memberships.contractorId };
const office = { id: offices.id, slug: offices.slug, name: offices.name, locale: offices.locale };

export async function findCredentials(tx: Tx, email: string) {
  const [row] = await tx
    .select({ ...person, passwordHash: users.passwordHash })
    .from(users)
    .where(eq(users.email, email.toLowerCase()));
  return row ?? null;
}

export async function findPerson(tx: Tx, userId: string) {
  const [row] = await tx.select(person).from(users).where(eq(users.id, userId));
  return row ?? null;
}

/** The person, and their membership of the office with that slug where they have one that holds. */
export async function findPersonIn(tx: Tx, userId: string, slug: string) {
  const [row] = await tx
    .select({ person, member, office })
    .from(users)
    .leftJoin(offices, eq(offices.slug, slug))
    .leftJoin(
      memberships,
      and(
        eq(memberships.officeId, offices.id),
        eq(memberships.userId, users.id),
        isNull(memberships.disabledAt),
      ),
    )
    .where(eq(users.id, userId));
  return row ?? null;
}

export async function listPlaces(tx: Tx, userId: string) {
  return tx
    .select({ slug: offices.slug, name: offices.name, role: memberships.role })
    .from(memberships)
    .innerJoin(offices, eq(offices.id, memberships.officeId))
    .where(and(eq(memberships.userId, userId), isNull(memberships.disabledAt)))
    .orderBy(offices.name, offices.slug);
}

/** The owner of a token that is neither revoked nor expired, as a member whose membership holds. */
export async function findTokenOwner(tx: Tx, tokenHash: string) {
  const [row] = await tx
    .select({ person, member, office, token: { id: apiTokens.id, readOnly: apiTokens.readOnly } })
    .from(apiTokens)
    .innerJoin(memberships, eq(memberships.id, apiTokens.membershipId))
    .innerJoin(offices, eq(offices.id, memberships.officeId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(
      and(
        eq(apiTokens.tokenHash, tokenHash),
        isNull(apiTokens.revokedAt),
        or(isNull(apiTokens.expiresAt), gt(apiTokens.expiresAt, sql`now()`)),
        isNull(memberships.disabledAt),
      ),
    );
  return row ?? null;
}

/** At most once a minute: a script that calls often must not write with each call. */
export async function touchToken(tx: Tx, token: string): Promise<void> {
  await tx
    .update(apiTokens)
    .set({ lastUsedAt: sql`now()` })
    .where(
      and(
        eq(apiTokens.id, token),
        or(isNull(apiTokens.lastUsedAt), lt(apiTokens.lastUsedAt, sql`now() - interval '1 minute'`)),
      ),
    );
}

const usable = (tokenHash: string) =>
  and(
    eq(invitations.tokenHash, tokenHash),
    isNull(invitations.usedAt),
    gt(invitations.expiresAt, sql`now()`),
  );

export async function findInvitation(tx: Tx, tokenHash: string) {
  const [row] = await tx
    .select({ user: users.id, name: users.name, email: users.email, office })
    .from(invitations)
    .innerJoin(users, eq(users.id, invitations.userId))
    .innerJoin(offices, eq(offices.id, invitations.officeId))
    .innerJoin(
      memberships,
      and(eq(memberships.officeId, invitations.officeId), eq(memberships.userId, invitations.userId)),
    )
    .where(and(usable(tokenHash), isNull(memberships.disabledAt), belongsNowhereElse(tx)));
  return row ?? null;
}

/** Since it was made the person may have joined another office, where whoever sets the password is them too. */
function belongsNowhereElse(tx: Tx) {
  const elsewhere = alias(memberships, 'elsewhere');
  return notExists(
    tx
      .select({ id: elsewhere.id })
      .from(elsewhere)
      .where(and(eq(elsewhere.userId, invitations.userId), ne(elsewhere.officeId, invitations.officeId))),
  );
}

/** Uses the invitation up; null where it was used, replaced or expired already. Of two at once one succeeds. */
export async function useInvitation(tx: Tx, tokenHash: string) {
  const [row] = await tx
    .update(invitations)
    .set({ usedAt: sql`now()` })
    .where(usable(tokenHash))
    .returning({ user: invitations.userId });
  return row ?? null;
}

/** Ends the sessions that stand under the old password. */
export async function setPassword(tx: Tx, userId: string, passwordHash: string): Promise<void> {
  await tx
    .update(users)
    .set({ passwordHash, sessionEpoch: sql`${users.sessionEpoch} + 1` })
    .where(eq(users.id, userId));
}

export async function hasOffice(tx: Tx, slug: string): Promise<boolean> {
  const rows = await tx.select({ id: offices.id }).from(offices).where(eq(offices.slug, slug));
  return rows.length > 0;
}
