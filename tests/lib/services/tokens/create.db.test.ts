import { beforeAll, describe, expect, it } from 'vitest';
import { findTokenOwner } from '@/db/queries/identity';
import { withIdentity } from '@/db/scope';
import { hashToken } from '@/lib/access/token';
import { createToken } from '@/lib/services/tokens/create';
import { testDatabase } from '@/tests/support/database';
import { type OfficeFixture, twoOffices } from '@/tests/support/two-offices';

const db = testDatabase();
let office: OfficeFixture;
let other: OfficeFixture;
beforeAll(async () => {
  [office, other] = await twoOffices();
});

const name = 'a script';
const ownerOf = (token: string) => withIdentity((tx) => findTokenOwner(tx, hashToken(token)));

describe('createToken', () => {
  it('makes a token that acts as its owner, and keeps nothing of it but the hash', async () => {
    const made = await createToken({ email: office.analystEmail.toUpperCase(), name, readOnly: true });
    expect(made).toMatchObject({ office: office.slug, role: 'analyst' });
    const owner = await ownerOf(made.token);
    expect(owner).toMatchObject({
      person: { id: office.analyst.user },
      office: { id: office.id },
      token: { readOnly: true },
    });
    const kept = await db.asOwner<{ text: string }>('select api_tokens::text as text from api_tokens');
    expect(kept.some((row) => row.text.includes(made.token))).toBe(false);
    const record = await db.asOwner('select verb, actor_id from record_entries where submission_id is null');
    expect(record).toEqual([{ verb: 'token made', actor_id: office.analyst.user }]);
  });

  it('makes one for a scheduler, who stays with its contractor', async () => {
    const email = `scheduler@${office.slug}-piling.example`;
    const made = await createToken({ email, name, readOnly: false });
    expect((await ownerOf(made.token))?.member.contractor).toBe(office.contractors[0].id);
  });

  it('makes none for a stranger, nor in an office that is not the person’s', async () => {
    await expect(createToken({ email: 'nobody@nowhere.example', name, readOnly: false })).rejects.toThrow(
      /Nobody has the e-mail address/,
    );
    await expect(
      createToken({ email: office.analystEmail, office: other.slug, name, readOnly: false }),
    ).rejects.toThrow(/is no member of hillside/);
  });

  it('asks which office where there are several', async () => {
    await db.asOwner(`insert into memberships (office_id, user_id, role) values ($1, $2, 'reviewer')`, [
      other.id,
      office.analyst.user,
    ]);
    await expect(createToken({ email: office.analystEmail, name, readOnly: false })).rejects.toThrow(
      /hillside, quayside: say which|quayside, hillside: say which/,
    );
    const made = await createToken({ email: office.analystEmail, office: other.slug, name, readOnly: false });
    expect(made.role).toBe('reviewer');
  });
});
