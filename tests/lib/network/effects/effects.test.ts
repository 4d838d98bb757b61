import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { analyse, compile, prepareEffects } from '@/lib/network';
import type { Link } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import type { NetworkChange } from '@/lib/schedule/edit';
import { RELATIONS } from '@/lib/schedule/relation';
import { list } from '@/tests/support/networks';
import { randomLists } from '../random-lists';

const effectsOf = (activities: ActivityList) => prepareEffects(compile(activities));

describe('the finish effect of a fix', () => {
  const activities = list('A 2', 'B 4 <- A', 'C 1 <- A', 'D 1 2 9 <- B, C');
  const effects = effectsOf(activities);

  it('is what changed estimates do to the finish and to the variance', () => {
    expect(
      effects.effect([{ kind: 'estimates', activity: 3, optimistic: 1, likely: 2, pessimistic: 3 }]),
    ).toEqual({ expectedDuration: -1, variance: expect.closeTo(4 / 36 - 64 / 36, 12) });
    expect(
      effects.effect([{ kind: 'estimates', activity: 2, optimistic: 5, likely: 5, pessimistic: 5 }]),
    ).toEqual({ expectedDuration: 1, variance: 0 });
  });

  it('is what links do: removed, added, of another lag', () => {
    expect(effects.effect([{ kind: 'remove-link', link: 0 }])?.expectedDuration).toBe(-2);
    expect(effects.effect([{ kind: 'change-lag', link: 1, lag: 4.5 }])?.expectedDuration).toBe(1.5);
    expect(effects.effect([{ kind: 'add-link', from: 1, to: 2, type: 'FS', lag: 0 }])?.expectedDuration).toBe(
      1,
    );
  });

  it('is nothing for what has float, for no change, and for what the network goes without', () => {
    const none = { expectedDuration: 0, variance: 0 };
    expect(effects.effect([{ kind: 'change-lag', link: 1, lag: 2 }])).toEqual(none);
    expect(effects.effect([])).toEqual(none);
    expect(effects.effect([{ kind: 'remove-link', link: 99 }])).toEqual(none);
    expect(effects.effect([{ kind: 'add-link', from: -1, to: 2, type: 'FS', lag: 0 }])).toEqual(none);
    const unknown = effectsOf(list('A 2 <- Z9, A', 'B 1 <- A'));
    expect(unknown.effect([{ kind: 'remove-link', link: 0 }])).toEqual(none);
    expect(unknown.effect([{ kind: 'change-lag', link: 1, lag: 7 }])).toEqual(none);
    expect(effectsOf(list()).effect([])).toEqual(none);
  });

  it('is null where a link closes a loop, and where the list has one', () => {
    const back: NetworkChange = { kind: 'add-link', from: 3, to: 0, type: 'SS', lag: 0 };
    expect(effects.effect([back])).toBeNull();
    expect(effects.effect([{ ...back, from: 0 }])).toBeNull();
    expect(effectsOf(list('A 1 <- B', 'B 1 <- A')).effect([{ kind: 'remove-link', link: 0 }])).toBeNull();
  });

  it('takes a link that replaces another, against the order of the list', () => {
    const replaced = effectsOf(list('A 1', 'B 2 <- A', 'C 3 <- B')).effect([
      { kind: 'remove-link', link: 1 },
      { kind: 'add-link', from: 2, to: 0, type: 'FS', lag: 0 },
    ]);
    expect(replaced).toEqual({ expectedDuration: 0, variance: 0 });
    const turned = effectsOf(list('A 1', 'B 2 <- A')).effect([
      { kind: 'remove-link', link: 0 },
      { kind: 'add-link', from: 1, to: 0, type: 'FS', lag: 3 },
      { kind: 'estimates', activity: 0, optimistic: 4, likely: 4, pessimistic: 4 },
    ]);
    expect(turned).toEqual({ expectedDuration: 6, variance: 0 });
  });
});

it('finds the largest variance among many that finish at once, some of them moved', () => {
  // All take 5 days; the spread, and with it the variance, goes up from each to the next.
  const spread = Array.from({ length: 50 }, (_, k) => `A${k} ${4 - k / 20} 5 ${6 + k / 20}`);
  const effects = effectsOf(list(...spread));
  const varianceOf = (k: number) => ((2 + k / 10) / 6) ** 2;
  const shorten = (activity: number): NetworkChange => {
    return { kind: 'estimates', activity, optimistic: 1, likely: 1, pessimistic: 1 };
  };
  expect(effects.effect([shorten(3)])).toEqual({ expectedDuration: 0, variance: 0 });
  expect(effects.effect([shorten(49), shorten(48)])).toEqual({
    expectedDuration: 0,
    variance: expect.closeTo(varianceOf(47) - varianceOf(49), 12),
  });
});

describe('a wide schedule of equal ways', () => {
  const across = Array.from({ length: 100 }, (_, k) => k);
  const layer = (k: number) =>
    across.map((i) => `${'PQRSTUVWXY'[k]}${i} 5 <- ${k === 0 ? 'A' : `${'PQRSTUVWXY'[k - 1]}${i}`}`);
  const layers = Array.from({ length: 10 }, (_, k) => layer(k)).flat();
  const last = across.map((i) => `Y${i}`).join(', ');
  const effects = effectsOf(list('A 5', ...layers, `Z 1 4 7 <- ${last}`));

  it('moves as a whole, or not at all for one of its ways', () => {
    const estimates = (activity: number, days: number): NetworkChange => ({
      ...{ kind: 'estimates', activity },
      ...{ optimistic: days, likely: days, pessimistic: days },
    });
    const duration = (...changes: NetworkChange[]) => effects.effect(changes)?.expectedDuration;
    expect(duration(estimates(0, 2))).toBe(-3);
    expect(duration(estimates(0, 7.5))).toBe(2.5);
    expect(duration(estimates(1, 2))).toBe(0);
    expect(duration(estimates(1, 9))).toBe(4);
    expect(duration(...across.map((i) => estimates(1 + i, 4)))).toBe(-1);
    expect(duration(...across.slice(1).map((i) => estimates(1 + i, 4)))).toBe(0);
    expect(
      effects.effect([{ kind: 'estimates', activity: 1, optimistic: 2, likely: 5, pessimistic: 8 }]),
    ).toEqual({ expectedDuration: 0, variance: 1 });
  });
});

describe('any finish effect', () => {
  const days = fc.integer({ min: 0, max: 16 }).map((n) => n / 2);
  const lag = fc.integer({ min: -8, max: 8 }).map((n) => n / 2);
  const change = (activities: number, links: number): fc.Arbitrary<NetworkChange> => {
    const activity = fc.nat(activities - 1);
    const link = fc.nat(Math.max(0, links - 1));
    const type = fc.constantFrom(...RELATIONS);
    return fc.oneof(
      fc.tuple(activity, days, days, days).map(([index, ...three]) => {
        const [optimistic = 0, likely = 0, pessimistic = 0] = three.sort((x, y) => x - y);
        return { kind: 'estimates', activity: index, optimistic, likely, pessimistic } as const;
      }),
      fc.record({ kind: fc.constant('remove-link' as const), link }),
      fc.record({ kind: fc.constant('change-lag' as const), link, lag }),
      fc.record({ kind: fc.constant('add-link' as const), from: activity, to: activity, type, lag }),
    );
  };

  /** The list with the changes made in it. */
  function changed(activities: ActivityList, changes: readonly NetworkChange[]): ActivityList {
    const result = { activities: [...activities.activities], links: [...activities.links] };
    const added: Link[] = [];
    const removed = new Set<number>();
    for (const made of changes) {
      if (made.kind === 'estimates') {
        const activity = result.activities[made.activity];
        if (!activity) continue;
        result.activities[made.activity] = {
          ...activity,
          optimistic: { ...activity.optimistic, days: made.optimistic },
          likely: { ...activity.likely, days: made.likely },
          pessimistic: { ...activity.pessimistic, days: made.pessimistic },
        };
      } else if (made.kind === 'add-link') {
        const ends = { from: '', to: '', fromIndex: made.from, toIndex: made.to };
        added.push({ ...ends, type: made.type, lag: made.lag, linkCell: 0, item: 0 });
      } else if (made.kind === 'remove-link') removed.add(made.link);
      else {
        const link = result.links[made.link];
        if (link) result.links[made.link] = { ...link, lag: made.lag };
      }
    }
    const kept = result.links.filter((_, k) => !removed.has(k));
    return { ...activities, activities: result.activities, links: [...kept, ...added] };
  }

  it.each([
    ['of few activities', randomLists({ size: 8, links: 16 })],
    ['of many', randomLists({ size: 80, links: 240, step: 0.5 })],
    ['of many with few links', randomLists({ size: 120, links: 100 })],
    ['of many in a row', randomLists({ size: 150, links: 600, near: 5, step: 0.5 })],
    ['of many in a row with ties', randomLists({ size: 150, links: 400, near: 3, step: 4 })],
  ])('is that of computing the list afresh, %s', (_, lists) => {
    const cases = lists.chain((activities) => {
      const one = change(activities.activities.length, activities.links.length);
      return fc.record({
        activities: fc.constant(activities),
        changes: fc.array(fc.array(one, { minLength: 1, maxLength: 4 }), { minLength: 1, maxLength: 12 }),
      });
    });
    fc.assert(
      fc.property(cases, ({ activities, changes }) => {
        const base = analyse(compile(activities), []);
        const effects = effectsOf(activities);
        for (const made of changes) {
          const found = effects.effect(made);
          const selfLink = made.some((each) => each.kind === 'add-link' && each.from === each.to);
          const after = analyse(compile(changed(activities, made)), []);
          if (!base.computable) throw new Error('Random lists without loops are computable.');
          if (!after.computable || selfLink) expect(found).toBeNull();
          else {
            expect(found?.expectedDuration).toBeCloseTo(after.expectedDuration - base.expectedDuration, 9);
            expect(found?.variance).toBeCloseTo(after.variance - base.variance, 9);
          }
        }
      }),
      { numRuns: 200 },
    );
  });
});
