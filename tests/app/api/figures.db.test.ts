import { beforeAll, describe, expect, it } from 'vitest';
import type { AnalysisView, ChanceView, SubmissionView } from '@/lib/contract/submission';
import type { Problem } from '@/lib/contract/shared';
import { makeCast, SLUG, type Cast } from '@/tests/support/cast';
import { testDatabase } from '@/tests/support/database';
import { ask, json } from '@/tests/support/http';
import { received, SEVEN, submissionAt } from '@/tests/support/uploads';

testDatabase();
let cast: Cast;
let submission: SubmissionView;

beforeAll(async () => {
  cast = await makeCast();
  submission = await received(cast.analyst.token, cast.projects.hull, SEVEN);
});

const get = (rest: string) => ask('GET', submissionAt(submission.id, rest), { token: cast.analyst.token });

describe('the analysis', () => {
  let analysis: Extract<AnalysisView, { computable: true }>;
  beforeAll(async () => {
    analysis = await json(await get('/analysis?state=received'));
  });

  // Worked by hand: A 2, B 4, C 3, D 4.5, E 1, F 3, G 0 in a row but for E beside F.
  it('has the four times of each activity', () => {
    const times = analysis.activities.map((each) => [
      each.id,
      each.expected,
      each.earlyStart,
      each.earlyFinish,
      each.lateStart,
      each.lateFinish,
      each.totalFloat,
      each.freeFloat,
      each.critical,
    ]);
    expect(times).toEqual([
      ['A', 2, 0, 2, 0, 2, 0, 0, true],
      ['B', 4, 2, 6, 2, 6, 0, 0, true],
      ['C', 3, 6, 9, 6, 9, 0, 0, true],
      ['D', 4.5, 9, 13.5, 9, 13.5, 0, 0, true],
      ['E', 1, 13.5, 14.5, 15.5, 16.5, 2, 2, false],
      ['F', 3, 13.5, 16.5, 13.5, 16.5, 0, 0, true],
      ['G', 0, 16.5, 16.5, 16.5, 16.5, 0, 0, true],
    ]);
  });

  it('has the path, its variance and the dates', () => {
    expect(analysis).toMatchObject({
      computable: true,
      unit: 'working day',
      // A Monday; day 16.5 ends in the 17th working day.
      start: '2027-03-01',
      finish: '2027-03-23',
      expectedDuration: 16.5,
      criticalPaths: [['A', 'B', 'C', 'D', 'F', 'G']],
      criticalPathCount: 1,
    });
    expect(analysis.variance).toBeCloseTo(89 / 36, 12);
    expect(analysis.standardDeviation).toBeCloseTo(Math.sqrt(89 / 36), 12);
    const [a, , , d] = analysis.activities;
    expect([a?.startDate, a?.finishDate]).toEqual(['2027-03-01', '2027-03-02']);
    expect([d?.startDate, d?.finishDate]).toEqual(['2027-03-12', '2027-03-18']);
    expect(d?.predecessors).toEqual([{ id: 'C', type: 'FS', lag: 0 }]);
  });

  it('is of the corrected state unless another is asked for, and of no other', async () => {
    expect(await json(await get('/analysis'))).toMatchObject({ state: 'corrected' });
    expect((await get('/analysis?state=imagined')).status).toBe(422);
  });
});

describe('the chance', () => {
  const sd = Math.sqrt(89 / 36);

  it('within a number of days', async () => {
    const chance = await json<ChanceView>(await get('/chance?days=18&state=received'));
    expect(chance).toMatchObject({ days: 18, date: '2027-03-24', expectedDuration: 16.5 });
    expect(chance.z).toBeCloseTo(1.5 / sd, 12);
    expect(chance.before + chance.after).toBeCloseTo(1, 15);
    // z = 0.95 in the printed table of the cumulative normal distribution.
    expect(chance.table).toEqual({ z: 0.95, before: 0.8289 });
  });

  it('by a date, to its end', async () => {
    const chance = await json<ChanceView>(await get('/chance?date=2027-03-24'));
    expect(chance).toMatchObject({ days: 18, date: '2027-03-24' });
    const weekend = await json<ChanceView>(await get('/chance?date=2027-03-28'));
    expect(weekend).toMatchObject({ days: 20, date: '2027-03-28' });
  });

  it('for a confidence', async () => {
    const chance = await json<ChanceView>(await get('/chance?confidence=0.8289'));
    expect(chance.days).toBeCloseTo(16.5 + 0.9498 * sd, 3);
    expect(chance.before).toBeCloseTo(0.8289, 12);
  });

  it.each([
    ['', 'days'],
    ['?days=3&date=2027-03-24', 'days'],
    ['?days=', 'days'],
    ['?days=soon', 'days'],
    ['?confidence=1', 'confidence'],
    ['?confidence=0', 'confidence'],
    ['?date=24.3.2027', 'date'],
    ['?date=2027-02-29', 'date'],
    ['?days=3&state=imagined', 'state'],
  ])('asked by %j is refused', async (query, path) => {
    const answer = await get(`/chance${query}`);
    expect(answer.status).toBe(422);
    expect((await json<Problem>(answer)).errors?.[0]?.path).toBe(path);
  });
});

describe('a project that changes', () => {
  it('moves every date and no duration', async () => {
    const calendar = { workingDays: [1, 2, 3, 4], holidays: ['2027-03-02'] };
    await ask('PATCH', `/api/offices/${SLUG}/projects/${cast.projects.hull}`, {
      token: cast.analyst.token,
      body: { calendar, start: '2027-02-27', targetFinish: '2027-04-01' },
    });
    const view = await json<SubmissionView>(await get(''));
    expect(view.figures.received).toMatchObject({ expectedDuration: 16.5, finish: '2027-03-30' });
    const chance = await json<ChanceView>(await get('/chance?date=2027-04-01'));
    expect(view.figures.received.chanceOfTarget).toBe(chance.before);
    expect(await json(await get('/analysis'))).toMatchObject({ start: '2027-03-01', finish: '2027-03-30' });
    const cleared = { targetFinish: null };
    await ask('PATCH', `/api/offices/${SLUG}/projects/${cast.projects.hull}`, {
      token: cast.analyst.token,
      body: cleared,
    });
    expect((await json<SubmissionView>(await get(''))).figures.corrected.chanceOfTarget).toBeNull();
  });
});
