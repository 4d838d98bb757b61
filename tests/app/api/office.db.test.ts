import { beforeAll, describe, expect, it } from 'vitest';
import type { ContractorView, OfficeView } from '@/lib/contract/office';
import type { ProjectView } from '@/lib/contract/project';
import type { Problem } from '@/lib/contract/shared';
import { makeCast, OTHER_SLUG, SLUG, type Cast } from '@/tests/support/cast';
import { testDatabase } from '@/tests/support/database';
import { ask, json, sessionCookie } from '@/tests/support/http';

const database = testDatabase();
let cast: Cast;
const at = (path: string, slug = SLUG) => `/api/offices/${slug}${path}`;

beforeAll(async () => {
  cast = await makeCast();
});

describe('who is asking', () => {
  it('is told by a token or by the session’s cookie', async () => {
    for (const asking of [
      { token: cast.analyst.token },
      { cookie: await sessionCookie(cast.analyst.user) },
    ]) {
      const answer = await ask('GET', at(''), asking);
      expect(answer.status).toBe(200);
      expect((await json<OfficeView>(answer)).me).toMatchObject({
        role: 'analyst',
        email: cast.analyst.email,
      });
    }
  });

  it('is nobody without either: 401 with a problem document', async () => {
    const answer = await ask('GET', at('/projects'));
    expect(answer.status).toBe(401);
    expect(answer.headers.get('content-type')).toBe('application/problem+json');
    expect(await json<Problem>(answer)).toMatchObject({
      status: 401,
      detail: expect.stringContaining('Sign in'),
    });
  });

  it.each(['revoked', 'expired'] as const)('is nobody with a token that is %s', async (kind) => {
    expect((await ask('GET', at(''), { token: cast[kind] })).status).toBe(401);
  });

  it('is nobody with a token that never was, even beside a good cookie', async () => {
    const cookie = await sessionCookie(cast.analyst.user);
    expect((await ask('GET', at(''), { token: 'plumb_nonsense', cookie })).status).toBe(401);
  });

  it('is nobody with a session from before the password was changed', async () => {
    expect((await ask('GET', at(''), { cookie: await sessionCookie(cast.analyst.user, 7) })).status).toBe(
      401,
    );
  });

  it('is nobody with a cookie sealed by another secret', async () => {
    const cookie = `next-auth.session-token=${'x'.repeat(200)}`;
    expect((await ask('GET', at(''), { cookie })).status).toBe(401);
  });

  it('finds an office that is not theirs as little as one that is not', async () => {
    const foreign = await ask('GET', at('/projects', OTHER_SLUG), { token: cast.analyst.token });
    const none = await ask('GET', at('/projects', 'nowhere'), { token: cast.analyst.token });
    expect([foreign.status, none.status]).toEqual([404, 404]);
    const cookie = await sessionCookie(cast.stranger.user);
    expect((await ask('GET', at('/projects'), { cookie })).status).toBe(404);
  });

  it('changes nothing from another site’s page', async () => {
    const cookie = await sessionCookie(cast.administrator.user);
    const body = { name: 'Smugglers' };
    const attempts: Record<string, string>[] = [
      { origin: 'https://elsewhere.example' },
      { 'sec-fetch-site': 'cross-site' },
      { 'sec-fetch-site': 'same-site', origin: 'http://plumbrow.test' },
      { origin: 'null' },
    ];
    for (const headers of attempts) {
      expect((await ask('POST', at('/contractors'), { cookie, body, headers })).status).toBe(403);
    }
    const own = { origin: 'http://plumbrow.test' };
    expect((await ask('POST', at('/contractors'), { cookie, body, headers: own })).status).toBe(201);
  });
});

describe('what each role may', () => {
  const hull = () => cast.projects.hull;
  const project = (code: string) => ({
    code,
    name: 'New',
    contractor: cast.contractors.hull,
    start: '2027-01-04',
  });
  type Who = 'administrator' | 'analyst' | 'reviewer' | 'scheduler' | 'otherScheduler' | 'stranger';
  const everyone: Who[] = ['administrator', 'analyst', 'reviewer', 'scheduler', 'otherScheduler', 'stranger'];
  /** A call, and what each is answered in the order of `everyone`. */
  const calls: [string, string, () => string, () => unknown, number[]][] = [
    ['list contractors', 'GET', () => '/contractors', () => undefined, [200, 200, 200, 200, 200, 404]],
    [
      'add a contractor',
      'POST',
      () => '/contractors',
      () => ({ name: `C ${Math.random()}` }),
      [201, 403, 403, 403, 403, 404],
    ],
    ['list members', 'GET', () => '/members', () => undefined, [200, 403, 403, 403, 403, 404]],
    ['list rules', 'GET', () => '/rules', () => undefined, [200, 200, 200, 200, 200, 404]],
    ['list projects', 'GET', () => '/projects', () => undefined, [200, 200, 200, 200, 200, 404]],
    [
      'add a project',
      'POST',
      () => '/projects',
      () => project(`P ${Math.random()}`),
      [201, 201, 403, 403, 403, 404],
    ],
    ['see a project', 'GET', () => `/projects/${hull()}`, () => undefined, [200, 200, 200, 200, 404, 404]],
    [
      'change a project',
      'PATCH',
      () => `/projects/${hull()}`,
      () => ({ name: 'Hull' }),
      [200, 200, 403, 403, 403, 404],
    ],
    [
      'list revisions',
      'GET',
      () => `/projects/${hull()}/submissions`,
      () => undefined,
      [200, 200, 200, 200, 404, 404],
    ],
  ];

  it.each(calls)('to %s', async (_name, method, path, body, expected) => {
    const answers: number[] = [];
    for (const who of everyone) {
      answers.push((await ask(method, at(path()), { token: cast[who].token, body: body() })).status);
    }
    expect(answers).toEqual(expected);
  });

  it('and a read-only token reads and no more', async () => {
    expect((await ask('GET', at('/projects'), { token: cast.readOnly })).status).toBe(200);
    const answer = await ask('POST', at('/projects'), { token: cast.readOnly, body: project('RO') });
    expect(answer.status).toBe(403);
    expect(await json<Problem>(answer)).toMatchObject({ detail: expect.stringContaining('only read') });
  });

  it('and a scheduler sees its own contractor’s alone', async () => {
    const { token } = cast.scheduler;
    const projects = await json<{ items: ProjectView[] }>(await ask('GET', at('/projects'), { token }));
    expect(projects.items.map((item) => item.contractor.name)).not.toContain('Riggers');
    expect(projects.items.map((item) => item.id)).toContain(hull());
    const contractors = await json<{ items: ContractorView[] }>(
      await ask('GET', at('/contractors'), { token }),
    );
    expect(contractors.items.map((item) => item.name)).toEqual(['Hullwrights']);
  });
});

describe('a project', () => {
  const create = (body: object) => ask('POST', at('/projects'), { token: cast.analyst.token, body });
  const good = () => ({
    code: 'BOW',
    name: 'Bow thruster',
    contractor: cast.contractors.rig,
    start: '2027-01-04',
  });

  it('is made with the usual week unless another is given', async () => {
    const answer = await create({ ...good(), targetFinish: '2027-05-01', unit: 'hour', hoursPerDay: 7.5 });
    expect(answer.status).toBe(201);
    expect(await json<ProjectView>(answer)).toMatchObject({
      code: 'BOW',
      contractor: { id: cast.contractors.rig, name: 'Riggers' },
      targetFinish: '2027-05-01',
      unit: 'hour',
      hoursPerDay: 7.5,
      calendar: { workingDays: [1, 2, 3, 4, 5], holidays: [] },
      latest: null,
    });
  });

  it('takes a unit in the plural, and a calendar that gives only its holidays', async () => {
    const calendar = { holidays: ['2027-04-02'] };
    const answer = await create({ ...good(), code: 'BOW-2', unit: 'weeks', calendar });
    expect(answer.status).toBe(201);
    expect(await json<ProjectView>(answer)).toMatchObject({
      unit: 'week',
      calendar: { workingDays: [1, 2, 3, 4, 5], holidays: ['2027-04-02'] },
    });
  });

  it('needs a code of its own', async () => {
    const answer = await create(good());
    expect(answer.status).toBe(409);
    expect(await json<Problem>(answer)).toMatchObject({
      detail: 'There is a project with the code BOW already.',
    });
  });

  it('names each field at fault', async () => {
    const answer = await create({ code: ' ', name: 'x', contractor: 'y', start: '2027-02-30' });
    expect(answer.status).toBe(422);
    const { errors } = await json<Problem>(answer);
    expect(errors).toEqual([
      { path: 'code', message: 'Give the project a code.' },
      { path: 'contractor', message: 'Choose the contractor.' },
      { path: 'start', message: 'Write a date as 2027-03-12.' },
    ]);
    const other = await json<Problem>(
      await create({ ...good(), code: 5, unit: 'month', hoursPerDay: 'eight' }),
    );
    expect(other.errors).toEqual([
      { path: 'code', message: 'This must be a text.' },
      { path: 'unit', message: 'This must be one of day, hour, week.' },
      { path: 'hoursPerDay', message: 'Give the hours as a number.' },
    ]);
    expect((await json<Problem>(await create({}))).errors?.map(({ path }) => path)).toEqual([
      'code',
      'name',
      'contractor',
      'start',
    ]);
  });

  it.each([
    ['another office’s contractor', () => ({ contractor: crypto.randomUUID() }), 'contractor'],
    ['a target before the start', () => ({ targetFinish: '2026-12-31' }), 'targetFinish'],
    [
      'a week without a working day',
      () => ({ calendar: { workingDays: [], holidays: [] } }),
      'calendar.workingDays',
    ],
  ])('is refused for %s', async (_name, more, path) => {
    const answer = await create({ ...good(), code: 'KEEL', ...more() });
    expect(answer.status).toBe(422);
    expect((await json<Problem>(answer)).errors?.[0]?.path).toBe(path);
  });

  it('is changed in what is named, and not otherwise', async () => {
    const made = await json<ProjectView>(
      await create({ ...good(), code: 'STERN', targetFinish: '2027-05-01' }),
    );
    const path = at(`/projects/${made.id}`);
    const calendar = { workingDays: [6, 1, 2, 3, 4, 5, 5], holidays: ['2027-04-02', '2027-01-01'] };
    const answer = await ask('PATCH', path, { token: cast.analyst.token, body: { calendar } });
    expect(await json<ProjectView>(answer)).toEqual({
      ...made,
      calendar: { workingDays: [1, 2, 3, 4, 5, 6], holidays: ['2027-01-01', '2027-04-02'] },
    });
    const cleared = await ask('PATCH', path, { token: cast.analyst.token, body: { targetFinish: null } });
    expect(await json<ProjectView>(cleared)).toMatchObject({ targetFinish: null, code: 'STERN' });
    const taken = await ask('PATCH', path, { token: cast.analyst.token, body: { code: 'BOW' } });
    expect(taken.status).toBe(409);
  });

  it('is not found under what is no id', async () => {
    expect((await ask('GET', at('/projects/1;drop'), { token: cast.analyst.token })).status).toBe(404);
  });
});

describe('a body', () => {
  const post = (body: BodyInit, type: string) =>
    ask('POST', at('/contractors'), {
      token: cast.administrator.token,
      headers: { 'content-type': type },
      raw: body,
    });

  it('that is no JSON is 400, of another type 415, empty 422', async () => {
    expect((await post('{"name":', 'application/json')).status).toBe(400);
    expect((await post('name=x', 'application/x-www-form-urlencoded')).status).toBe(415);
    expect((await post('', 'application/json')).status).toBe(422);
  });
});

it('writes every change into the office’s record, hash upon hash', async () => {
  const entries = await database.asOwner<{ verb: string; previous_hash: string; hash: string }>(
    `select verb, previous_hash, hash from record_entries where office_id = $1 and submission_id is null order by sequence`,
    [cast.office],
  );
  expect(entries.length).toBeGreaterThan(5);
  expect(entries.map((entry) => entry.previous_hash)).toEqual([
    '',
    ...entries.slice(0, -1).map((entry) => entry.hash),
  ]);
  expect(new Set(entries.map((entry) => entry.verb))).toContain('project changed');
});
