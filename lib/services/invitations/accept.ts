import type { z } from 'zod';
import { findInvitation, setPassword, useInvitation } from '@/db/queries/identity';
import { enterOffice, withIdentity } from '@/db/scope';
import { hashPassword } from '@/lib/access/password';
import { hashToken } from '@/lib/access/token';
import { checked } from '@/lib/contract/errors';
import { passwordSet } from '@/lib/contract/office';
import { appendRecord } from '@/lib/services/record/append';
import { usedUp } from './get';

/** Sets the password and uses the invitation up, once; sessions under an earlier password are over. */
export async function acceptInvitation(
  _nobody: null,
  { path, body }: { path: { token: string }; body: z.input<typeof passwordSet> },
): Promise<void> {
  const token = hashToken(path.token);
  if (!(await withIdentity((tx) => findInvitation(tx, token)))) throw usedUp();
  const { password } = checked(passwordSet, body);
  const passwordHash = await hashPassword(password);
  await withIdentity(async (tx) => {
    const invitation = await findInvitation(tx, token);
    if (!invitation || !(await useInvitation(tx, token))) throw usedUp();
    const { user, name, email, office } = invitation;
    await setPassword(tx, user, passwordHash);
    await enterOffice(tx, { office: office.id, user, contractor: null });
    const actor = { office, user: { id: user, name, email } };
    await appendRecord(tx, actor, { verb: 'password set', data: { email } }, { submission: null });
  });
}
