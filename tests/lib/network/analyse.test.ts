import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { SCHEDULES } from '@/fixtures/networks/schedules';
import { TANGLES } from '@/fixtures/networks/tangles';
import { analyse, type Analysis, compile } from '@/lib/network';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { list } from '@/tests/support/networks';
import { randomLists } from './random-lists';
import { reference } from './reference';

type Computed = Extract<Analysis, { computable: true }>;

function analysed(activities: ActivityList): Computed {
  const analysis = analyse(compile(activities));
  if (!analysis.computable) throw new Error('This list should be computable.');
  return analysis;
}

const named = (activities: ActivityList, path: readonly number[]) =>
  path.map((i) => activities.activities[i]?.id);

describe.each(SCHEDULES)('$name', ({ rows, finish, variance, paths, times }) => {
  const activities = list(...rows);
  const analysis = analysed(activities);

  it('has the times and floats worked out by hand', () => {
    for (const [id, expected] of Object.entries(times)) {
      const i = activities.indexOf.get(id) ?? -1;
      const { earlyStart, earlyFinish, lateStart, lateFinish, totalFloat, freeFloat } = analysis.times;
      const found = [earlyStart, earlyFinish, lateStart, lateFinish, totalFloat, freeFloat].map(
        (by) => by[i],
      );
      expected.forEach((value, k) => expect(found[k], `${id}, figure ${k}`).toBeCloseTo(value, 9));
      expect(analysis.times.critical[i], id).toBe(expected[4] === 0 ? 1 : 0);
    }
  });

  it('has the finish, the variance and the critical paths worked out by hand', () => {
    expect(analysis.expectedDuration).toBeCloseTo(finish, 9);
    expect(analysis.variance).toBeCloseTo(variance, 9);
    expect(analysis.standardDeviation).toBeCloseTo(Math.sqrt(variance), 9);
    expect(analysis.criticalPaths.map((path) => named(activities, path))).toEqual(paths);
    expect(analysis.criticalPathCount).toBe(paths.length);
  });
});

describe('any schedule', () => {
  const same = (found: Float64Array, expected: readonly number[]) =>
    expected.forEach((value, i) => expect(found[i]).toBeCloseTo(value, 8));

  it.each([
    ['in whole days', randomLists({ size: 9, links: 16 })],
    ['in quarters', randomLists({ size: 9, links: 16, step: 0.25 })],
    ['with many ties', randomLists({ size: 7, links: 20, step: 4 })],
  ])('is what the definitions say, %s', (_, lists) => {
    fc.assert(
      fc.property(lists, (activities) => {
        const expected = reference(activities);
        const { times, ...analysis } = analysed(activities);
        expect(analysis.expectedDuration).toBeCloseTo(expected.finish, 8);
        same(times.earlyStart, expected.earlyStart);
        same(times.lateStart, expected.lateStart);
        same(times.freeFloat, expected.freeFloat);
        expect([...times.critical].map(Boolean)).toEqual(expected.critical);
        expect(analysis.variance).toBeCloseTo(expected.variance, 8);
        expect(analysis.criticalPathCount).toBe(expected.paths.length);
        const byText = (paths: readonly (readonly number[])[]) => paths.map((path) => path.join()).sort();
        if (expected.paths.length <= 50)
          expect(byText(analysis.criticalPaths)).toEqual(byText(expected.paths));
      }),
      { numRuns: 400 },
    );
  });

  it('lets an activity slip by its free float, and no further, without moving anything else', () => {
    const lists = randomLists({ size: 8, links: 14 });
    fc.assert(
      fc.property(lists, fc.nat(), (activities, pick) => {
        const i = pick % activities.activities.length;
        const id = activities.activities[i]?.id ?? '';
        const before = analysed(activities);
        const slip = (days: number) => {
          // A link from a start at time 0 holds the activity back by that much.
          const held = list(...toRows(activities), 'HOLD 0');
          const link = { from: 'HOLD', to: id, fromIndex: held.activities.length - 1, toIndex: i };
          const lag = (before.times.earlyStart[i] ?? 0) + days;
          const links = [...held.links, { ...link, type: 'SS', lag, linkCell: 0, item: 0 } as const];
          return analysed({ ...held, links });
        };
        const moved = (after: Computed) =>
          after.expectedDuration > before.expectedDuration + 1e-9 ||
          [...before.times.earlyStart].some((t, k) => k !== i && (after.times.earlyStart[k] ?? 0) > t + 1e-9);
        const free = before.times.freeFloat[i] ?? 0;
        expect(moved(slip(free))).toBe(false);
        expect(moved(slip(free + 0.01))).toBe(true);
      }),
    );
  });

  const toRows = ({ activities, links }: ActivityList) =>
    activities.map(({ id, index, optimistic, likely, pessimistic }) => {
      const into = links
        .filter(({ toIndex }) => toIndex === index)
        .map(({ from, type, lag }) => `${from} ${type}${lag < 0 ? '' : '+'}${lag}`);
      const row = `${id} ${optimistic.text} ${likely.text} ${pessimistic.text}`;
      return into.length > 0 ? `${row} <- ${into.join(', ')}` : row;
    });
});

describe('critical paths without number', () => {
  const diamonds = (count: number) =>
    list(
      'D0 1',
      ...Array.from({ length: count }, (_, k) => [
        `L${k} 2 <- D${k}`,
        `R${k} 1 2 3 <- D${k}`,
        `D${k + 1} 1 <- L${k}, R${k}`,
      ]).flat(),
    );

  it('are counted, and fifty are listed', () => {
    const activities = diamonds(20);
    const { criticalPaths, criticalPathCount, variance } = analysed(activities);
    expect(criticalPathCount).toBe(2 ** 20);
    expect(variance).toBeCloseTo(20 / 9, 9);
    expect(new Set(criticalPaths.map(String)).size).toBe(50);
    expect(named(activities, criticalPaths[0] ?? []).filter((id) => id?.startsWith('R'))).toHaveLength(20);
  });

  it('are counted to a double’s precision beyond what it holds exactly', () => {
    expect(analysed(diamonds(60)).criticalPathCount).toBe(2 ** 60);
    expect(analysed(diamonds(52)).criticalPathCount).toBe(2 ** 52);
    expect(analysed(diamonds(1100)).criticalPathCount).toBe(Number.MAX_VALUE);
  });
});

describe('what cannot be computed, or hardly', () => {
  it('gives the tangles where there is a loop', () => {
    const analysis = analyse(compile(list(...(TANGLES[0]?.rows ?? []))));
    expect(analysis).toMatchObject({ computable: false, tangles: [{ loop: [0, 1, 2], cut: [0] }] });
  });

  it('takes tangles that are known already as they are', () => {
    const network = compile(list(...(TANGLES[0]?.rows ?? [])));
    expect(analyse(network, [])).toEqual({ computable: false, tangles: [] });
  });

  it('takes a list without activities', () => {
    expect(analysed(list())).toMatchObject({
      expectedDuration: 0,
      variance: 0,
      criticalPaths: [],
      criticalPathCount: 0,
    });
  });

  it('takes negative estimates and a chain fifty thousand long', () => {
    expect(analysed(list('A -3', 'B 2 <- A')).expectedDuration).toBe(2);
    const rows = Array.from({ length: 50_000 }, (_, i) => (i === 0 ? 'N0 1' : `N${i} 1 <- N${i - 1}`));
    const { expectedDuration, criticalPaths } = analysed(list(...rows));
    expect(expectedDuration).toBe(50_000);
    expect(criticalPaths[0]).toHaveLength(50_000);
  });
});
