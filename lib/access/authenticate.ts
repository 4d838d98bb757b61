import { withIdentity } from '@/db/scope';
import { storableText } from '@/db/storable';
import * as identity from '@/db/queries/identity';
import { NotFound, Unauthorised } from '@/lib/contract/errors';
import type { Role } from '@/lib/contract/shared';
import type { Identity, OfficeContext } from './context';
import { readSession } from './session';
import { bearerToken, hashToken } from './token';

/** Who asks, outside any office. Throws `Unauthorised`. */
export async function authenticate(headers: Headers): Promise<Identity> {
  const bearer = bearerToken(headers);
  if (bearer !== null) {
    const { person, token, office } = await tokenOwner(bearer);
    return { user: userOf(person), via: 'token', readOnly: token.readOnly, office: office.slug };
  }
  const session = await readSession(headers);
  if (!session) throw signIn();
  const person = await withIdentity((tx) => identity.findPerson(tx, session.user));
  if (!person || person.sessionEpoch !== session.epoch) throw signIn();
  return { user: userOf(person), via: 'session', readOnly: false, office: null };
}

/**
 * Who asks, as a member of the office. Throws `Unauthorised`, and `NotFound` for an office they do not
 * belong to just as for one that does not exist.
 */
export async function officeContext(headers: Headers, slug: string): Promise<OfficeContext> {
  const bearer = bearerToken(headers);
  if (bearer !== null) {
    const { person, member, office, token } = await tokenOwner(bearer);
    if (office.slug !== slug) throw noOffice(slug);
    return contextOf(person, member, office, { via: 'token', readOnly: token.readOnly });
  }
  const session = await readSession(headers);
  if (!session) throw signIn();
  const found = await withIdentity((tx) => identity.findPersonIn(tx, session.user, storableText(slug)));
  if (!found || found.person.sessionEpoch !== session.epoch) throw signIn();
  if (!found.member || !found.office) throw noOffice(slug);
  return contextOf(found.person, found.member, found.office, { via: 'session', readOnly: false });
}

async function tokenOwner(token: string) {
  const owner = await withIdentity(async (tx) => {
    const found = await identity.findTokenOwner(tx, hashToken(token));
    if (found) await identity.touchToken(tx, found.token.id);
    return found;
  });
  if (owner) return owner;
  throw new Unauthorised('This token is unknown, revoked or expired.', {
    headers: { 'www-authenticate': 'Bearer error="invalid_token"' },
  });
}

function contextOf(
  person: Identity['user'],
  member: { id: string; role: Role; contractor: string | null },
  office: OfficeContext['office'],
  how: Pick<OfficeContext, 'via' | 'readOnly'>,
): OfficeContext {
  const { id, role, contractor } = member;
  return { office, user: userOf(person), membership: id, role, contractor, ...how };
}

function userOf({ id, name, email }: Identity['user']): Identity['user'] {
  return { id, name, email };
}

const signIn = (): Unauthorised =>
  new Unauthorised('Sign in first, or send an API token.', { headers: { 'www-authenticate': 'Bearer' } });

const noOffice = (slug: string): NotFound =>
  new NotFound(`There is no office “${slug}” here that you belong to.`);
