import { describe, expect, it } from 'vitest';
import {
  countFindings,
  filterFromQuery,
  filterToQuery,
  isFiltered,
  matches,
  NO_FILTER,
  toggled,
} from '@/components/findings/filter';
import { finding } from '@/tests/support/findings';

const all = [
  finding(1, { weight: 'blocks', rule: 'loop', title: 'A loop', activityId: null, activityName: null }),
  finding(2),
  finding(3, { state: 'corrected' }),
  finding(4, {
    weight: 'query',
    rule: 'lead',
    title: 'A negative lag',
    message: 'Waits 3 days less for D-205.',
  }),
];
const kept = (filter: Parameters<typeof matches>[0]) => all.filter(matches(filter)).map(({ row }) => row);

describe('the filter', () => {
  it('leaves everything in while nothing is chosen', () => {
    expect(kept(NO_FILTER)).toEqual([1, 2, 3, 4]);
    expect(isFiltered(NO_FILTER)).toBe(false);
  });

  it('joins what is chosen of one kind, and narrows by each kind', () => {
    expect(kept({ ...NO_FILTER, weights: new Set(['blocks', 'query'] as const) })).toEqual([1, 4]);
    expect(
      kept({
        ...NO_FILTER,
        weights: new Set(['distorts'] as const),
        states: new Set(['corrected'] as const),
      }),
    ).toEqual([3]);
    expect(kept({ ...NO_FILTER, rules: new Set(['lead']) })).toEqual([4]);
  });

  it('finds every word typed, in whatever part of the finding', () => {
    expect(kept({ ...NO_FILTER, text: 'negative d-205' })).toEqual([4]);
    expect(kept({ ...NO_FILTER, text: '  PILES g3 ' })).toEqual([3]);
    expect(kept({ ...NO_FILTER, text: 'piles nowhere' })).toEqual([]);
  });

  it('survives being written into the address', () => {
    const filter = {
      weights: new Set(['distorts', 'query'] as const),
      rules: new Set(['lead', 'loop']),
      states: new Set(['open'] as const),
      text: 'pile & cap',
    };
    expect(filterFromQuery(new URLSearchParams(filterToQuery(filter).toString()))).toEqual(filter);
  });

  it('drops what the address has invented', () => {
    expect(filterFromQuery(new URLSearchParams('weight=heavy&state=lost'))).toEqual(NO_FILTER);
  });
});

it('counts by weight, state and rule, the most frequent rule first', () => {
  const counts = countFindings(all);
  expect(counts.weights).toEqual({ blocks: 1, distorts: 2, query: 1 });
  expect(counts.states).toEqual({ open: 3, corrected: 1, waived: 0, answered: 0 });
  expect(counts.rules.map(({ rule, count }) => [rule, count])).toEqual([
    ['likely-below-optimistic', 2],
    ['lead', 1],
    ['loop', 1],
  ]);
});

it('takes a member in and out of a copy', () => {
  const set = new Set(['x']);
  expect([...toggled(set, 'y')]).toEqual(['x', 'y']);
  expect([...toggled(set, 'x')]).toEqual([]);
  expect([...set]).toEqual(['x']);
});
