import { describe, expect, it } from 'vitest';
import { activityEffect, momentsOf } from '@/components/findings/bench/activity-effect';
import type { SheetRowsView } from '@/lib/contract/sheet-rows';
import { edit } from '@/tests/support/findings';
import { piece } from './piece';

describe('the moments of three points', () => {
  it('follow the published formulas', () => {
    expect(momentsOf({ optimistic: 2, likely: 4, pessimistic: 12 })).toEqual({
      optimistic: 2,
      likely: 4,
      pessimistic: 12,
      expected: 5,
      variance: (10 / 6) ** 2,
    });
  });

  it('take a missing outer estimate as the likely one, and need the likely one', () => {
    expect(momentsOf({ optimistic: null, likely: 4, pessimistic: 10 })).toMatchObject({
      optimistic: 4,
      expected: 5,
      variance: 1,
    });
    expect(momentsOf({ optimistic: 2, likely: null, pessimistic: 10 })).toBeNull();
    expect(momentsOf(null)).toBeNull();
  });
});

describe('what a fix makes of its activity', () => {
  it('is reckoned from the new values', () => {
    const effect = activityEffect(piece, 23, [edit('G23', 6, 4), edit('H23', 4, 6)]);
    expect(effect?.before.expected).toBeCloseTo(33 / 6, 12);
    expect(effect?.after.expected).toBeCloseTo(39 / 6, 12);
    expect(effect?.after.variance).toBeCloseTo((7 / 6) ** 2, 12);
  });

  it('takes a plain number in a text file for a number', () => {
    expect(activityEffect(piece, 23, [edit('I23', '11', '12')])?.after.expected).toBeCloseTo(34 / 6, 12);
    expect(activityEffect(piece, 23, [edit('I23', '11', '1,200')])).toBeNull();
  });

  it('keeps the unit the cells are in', () => {
    const inWeeks: SheetRowsView = {
      ...piece,
      rows: piece.rows.map((row) => ({
        ...row,
        corrected: { ...row.corrected, estimates: { optimistic: 30, likely: 20, pessimistic: 55 } },
      })),
    };
    const effect = activityEffect(inWeeks, 23, [edit('I23', 11, 12)]);
    expect(effect?.after.expected).toBeCloseTo((30 + 80 + 60) / 6, 12);
  });

  it('is unknown where the unit cannot be told, or no estimate is touched', () => {
    expect(activityEffect(piece, 23, [edit('G23', 6, '2–3 wk')])).toBeNull();
    expect(activityEffect(piece, 23, [edit('J23', 'D-130', 'D-131')])).toBeNull();
    expect(activityEffect(piece, 24, [edit('G24', 6, 4)])).toBeNull();
  });
});
