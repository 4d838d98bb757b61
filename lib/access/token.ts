import { createHash, randomBytes } from 'node:crypto';

const TOKEN_PREFIX = 'plumb_';

/** A new API token; only its hash is kept. */
export function newToken(): { token: string; hash: string; hint: string } {
  const token = TOKEN_PREFIX + randomBytes(32).toString('base64url');
  return { token, hash: hashToken(token), hint: token.slice(0, TOKEN_PREFIX.length + 4) };
}

/** The secret in an invitation's link. */
export function newInvitation(): { token: string; hash: string } {
  const token = randomBytes(32).toString('base64url');
  return { token, hash: hashToken(token) };
}

/** SHA-256 in hex: enough for secrets of 256 random bits. */
export function hashToken(token: string): string {
  return createHash('sha256').update(token, 'utf8').digest('hex');
}

/** The token of `Authorization: Bearer …`, '' where it names none; null where the header is absent or of another scheme. */
export function bearerToken(headers: Headers): string | null {
  const match = /^Bearer(?:\s+(.*))?$/i.exec(headers.get('authorization')?.trim() ?? '');
  return match ? (match[1] ?? '').trim() : null;
}
