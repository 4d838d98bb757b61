import { randomUUID } from 'node:crypto';
import { withOwner } from '@/db/owner';
import { apiTokens, contractors, memberships, offices, projects, users } from '@/db/schema';
import type { Tx } from '@/db/scope';
import { newToken } from '@/lib/access/token';
import type { Role } from '@/lib/contract/shared';

/** Somebody of the cast, with what they can prove themselves by. */
export interface Player {
  readonly user: string;
  readonly membership: string;
  readonly email: string;
  readonly token: string;
}

export interface Cast {
  readonly office: string;
  readonly contractors: { readonly hull: string; readonly rig: string };
  readonly projects: { readonly hull: string; readonly rig: string };
  readonly administrator: Player;
  readonly analyst: Player;
  readonly reviewer: Player;
  /** Of the contractor of project `hull`, and of that of project `rig`. */
  readonly scheduler: Player;
  readonly otherScheduler: Player;
  /** An analyst of another office. */
  readonly stranger: Player;
  readonly readOnly: string;
  readonly revoked: string;
  readonly expired: string;
}

export const SLUG = 'slipway';
export const OTHER_SLUG = 'saltmarsh';

/** Two offices, one of them with everybody in it: whoever may or may not do a thing is here. */
export function makeCast(): Promise<Cast> {
  return withOwner(async (tx) => {
    const office = await addOffice(tx, SLUG);
    const other = await addOffice(tx, OTHER_SLUG);
    const hull = await addContractor(tx, office, 'Hullwrights');
    const rig = await addContractor(tx, office, 'Riggers');
    const administrator = await addPlayer(tx, office, 'administrator', 'administrator');
    const analyst = await addPlayer(tx, office, 'analyst', 'analyst');
    return {
      office,
      contractors: { hull, rig },
      projects: {
        hull: await addProject(tx, office, hull, 'HULL', analyst.user),
        rig: await addProject(tx, office, rig, 'RIG', analyst.user),
      },
      administrator,
      analyst,
      reviewer: await addPlayer(tx, office, 'reviewer', 'reviewer'),
      scheduler: await addPlayer(tx, office, 'scheduler', 'scheduler', hull),
      otherScheduler: await addPlayer(tx, office, 'scheduler', 'other-scheduler', rig),
      stranger: await addPlayer(tx, other, 'analyst', 'stranger'),
      readOnly: await addToken(tx, office, analyst.membership, { readOnly: true }),
      revoked: await addToken(tx, office, analyst.membership, { revokedAt: new Date('2020-01-01') }),
      expired: await addToken(tx, office, analyst.membership, { expiresAt: new Date('2020-01-01') }),
    };
  });
}

async function addOffice(tx: Tx, slug: string): Promise<string> {
  const id = randomUUID();
  await tx.insert(offices).values({ id, slug, name: `Office of ${slug}` });
  return id;
}

async function addContractor(tx: Tx, officeId: string, name: string): Promise<string> {
  const id = randomUUID();
  await tx.insert(contractors).values({ id, officeId, name });
  return id;
}

export async function addPlayer(
  tx: Tx,
  officeId: string,
  role: Role,
  name: string,
  contractorId: string | null = null,
): Promise<Player> {
  const [user, membership, email] = [randomUUID(), randomUUID(), `${name}@cast.example`];
  await tx.insert(users).values({ id: user, email, name });
  await tx.insert(memberships).values({ id: membership, officeId, userId: user, role, contractorId });
  return { user, membership, email, token: await addToken(tx, officeId, membership) };
}

async function addToken(
  tx: Tx,
  officeId: string,
  membershipId: string,
  more: Partial<typeof apiTokens.$inferInsert> = {},
): Promise<string> {
  const { token, hash } = newToken();
  await tx
    .insert(apiTokens)
    .values({ officeId, membershipId, name: 'of the cast', tokenHash: hash, ...more });
  return token;
}

async function addProject(tx: Tx, officeId: string, contractorId: string, code: string, createdBy: string) {
  const id = randomUUID();
  const dates = { start: '2027-03-01', targetFinish: '2027-06-30' };
  await tx
    .insert(projects)
    .values({ id, officeId, contractorId, code, name: `Project ${code}`, createdBy, ...dates });
  return id;
}
