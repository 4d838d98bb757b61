import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { isOrder, keepPlaces, ordered, ORDERS, type FindingOrder } from '@/components/findings/order';
import { finding, fix } from '@/tests/support/findings';

const moves = (days: number) => fix(1, { effect: { expectedDuration: days, variance: 0 } });
const rowsOf = (order: FindingOrder, findings: Parameters<typeof ordered>[0]) =>
  ordered(findings, order).map(({ row }) => row);

describe('the orders of the grid', () => {
  it('puts first what costs most, whichever way it moves the finish; what blocks before all', () => {
    const findings = [
      finding(2, { fix: moves(1.3) }),
      finding(3, { fix: moves(-4) }),
      finding(4, { weight: 'query' }),
      finding(5),
      finding(6, { weight: 'blocks' }),
    ];
    expect(rowsOf('costliest', findings)).toEqual([6, 3, 2, 5, 4]);
  });

  it('goes down the sheet by row number, what hangs on the whole list last', () => {
    const findings = [
      finding(100),
      finding(9),
      finding(7, { row: null, sheet: null, cell: null }),
      finding(20),
    ];
    expect(rowsOf('row', findings)).toEqual([9, 20, 100, null]);
  });

  it('counts in numbers within an ID', () => {
    const findings = [finding(1, { activityId: 'A-10' }), finding(2, { activityId: 'A-9' })];
    expect(rowsOf('activity', findings)).toEqual([2, 1]);
  });

  it('gives the same order whatever order they came in', () => {
    const findings = Array.from({ length: 12 }, (_, n) =>
      finding(n, {
        row: n % 3 === 0 ? null : n % 4,
        weight: n % 2 ? 'query' : 'distorts',
        fix: moves(n % 5),
      }),
    );
    const orders = fc.constantFrom(...(Object.keys(ORDERS) as FindingOrder[]));
    fc.assert(
      fc.property(orders, fc.shuffledSubarray(findings, { minLength: 12 }), (order, shuffled) => {
        expect(ordered(shuffled, order)).toEqual(ordered(findings, order));
      }),
    );
  });

  it('keeps the places while rows change under the hand, and puts new ones at the end', () => {
    const corrected = [finding(3, { state: 'corrected' }), finding(1), finding(8), finding(2)];
    const places = [finding(2), finding(3), finding(1)].map((known) => known.id);
    expect(keepPlaces(corrected, places).map(({ row }) => row)).toEqual([2, 3, 1, 8]);
  });

  it('knows its own names only', () => {
    expect(isOrder('weight')).toBe(true);
    expect(isOrder('toString')).toBe(false);
    expect(isOrder(null)).toBe(false);
  });
});
