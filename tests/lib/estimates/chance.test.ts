import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { chance, chanceBy, daysFor, tableValue, tableZ } from '@/lib/estimates';

describe('the chance of a finish', () => {
  it('is a half at the mean', () => {
    expect(chance(44, 44, 3)).toEqual({ z: 0, before: 0.5, after: 0.5 });
  });

  it('keeps both tails', () => {
    const { z, before, after } = chance(74, 44, 3);
    expect(z).toBe(10);
    expect(before).toBe(1);
    expect(after).toBeGreaterThan(7e-24);
    expect(after).toBeLessThan(8e-24);
  });

  it('is a step where nothing is uncertain', () => {
    expect(chance(43.9, 44, 0)).toEqual({ z: null, before: 0, after: 1 });
    expect(chance(44, 44, 0)).toEqual({ z: null, before: 1, after: 0 });
    expect(chanceBy(44, 44 + 1e-12, 0)).toBe(1);
  });

  it('is undone by the days for a confidence', () => {
    const mean = fc.double({ min: 1, max: 500, noNaN: true });
    const sd = fc.double({ min: 0.1, max: 50, noNaN: true });
    fc.assert(
      fc.property(fc.double({ min: 0.001, max: 0.999, noNaN: true }), mean, sd, (confidence, m, s) => {
        expect(chanceBy(daysFor(confidence, m, s), m, s)).toBeCloseTo(confidence, 10);
      }),
    );
    expect(daysFor(0.9, 44, 0)).toBe(44);
    expect(daysFor(0.5, 44, 3)).toBe(44);
  });
});

describe('the printed table', () => {
  it('takes z to two decimals, halves away from zero', () => {
    expect(tableZ(0.5669)).toBe(0.57);
    expect(tableZ(1.005)).toBe(1.01);
    expect(tableZ(-1.005)).toBe(-1.01);
    expect(tableZ(-0.001)).toBe(0);
    expect(tableZ(Infinity)).toBe(Infinity);
  });

  it('gives the area to four decimals', () => {
    expect(tableValue(0.5669)).toBe(0.7157);
    expect(tableValue(-1.2845)).toBe(0.1003);
  });
});
