import { describe, expect, it } from 'vitest';
import { rowsInSight, rowsToDraw, standing } from '@/components/path/rows';
import { activity } from './activity';

describe('standing', () => {
  it('tells critical, near-critical within the chosen float, and slack', () => {
    expect(standing({ critical: true, totalFloat: 0 }, 2)).toBe('critical');
    expect(standing({ critical: false, totalFloat: 2 }, 2)).toBe('near');
    expect(standing({ critical: false, totalFloat: 2.1 }, 2)).toBe('slack');
  });
});

describe('rowsToDraw', () => {
  const list = [
    activity('C', { earlyStart: 5, totalFloat: 9 }),
    activity('B', { earlyStart: 0, totalFloat: 1 }),
    activity('A', { earlyStart: 0, totalFloat: 0, critical: true }),
  ];

  it('puts the earliest first, and of two the one with less float', () => {
    expect(rowsToDraw(list, 'all', 2).map((row) => row.id)).toEqual(['A', 'B', 'C']);
  });

  it('leaves out what is not asked for', () => {
    expect(rowsToDraw(list, 'near', 2).map((row) => row.id)).toEqual(['A', 'B']);
    expect(rowsToDraw(list, 'critical', 2).map((row) => row.id)).toEqual(['A']);
  });

  it('leaves the given list as it was', () => {
    rowsToDraw(list, 'all', 2);
    expect(list.map((row) => row.id)).toEqual(['C', 'B', 'A']);
  });
});

describe('rowsInSight', () => {
  it('covers the window with a margin and stays within the list', () => {
    expect(rowsInSight(0, 300, 30, 1000, 2)).toEqual({ first: 0, end: 12 });
    expect(rowsInSight(3000, 300, 30, 1000, 2)).toEqual({ first: 98, end: 112 });
  });

  it('never ends before it begins', () => {
    const { first, end } = rowsInSight(9e6, 300, 30, 10, 2);
    expect(end).toBeGreaterThanOrEqual(first);
  });
});
