import { randomBytes } from 'node:crypto';
import { withOwner } from '@/db/owner';
import { contractors, memberships, offices, users } from '@/db/schema';
import type { OfficeContext } from '@/lib/access/context';
import { hashPassword } from '@/lib/access/password';
import type { Role } from '@/lib/contract/shared';

export const CONTRACTORS = ['Hollin & Pike Civils', 'Oriel Pumpworks', 'Fennrose Controls'] as const;

/** Email before the @, name, role, and for a scheduler the position of its contractor. */
const PEOPLE: readonly [string, string, Role, number | null][] = [
  ['administrator', 'Maud Tresk', 'administrator', null],
  ['analyst', 'Ivo Lindqvarn', 'analyst', null],
  ['reviewer', 'Sanna Oyelar', 'reviewer', null],
  ['scheduler', 'Bram Castelo', 'scheduler', 0],
  ['scheduler2', 'Priya Hartmoor', 'scheduler', 1],
  ['scheduler3', 'Jonas Wey', 'scheduler', 2],
];

export interface DemoOffice {
  readonly password: string;
  readonly accounts: string[];
  /** Ids, in the order of CONTRACTORS. */
  readonly contractors: readonly string[];
  /** In whose name the rest is made; by what stands before the @. */
  contextOf(account: string): OfficeContext;
}

/** The office, its contractors and its people, all with one password. */
export async function makeOffice(): Promise<DemoOffice> {
  const password = randomBytes(9).toString('base64url');
  const passwordHash = await hashPassword(password);
  const office = {
    id: crypto.randomUUID(),
    slug: 'demo',
    name: 'Tarnbeck Water Board',
    locale: 'en-GB',
  };
  const firms = CONTRACTORS.map((name) => ({ id: crypto.randomUUID(), officeId: office.id, name }));
  const people = PEOPLE.map(([account, name, role, contractor]) => ({
    account,
    role,
    contractor: contractor === null ? null : (firms[contractor]?.id ?? null),
    membership: crypto.randomUUID(),
    user: { id: crypto.randomUUID(), name, email: `${account}@demo.example` },
  }));
  await withOwner(async (tx) => {
    await tx.insert(offices).values(office);
    await tx.insert(contractors).values(firms);
    await tx.insert(users).values(people.map(({ user }) => ({ ...user, passwordHash })));
    await tx.insert(memberships).values(
      people.map(({ membership, user, role, contractor }) => ({
        id: membership,
        officeId: office.id,
        userId: user.id,
        role,
        contractorId: contractor,
      })),
    );
  });
  return {
    password,
    accounts: people.map(({ user }) => user.email),
    contractors: firms.map(({ id }) => id),
    contextOf(account) {
      const person = people.find((each) => each.account === account);
      if (!person) throw new Error(`The demo office has no account ${account}.`);
      const { user, role, contractor, membership } = person;
      return { office, user, role, contractor, membership, via: 'session', readOnly: false };
    },
  };
}
