import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { threePoint } from '@/lib/estimates';

describe('three-point estimates', () => {
  it('weigh the likely case four times', () => {
    expect(threePoint(2, 4, 12)).toEqual({ mean: 5, variance: (10 / 6) ** 2 });
    expect(threePoint(0, 0, 0)).toEqual({ mean: 0, variance: 0 });
  });

  it('give a fixed duration back as it is', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1e6, noNaN: true }), (days) => {
        expect(threePoint(days, days, days)).toEqual({ mean: days, variance: 0 });
      }),
    );
  });

  it('stay between the extremes', () => {
    const days = fc.double({ min: 0, max: 1e4, noNaN: true });
    fc.assert(
      fc.property(fc.tuple(days, days, days), (three) => {
        const [a = 0, m = 0, b = 0] = [...three].sort((x, y) => x - y);
        const { mean, variance } = threePoint(a, m, b);
        expect(mean).toBeGreaterThanOrEqual(a - 1e-9);
        expect(mean).toBeLessThanOrEqual(b + 1e-9);
        expect(Math.sqrt(variance)).toBeCloseTo((b - a) / 6, 9);
      }),
    );
  });
});
