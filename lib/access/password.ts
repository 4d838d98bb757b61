import { hash, verify } from '@node-rs/argon2';

/** Argon2id with the parameters OWASP's Password Storage Cheat Sheet gives (19 MiB, two passes, one lane). */
const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

let nobody: Promise<string> | null = null;

export function hashPassword(password: string): Promise<string> {
  return hash(password.normalize('NFKC'), COST);
}

/** Takes as long for somebody unknown (`stored` null) as for a wrong password. */
export async function passwordMatches(stored: string | null, password: string): Promise<boolean> {
  nobody ??= hash(crypto.randomUUID(), COST);
  const matches = await verify(stored ?? (await nobody), password.normalize('NFKC'));
  return matches && stored !== null;
}
