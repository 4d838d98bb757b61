import { headers } from 'next/headers';
import { redirect } from 'next/navigation';
import type { Identity } from '@/lib/access/context';
import { authenticate } from '@/lib/access/authenticate';
import { Unauthorised } from '@/lib/contract/errors';

/** Who is signed in, or null. Every other failure is passed on. */
export async function signedIn(): Promise<Identity | null> {
  try {
    return await authenticate(await headers());
  } catch (error) {
    if (error instanceof Unauthorised) return null;
    throw error;
  }
}

/** For each page below an office: without a session that holds, to the sign-in page and back to `path` after it. */
export async function requireSession(path: string): Promise<Identity> {
  const identity = await signedIn();
  if (!identity) redirect(`/sign-in?next=${encodeURIComponent(path)}`);
  return identity;
}
