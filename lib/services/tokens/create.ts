import { findCredentials, findPersonIn, listPlaces } from '@/db/queries/identity';
import { insertToken } from '@/db/queries/tokens';
import { withIdentity, withOffice } from '@/db/scope';
import { newToken } from '@/lib/access/token';
import { NotFound } from '@/lib/contract/errors';
import { appendRecord } from '@/lib/services/record/append';

export interface TokenRequest {
  readonly email: string;
  /** Slug; needed where the person is a member of several offices. */
  readonly office?: string | undefined;
  readonly name: string;
  readonly readOnly: boolean;
}

/**
 * Makes an API token that acts with its owner's role in one office; the token is told here and never again.
 * Called from the command line: whoever can run it reads the database's password anyway.
 */
export async function createToken(
  request: TokenRequest,
): Promise<{ token: string; office: string; role: string }> {
  const { person, member, office } = await withIdentity(async (tx) => {
    const known = await findCredentials(tx, request.email);
    if (!known) throw new NotFound(`Nobody has the e-mail address ${request.email}.`);
    const slugs = (await listPlaces(tx, known.id)).map((place) => place.slug);
    const slug = chooseOffice(request, slugs);
    const found = await findPersonIn(tx, known.id, slug);
    if (!found?.member || !found.office) throw new NotFound(`${request.email} is no member of ${slug}.`);
    return { person: found.person, member: found.member, office: found.office };
  });

  const { token, hash } = newToken();
  // As the office's own, whoever the token is for: its chain of the record is not a scheduler's to write to.
  await withOffice({ office: office.id, user: person.id, contractor: null }, async (tx) => {
    const { name, readOnly } = request;
    await insertToken(tx, { officeId: office.id, membershipId: member.id, name, tokenHash: hash, readOnly });
    const event = { verb: 'token made', data: { email: person.email, name, readOnly } } as const;
    await appendRecord(tx, { office, user: person }, event, { submission: null });
  });
  return { token, office: office.slug, role: member.role };
}

function chooseOffice({ email, office }: TokenRequest, slugs: readonly string[]): string {
  if (office !== undefined) return office;
  const [only, ...others] = slugs;
  if (only === undefined) throw new NotFound(`${email} is a member of no office.`);
  if (others.length > 0)
    throw new NotFound(`${email} is a member of ${slugs.join(', ')}: say which with --office.`);
  return only;
}
