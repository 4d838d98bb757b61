import { beforeAll, describe, expect, it } from 'vitest';
import { withOwner } from '@/db/owner';
import { signIn } from '@/lib/access/sign-in';
import type { InvitationView, MemberView } from '@/lib/contract/office';
import type { Problem } from '@/lib/contract/shared';
import { addPlayer, makeCast, SLUG, type Cast } from '@/tests/support/cast';
import { testDatabase } from '@/tests/support/database';
import { ask, json, sessionCookie } from '@/tests/support/http';

const database = testDatabase();
let cast: Cast;
const members = `/api/offices/${SLUG}/members`;
const asAdministrator = (body?: unknown) => ({ token: cast.administrator.token, ...(body ? { body } : {}) });
const add = (body: object) => ask('POST', members, asAdministrator(body));
const PASSWORD = 'tallow and tar, please';
const accept = (link: string, password = PASSWORD) =>
  ask('POST', link.replace('http://plumbrow.test', '/api').replace('invitation/', 'invitations/'), {
    body: { password },
  });
const look = (link: string) =>
  ask('GET', link.replace('http://plumbrow.test', '/api').replace('invitation/', 'invitations/'));

beforeAll(async () => {
  cast = await makeCast();
});

describe('a person who is added', () => {
  let invitation: InvitationView;

  it('is given a link, and is not active yet', async () => {
    const answer = await add({ name: 'Ada Quill', email: 'Ada.Quill@Cast.example', role: 'reviewer' });
    expect(answer.status).toBe(201);
    invitation = await json<InvitationView>(answer);
    expect(invitation.member).toMatchObject({
      email: 'ada.quill@cast.example',
      active: false,
      disabled: false,
    });
    expect(invitation.link).toMatch(/^http:\/\/plumbrow\.test\/invitation\/[\w-]{43}$/);
    const days = (Date.parse(invitation.expires) - Date.now()) / 86_400_000;
    expect(days).toBeGreaterThan(6.9);
    expect(days).toBeLessThan(7.1);
    await expect(signIn('ada.quill@cast.example', '', '')).rejects.toThrow('do not belong together');
  });

  it('is told whom the link is for', async () => {
    expect(await json(await look(invitation.link))).toEqual({
      name: 'Ada Quill',
      email: 'ada.quill@cast.example',
      office: `Office of ${SLUG}`,
    });
  });

  it('sets a password that is long enough, once', async () => {
    const short = await accept(invitation.link, 'short');
    expect(short.status).toBe(422);
    expect((await json<Problem>(short)).errors).toEqual([
      { path: 'password', message: 'Use at least 12 characters.' },
    ]);
    const both = await Promise.all([accept(invitation.link), accept(invitation.link)]);
    expect(both.map((answer) => answer.status).sort()).toEqual([204, 404]);
    expect((await look(invitation.link)).status).toBe(404);
  });

  it('signs in with it, by any case of the address', async () => {
    const person = await signIn('ADA.quill@cast.example', PASSWORD, '');
    expect(person).toMatchObject({ name: 'Ada Quill', epoch: 1 });
    const cookie = await sessionCookie(person.id, person.epoch);
    expect((await ask('GET', `/api/offices/${SLUG}`, { cookie })).status).toBe(200);
  });

  it('shows as active', async () => {
    const { items } = await json<{ items: MemberView[] }>(await ask('GET', members, asAdministrator()));
    expect(items.find((item) => item.name === 'Ada Quill')).toMatchObject({ active: true });
    expect(items.find((item) => item.email === cast.reviewer.email)).toMatchObject({ active: false });
  });

  it('cannot be added twice', async () => {
    const answer = await add({ name: 'Ada', email: 'ada.quill@cast.example', role: 'analyst' });
    expect(answer.status).toBe(409);
  });

  it('gets a new link in place of the old one, and a new password ends the sessions under the old', async () => {
    const path = `${members}/${invitation.member.id}/invitation`;
    const first = await json<InvitationView>(await ask('POST', path, asAdministrator()));
    const second = await json<InvitationView>(await ask('POST', path, asAdministrator()));
    expect((await look(first.link)).status).toBe(404);
    const before = await signIn('ada.quill@cast.example', PASSWORD, '');
    const cookie = await sessionCookie(before.id, before.epoch);
    expect((await accept(second.link, 'quite another word')).status).toBe(204);
    expect((await ask('GET', `/api/offices/${SLUG}`, { cookie })).status).toBe(401);
    await expect(signIn('ada.quill@cast.example', PASSWORD, '')).rejects.toThrow();
  });

  it('keeps nothing secret in clear', async () => {
    const hashes = await database.asOwner<{ password_hash: string; token_hash: string }>(
      `select u.password_hash, i.token_hash from users u join invitations i on i.user_id = u.id where u.email = $1`,
      ['ada.quill@cast.example'],
    );
    for (const { password_hash, token_hash } of hashes) {
      expect(password_hash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
      expect(token_hash).toMatch(/^[0-9a-f]{64}$/);
    }
  });
});

describe('an invitation', () => {
  it('lapses', async () => {
    const { link, member } = await json<InvitationView>(
      await add({ name: 'Late', email: 'late@cast.example', role: 'reviewer' }),
    );
    await database.asOwner(
      `update invitations set expires_at = now() - interval '1 second'
       where user_id = (select user_id from memberships where id = $1)`,
      [member.id],
    );
    expect([(await look(link)).status, (await accept(link)).status]).toEqual([404, 404]);
  });

  it('of no kind is known by a guess', async () => {
    expect((await ask('GET', '/api/invitations/guess')).status).toBe(404);
  });

  it('never sets the password of somebody who belongs to another office', async () => {
    await database.asOwner(`update users set password_hash = 'theirs' where id = $1`, [cast.stranger.user]);
    const answer = await add({ name: 'Guest', email: cast.stranger.email, role: 'reviewer' });
    expect(answer.status).toBe(201);
    const { link, member } = await json<InvitationView>(answer);
    expect(link).toBe('http://plumbrow.test/sign-in');
    const again = await ask('POST', `${members}/${member.id}/invitation`, asAdministrator());
    expect((await json<InvitationView>(again)).link).toBe('http://plumbrow.test/sign-in');
    expect(
      await database.asOwner(`select 1 from invitations where user_id = $1`, [cast.stranger.user]),
    ).toEqual([]);
  });

  it('stops working once the person belongs to another office as well', async () => {
    const { link, member } = await json<InvitationView>(
      await add({ name: 'Wanderer', email: 'wanderer@cast.example', role: 'reviewer' }),
    );
    expect((await accept(link)).status).toBe(204);
    const again = await ask('POST', `${members}/${member.id}/invitation`, asAdministrator());
    const { link: reset } = await json<InvitationView>(again);
    expect((await look(reset)).status).toBe(200);
    await database.asOwner(
      `insert into memberships (office_id, user_id, role)
       select o.id, m.user_id, 'reviewer' from offices o, memberships m where o.slug <> $1 and m.id = $2`,
      [SLUG, member.id],
    );
    expect([(await look(reset)).status, (await accept(reset)).status]).toEqual([404, 404]);
  });

  it('waits where another office’s is still open', async () => {
    const other = await database.asOwner<{ id: string }>(`select id from offices where slug <> $1`, [SLUG]);
    await withOwner((tx) => addPlayer(tx, other[0]?.id ?? '', 'reviewer', 'pending'));
    const answer = await add({ name: 'Pending', email: 'pending@cast.example', role: 'reviewer' });
    expect(answer.status).toBe(409);
    const { items } = await json<{ items: MemberView[] }>(await ask('GET', members, asAdministrator()));
    expect(items.map((item) => item.email)).not.toContain('pending@cast.example');
  });
});

describe('a role', () => {
  it.each([
    ['scheduler', undefined],
    ['reviewer', 'hull'],
  ] as const)('of %s with contractor %s is refused', async (role, contractor) => {
    const answer = await add({
      name: 'X',
      email: 'x@cast.example',
      role,
      ...(contractor ? { contractor: cast.contractors[contractor] } : {}),
    });
    expect(answer.status).toBe(422);
    expect((await json<Problem>(answer)).errors?.[0]?.path).toBe('contractor');
  });

  it('of scheduler names a contractor of this office', async () => {
    const wanted = { name: 'S', email: 's@cast.example', role: 'scheduler' };
    expect((await add({ ...wanted, contractor: crypto.randomUUID() })).status).toBe(422);
    const answer = await add({ ...wanted, contractor: cast.contractors.rig });
    expect((await json<InvitationView>(answer)).member.contractor).toEqual({
      id: cast.contractors.rig,
      name: 'Riggers',
    });
  });
});

describe('a membership', () => {
  const set = (member: string, disabled: boolean) =>
    ask('PATCH', `${members}/${member}`, asAdministrator({ disabled }));

  it('that is taken away ends sessions and tokens at once, and can be given back', async () => {
    const { user, membership, token } = cast.reviewer;
    const cookie = await sessionCookie(user);
    const statuses = async () => [
      (await ask('GET', `/api/offices/${SLUG}`, { cookie })).status,
      (await ask('GET', `/api/offices/${SLUG}`, { token })).status,
    ];
    expect(await statuses()).toEqual([200, 200]);
    expect(await json(await set(membership, true))).toMatchObject({ disabled: true });
    expect(await statuses()).toEqual([404, 401]);
    expect(await json(await set(membership, false))).toMatchObject({ disabled: false });
    expect(await statuses()).toEqual([200, 200]);
  });

  it('of the last administrator stays', async () => {
    expect((await set(cast.administrator.membership, true)).status).toBe(409);
  });

  it('is not another office’s to change', async () => {
    expect((await set(cast.stranger.membership, true)).status).toBe(404);
  });
});

describe('me', () => {
  it('shows the offices one belongs to, a token the one it is for', async () => {
    const cookie = await sessionCookie(cast.stranger.user);
    expect(await json(await ask('GET', '/api/me', { cookie }))).toMatchObject({
      offices: [{ slug: 'saltmarsh' }, { slug: SLUG, role: 'reviewer' }],
    });
    expect(await json(await ask('GET', '/api/me', { token: cast.stranger.token }))).toMatchObject({
      offices: [{ slug: 'saltmarsh', role: 'analyst' }],
    });
    expect((await ask('GET', '/api/me')).status).toBe(401);
  });
});

describe('signing in', () => {
  it('is held up after ten failures of one account, and not for another', async () => {
    const attempt = (email: string) => signIn(email, 'wrong', '192.0.2.7').then(String, String);
    const [first, ...rest] = await Promise.all(
      Array.from({ length: 10 }, () => attempt('nobody@cast.example')),
    );
    expect(new Set([first, ...rest])).toEqual(
      new Set(['Error: This e-mail address and password do not belong together.']),
    );
    expect(await attempt('nobody@cast.example')).toMatch(
      /Too many attempts failed\. Try again in 15 minutes\./,
    );
    expect(await attempt(cast.analyst.email)).toContain('do not belong together');
  });
});
