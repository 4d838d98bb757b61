import type { z } from 'zod';
import { findInvitation } from '@/db/queries/identity';
import { withIdentity } from '@/db/scope';
import { hashToken } from '@/lib/access/token';
import { NotFound } from '@/lib/contract/errors';
import type { invitationCheck } from '@/lib/contract/office';

/** Whom an invitation is for, while it can be used. */
export async function getInvitation(
  _nobody: null,
  { path }: { path: { token: string } },
): Promise<z.output<typeof invitationCheck>> {
  const invitation = await withIdentity((tx) => findInvitation(tx, hashToken(path.token)));
  if (!invitation) throw usedUp();
  const { name, email, office } = invitation;
  return { name, email, office: office.name };
}

export function usedUp(): NotFound {
  return new NotFound('This invitation is used, replaced or expired. Ask your office for a new one.');
}
