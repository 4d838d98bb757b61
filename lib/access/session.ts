import { getToken } from 'next-auth/jwt';

/** What the session's cookie says; whether it still holds is looked up. */
export interface SessionClaim {
  readonly user: string;
  readonly epoch: number;
}

export function authSecret(): string {
  const secret = process.env.AUTH_SECRET ?? process.env.NEXTAUTH_SECRET;
  if (!secret) throw new Error('AUTH_SECRET is not set: start Plumbrow with `npm start`, or set it.');
  return secret;
}

/** Null where there is no session's cookie, or none that we made. */
export async function readSession(headers: Headers): Promise<SessionClaim | null> {
  const cookies = parseCookies(headers.get('cookie') ?? '');
  // Only the cookie counts here: a bearer token is one of ours, never a session's.
  const req = { cookies, headers: {} } as unknown as Parameters<typeof getToken>[0]['req'];
  const token = await getToken({ req, secret: authSecret() });
  if (typeof token?.sub !== 'string' || typeof token.epoch !== 'number') return null;
  return { user: token.sub, epoch: token.epoch };
}

function parseCookies(header: string): Record<string, string> {
  const pairs = header.split(';').flatMap((part) => {
    const at = part.indexOf('=');
    return at > 0 ? [[part.slice(0, at).trim(), decoded(part.slice(at + 1).trim())] as const] : [];
  });
  return Object.fromEntries(pairs);
}

function decoded(value: string): string {
  try {
    return decodeURIComponent(value);
  } catch {
    // Not percent-encoded after all: another program's cookie, taken as it stands.
    return value;
  }
}
