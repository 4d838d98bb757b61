import { beforeAll, describe, expect, it } from 'vitest';
import type { ActivityView, FindingView, SubmissionView } from '@/lib/contract/submission';
import type { Problem } from '@/lib/contract/shared';
import { makeCast, SLUG, type Cast } from '@/tests/support/cast';
import { testDatabase } from '@/tests/support/database';
import { ask, json } from '@/tests/support/http';
import { BLOCKED, csv, received, SEVEN, submissionAt, upload } from '@/tests/support/uploads';

const database = testDatabase();
let cast: Cast;

beforeAll(async () => {
  cast = await makeCast();
});

async function countRows(): Promise<number[]> {
  const tables = ['submissions', 'submission_files', 'activities', 'findings', 'fixes', 'record_entries'];
  const counts = await Promise.all(
    tables.map((table) => database.asOwner<{ n: number }>(`select count(*)::int as n from ${table}`)),
  );
  return counts.map((rows) => rows[0]?.n ?? -1);
}

describe('a list that comes in', () => {
  let submission: SubmissionView;
  beforeAll(async () => {
    submission = await received(cast.analyst.token, cast.projects.hull, SEVEN);
  });

  it('is accounted for, row by row', () => {
    expect(submission).toMatchObject({
      revision: 0,
      status: 'received',
      receivedBy: 'analyst',
      file: { name: 'list.csv', sha256: expect.stringMatching(/^[0-9a-f]{64}$/) },
      rows: { read: 7, activities: 7, headings: 0, continued: 0, blank: 0, notes: 0, refused: 0 },
      corrections: 0,
      comments: 0,
      record: 1,
      version: 0,
      project: { id: cast.projects.hull, contractor: { name: 'Hullwrights' } },
    });
    expect(submission.findings).toEqual(submission.open);
    expect(submission.findings.blocks).toBe(0);
    expect(submission.findings.distorts).toBeGreaterThanOrEqual(2);
  });

  it('has its figures, as received and as corrected alike', () => {
    const { received: before, corrected, proposed } = submission.figures;
    expect(before.expectedDuration).toBeCloseTo(16.5, 12);
    expect(before.variance).toBeCloseTo(89 / 36, 12);
    expect({ ...corrected, state: 'received' }).toEqual(before);
    expect(proposed).toBeNull();
    expect(before.finish).toBe('2027-03-23');
    expect(before.chanceOfTarget).toBeGreaterThan(0.99);
  });

  it('is found again as it was answered', async () => {
    const answer = await ask('GET', submissionAt(submission.id), { token: cast.scheduler.token });
    expect(await json(answer)).toEqual(submission);
  });

  it('gives its activities with their cells', async () => {
    for (const state of ['received', 'corrected']) {
      const answer = await ask('GET', submissionAt(submission.id, `/activities?state=${state}`), {
        token: cast.reviewer.token,
      });
      const { items } = await json<{ items: ActivityView[] }>(answer);
      expect(items).toHaveLength(7);
      expect(items[5]).toMatchObject({
        id: 'F',
        name: 'Backfill',
        row: 7,
        optimistic: 2,
        likely: 3,
        pessimistic: 4,
        predecessors: [
          { id: 'D', type: 'FS', lag: 0 },
          { id: 'Z9', type: 'FS', lag: 0 },
        ],
        cells: { id: 'A7', optimistic: 'C7', predecessors: 'F7' },
      });
    }
  });

  it('gives its findings, each with its sentence, source and fix', async () => {
    const answer = await ask('GET', submissionAt(submission.id, '/findings'), { token: cast.analyst.token });
    const { items } = await json<{ items: FindingView[] }>(answer);
    const swapped = items.find((item) => item.rule === 'likely-below-optimistic');
    expect(swapped).toMatchObject({
      weight: 'distorts',
      activityId: 'D',
      activityName: 'Cure',
      row: 5,
      state: 'open',
      origin: 'received',
      comments: 0,
      fix: { state: 'proposed' },
    });
    expect(swapped?.fix?.edits.map(({ cell, from, to }) => [cell, from, to])).toEqual([
      ['C5', '5', '4'],
      ['D5', '4', '5'],
    ]);
    expect(swapped?.fix?.effect?.expectedDuration).toBeCloseTo(0.5, 12);
    expect(swapped?.fix?.effect?.variance).toBeCloseTo(1 / 9 - 1 / 36, 12);
    expect(items.find((item) => item.rule === 'unknown-predecessor')?.message).toContain('Z9');
    for (const { message, source, title } of items)
      expect([message, source, title].every(Boolean)).toBe(true);
  });

  it('gives its bytes back', async () => {
    const answer = await ask('GET', submissionAt(submission.id, '/workbook?state=received'), {
      token: cast.scheduler.token,
    });
    expect(await answer.text()).toBe(SEVEN.join('\r\n') + '\r\n');
    expect(answer.headers.get('content-disposition')).toContain('filename="list.csv"');
  });

  it('shows a piece of the sheet', async () => {
    const answer = await ask('GET', submissionAt(submission.id, '/rows?sheet=list&rows=5,7'), {
      token: cast.analyst.token,
    });
    const sheet = (
      await json<{ items: ActivityView[] }>(
        await ask('GET', submissionAt(submission.id, '/activities'), { token: cast.analyst.token }),
      )
    ).items[0]?.sheet;
    if (sheet !== 'list') expect(answer.status).toBe(422);
    const piece = await ask('GET', submissionAt(submission.id, `/rows?sheet=${sheet}&rows=5,7`), {
      token: cast.analyst.token,
    });
    expect(await json(piece)).toMatchObject({
      columns: [
        { field: 'id' },
        { field: 'name' },
        { field: 'optimistic' },
        { field: 'likely' },
        { field: 'pessimistic' },
        { field: 'predecessors' },
      ],
      rows: [
        {
          row: 5,
          received: { cells: ['D', 'Cure', '5', '4', '6', 'C'], estimates: { optimistic: 5, likely: 4 } },
        },
        { row: 7, corrected: { cells: ['F', 'Backfill', '2', '3', '4', 'D, Z9'] } },
      ],
    });
  });
});

describe('who may', () => {
  type Who = 'administrator' | 'analyst' | 'reviewer' | 'scheduler' | 'otherScheduler' | 'stranger';
  const everyone: Who[] = ['administrator', 'analyst', 'reviewer', 'scheduler', 'otherScheduler', 'stranger'];

  it('upload', async () => {
    const answers: number[] = [];
    for (const [index, who] of everyone.entries()) {
      const list = [...SEVEN, `H${index},More,1,2,3,A`];
      answers.push((await upload(cast[who].token, cast.projects.hull, csv(list))).status);
    }
    expect(answers).toEqual([403, 201, 403, 201, 404, 404]);
    expect((await upload(cast.readOnly, cast.projects.hull, csv(SEVEN))).status).toBe(403);
  });

  it.each([
    '',
    '/activities',
    '/findings',
    '/corrections',
    '/analysis',
    '/chance?days=20',
    '/workbook',
    '/comments',
    '/record',
  ])('read%s of a submission', async (rest) => {
    const { id } = await received(cast.analyst.token, cast.projects.hull, SEVEN);
    const answers: number[] = [];
    for (const who of everyone) {
      answers.push((await ask('GET', submissionAt(id, rest), { token: cast[who].token })).status);
    }
    expect(answers).toEqual([200, 200, 200, 200, 404, 404]);
    expect((await ask('GET', submissionAt(id, rest))).status).toBe(401);
    expect((await ask('GET', submissionAt(id, rest), { token: cast.revoked })).status).toBe(401);
    expect(
      (await ask('GET', submissionAt(crypto.randomUUID(), rest), { token: cast.analyst.token })).status,
    ).toBe(404);
  });

  it('list intake of nobody’s project', async () => {
    const answer = await upload(cast.analyst.token, crypto.randomUUID(), csv(SEVEN));
    expect(answer.status).toBe(404);
  });
});

describe('a second file', () => {
  it('is the next revision, and supersedes the one before', async () => {
    const first = await received(cast.analyst.token, cast.projects.rig, SEVEN);
    const second = await received(cast.otherScheduler.token, cast.projects.rig, [...SEVEN, 'H,More,1,2,3,A']);
    expect(second.revision).toBe(first.revision + 1);
    const { items } = await json<{ items: SubmissionView[] }>(
      await ask('GET', `/api/offices/${SLUG}/projects/${cast.projects.rig}/submissions`, {
        token: cast.analyst.token,
      }),
    );
    expect(items.map(({ revision, status, version }) => [revision, status, version])).toEqual([
      [first.revision, 'superseded', 1],
      [second.revision, 'received', 0],
    ]);
    const project = await ask('GET', `/api/offices/${SLUG}/projects/${cast.projects.rig}`, {
      token: cast.analyst.token,
    });
    expect(await json(project)).toMatchObject({
      latest: { id: second.id, revision: second.revision, open: second.open },
    });
  });

  it('that is the first one again is a second click: refused, unless it is meant', async () => {
    const { token } = cast.analyst;
    const list = csv([...SEVEN, 'X,Twice,1,2,3,A']);
    const both = await Promise.all([
      upload(token, cast.projects.rig, list),
      upload(token, cast.projects.rig, list),
    ]);
    expect(both.map((answer) => answer.status).sort()).toEqual([201, 409]);
    const refused = both.find((answer) => answer.status === 409);
    expect((await json<Problem>(refused!)).detail).toMatch(/^This very file is already Rev \d+\.$/);
    expect((await upload(token, cast.projects.rig, list, { again: 'false' })).status).toBe(409);
    expect((await upload(token, cast.projects.rig, list, { again: 'true' })).status).toBe(201);
    expect((await upload(token, cast.projects.rig, list)).status).toBe(201);
  });

  it('gets a number of its own when several come at once', async () => {
    const answers = await Promise.all(
      [1, 2, 3, 4].map((n) =>
        received(cast.analyst.token, cast.projects.rig, [...SEVEN, `N${n},More,1,2,3,A`]),
      ),
    );
    expect(new Set(answers.map(({ revision }) => revision)).size).toBe(4);
  });
});

describe('a file that is refused', () => {
  const zip = new Uint8Array([0x50, 0x4b, 3, 4, 1, 2, 3, 4, 5, 6, 7, 8]);
  const compound = new Uint8Array([
    0xd0,
    0xcf,
    0x11,
    0xe0,
    0xa1,
    0xb1,
    0x1a,
    0xe1,
    ...new Array<number>(600).fill(0),
  ]);
  it.each<[string, () => File, number]>([
    ['is empty', () => new File([], 'list.csv'), 422],
    [
      'is a picture',
      () => new File([new Uint8Array([0x89, 0x50, 0x4e, 0x47, 13, 10, 26, 10, 0, 0, 0, 13, 0])], 'p.png'),
      422,
    ],
    ['is a broken workbook', () => new File([zip], 'list.xlsx'), 422],
    ['is an old binary workbook', () => new File([compound], 'list.xls'), 422],
    ['has no column that could be an ID', () => csv(['Colour,Weather', 'red,rain', 'blue,sun']), 422],
    [
      'has more than 200 000 rows',
      () => csv(['ID,Duration', ...Array.from({ length: 200_001 }, (_, i) => `${i + 1},1`)]),
      422,
    ],
    ['is over 20 MB', () => new File([new Uint8Array(20 * 1024 * 1024 + 1).fill(65)], 'list.csv'), 413],
  ])('because it %s leaves nothing behind', async (_name, file, status) => {
    const before = await countRows();
    const answer = await upload(cast.analyst.token, cast.projects.hull, file());
    expect(answer.status).toBe(status);
    expect(answer.headers.get('content-type')).toBe('application/problem+json');
    expect((await json<Problem>(answer)).detail).toMatch(/^[A-Z].*\.$/s);
    expect(await countRows()).toEqual(before);
  });

  it('is told which field is at fault in what came with it', async () => {
    const attempts: [Record<string, string>, string][] = [
      [{ columns: '{"id":' }, 'columns'],
      [{ columns: '{"id":-1}' }, 'columns.id'],
      [{ headerRow: 'one' }, 'headerRow'],
      [{ sheet: 'Nowhere' }, 'sheet'],
    ];
    for (const [fields, path] of attempts) {
      const answer = await upload(cast.analyst.token, cast.projects.hull, csv(SEVEN), fields);
      expect(answer.status).toBe(422);
      expect((await json<Problem>(answer)).errors?.[0]?.path).toBe(path);
    }
    const path = `/api/offices/${SLUG}/projects/${cast.projects.hull}/submissions`;
    const without = await ask('POST', path, { token: cast.analyst.token, form: new FormData() });
    expect([without.status, (await json<Problem>(without)).errors?.[0]?.path]).toEqual([422, 'file']);
    const noForm = await ask('POST', path, { token: cast.analyst.token, body: {} });
    expect(noForm.status).toBe(415);
  });
});

describe('text that a database will not hold', () => {
  it('is kept with a mark in its place', async () => {
    const list = [...SEVEN.slice(0, 2), 'B\u0000,Half \ud83d of a pair and \\u0000 written out,1,2,3,A'];
    const answer = await upload(cast.analyst.token, cast.projects.hull, csv(list, 'n\u0000me.csv'));
    expect(answer.status).toBeLessThan(500);
  });
});

describe('a list that is blocked', () => {
  it('says so, and what it would be with the proposed fixes', async () => {
    const submission = await received(cast.analyst.token, cast.projects.hull, BLOCKED);
    expect(submission.findings.blocks).toBeGreaterThanOrEqual(2);
    expect(submission.figures.received).toMatchObject({
      computable: false,
      expectedDuration: null,
      finish: null,
    });
    const analysis = await json<{ because: string[]; loops: string[][] }>(
      await ask('GET', submissionAt(submission.id, '/analysis?state=received'), {
        token: cast.analyst.token,
      }),
    );
    expect(analysis).toMatchObject({ computable: false, loops: [expect.arrayContaining(['B', 'C', 'D'])] });
    const { items } = await json<{ items: FindingView[] }>(
      await ask('GET', submissionAt(submission.id, '/findings'), { token: cast.analyst.token }),
    );
    expect(analysis.because).toEqual(items.filter(({ weight }) => weight === 'blocks').map(({ id }) => id));
    expect(items.every(({ fix }) => !fix || fix.effect === null)).toBe(true);
    expect(submission.figures.proposed).toMatchObject({ state: 'proposed', computable: true });
    const proposed = await json<{ expectedDuration: number }>(
      await ask('GET', submissionAt(submission.id, '/analysis?state=proposed'), {
        token: cast.analyst.token,
      }),
    );
    expect(proposed.expectedDuration).toBe(submission.figures.proposed?.expectedDuration);
    const chance = await ask('GET', submissionAt(submission.id, '/chance?days=20'), {
      token: cast.analyst.token,
    });
    expect(chance.status).toBe(409);
    expect(await json(chance)).toMatchObject({ because: analysis.because });
  });
});
