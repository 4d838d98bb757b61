import type { NextAuthOptions } from 'next-auth';
import CredentialsProvider from 'next-auth/providers/credentials';
import { findCredentials } from '@/db/queries/identity';
import { withIdentity } from '@/db/scope';
import { storableText } from '@/db/storable';
import { passwordMatches } from './password';
import { authSecret } from './session';
import { createThrottle } from './throttle';

const MINUTE = 60_000;
/** Counted apart: by the account that is tried, and by where the attempts come from (many accounts in turn). */
const byEmail = createThrottle({ failures: 10, windowMs: 15 * MINUTE });
const byAddress = createThrottle({ failures: 50, windowMs: 15 * MINUTE });

export interface SignedIn {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly epoch: number;
}

/** Refused, with the sentence to show. Whatever else fails is nobody's business but the log's. */
class SignInRefused extends Error {}

/** Which of the two was wrong is not told. Throws `SignInRefused`. */
export async function signIn(email: string, password: string, address: string): Promise<SignedIn> {
  const account = storableText(email).trim().toLowerCase();
  const wait = Math.max(byEmail.wait(account), address === '' ? 0 : byAddress.wait(address));
  if (wait > 0) {
    throw new SignInRefused(`Too many attempts failed. Try again in ${minutes(wait)}.`);
  }
  const person = await withIdentity((tx) => findCredentials(tx, account));
  if (!(await passwordMatches(person?.passwordHash ?? null, password)) || !person) {
    byEmail.failed(account);
    byAddress.failed(address);
    throw new SignInRefused('This e-mail address and password do not belong together.');
  }
  byEmail.succeeded(account);
  return { id: person.id, name: person.name, email: person.email, epoch: person.sessionEpoch };
}

function minutes(ms: number): string {
  const count = Math.ceil(ms / MINUTE);
  return count === 1 ? 'a minute' : `${count} minutes`;
}

/** Made when it is asked for: a build has no secret. `report` is told what nobody foresaw. */
export function authOptions(report: (error: unknown) => void): NextAuthOptions {
  return {
    secret: authSecret(),
    session: { strategy: 'jwt', maxAge: 7 * 24 * 60 * 60 },
    pages: { signIn: '/sign-in', signOut: '/sign-in', error: '/sign-in' },
    providers: [
      CredentialsProvider({
        name: 'Password',
        credentials: { email: { type: 'email' }, password: { type: 'password' } },
        authorize: (sent, request) =>
          signIn(
            (sent?.email ?? '').slice(0, 1000),
            (sent?.password ?? '').slice(0, 1000),
            addressOf(request.headers),
          ).catch((error: unknown) => {
            if (error instanceof SignInRefused) throw error;
            report(error);
            // next-auth puts the sentence into an address: nothing of a failed query may get there.
            throw new SignInRefused('Signing in does not work at the moment. Try again in a minute.');
          }),
      }),
    ],
    callbacks: {
      jwt: ({ token, user }) => (isSignedIn(user) ? { ...token, sub: user.id, epoch: user.epoch } : token),
      session: ({ session, token }) => ({ ...session, user: { ...session.user, id: token.sub } }),
    },
  };
}

function isSignedIn(user: object | undefined): user is SignedIn {
  return user !== undefined && 'epoch' in user && typeof user.epoch === 'number';
}

/** The last hop's word for where the request came from; the server itself sets it where no proxy stands before it. */
function addressOf(headers: Record<string, unknown> | undefined): string {
  const forwarded = headers?.['x-forwarded-for'];
  return typeof forwarded === 'string' ? (forwarded.split(',').at(-1)?.trim() ?? '') : '';
}
