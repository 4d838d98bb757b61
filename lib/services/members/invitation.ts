import { findAccount, replaceInvitation } from '@/db/queries/members';
import { withIdentity, type Tx } from '@/db/scope';
import type { OfficeContext } from '@/lib/access/context';
import { newInvitation } from '@/lib/access/token';
import { Conflict } from '@/lib/contract/errors';

const LASTS_MS = 7 * 24 * 60 * 60 * 1000;

export interface Link {
  readonly link: string;
  readonly expires: string;
}

export type Account = NonNullable<Awaited<ReturnType<typeof findAccount>>>;

/** The account behind an address; null where there is none yet. */
export function accountOf(ctx: OfficeContext, email: string): Promise<Account | null> {
  return withIdentity((tx) => findAccount(tx, email, ctx.office.id));
}

/**
 * A link to set the password, once. Nobody is given one for an account that belongs to another office as well:
 * whoever sets the password is that person there too.
 */
export async function invite(
  tx: Tx,
  ctx: OfficeContext,
  user: string,
  account: Account | null,
  origin: string,
): Promise<Link> {
  const expires = new Date(Date.now() + LASTS_MS);
  if (account?.elsewhere) {
    if (account.hasPassword) return { link: `${origin}/sign-in`, expires: expires.toISOString() };
    throw new Conflict(
      'This person was invited by another office and has set no password yet. Add them once they have.',
    );
  }
  const { token, hash } = newInvitation();
  await replaceInvitation(tx, {
    officeId: ctx.office.id,
    userId: user,
    tokenHash: hash,
    expiresAt: expires,
    createdBy: ctx.user.id,
  });
  return { link: `${origin}/invitation/${token}`, expires: expires.toISOString() };
}
