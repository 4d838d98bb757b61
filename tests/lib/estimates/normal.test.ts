import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { normalCdf, normalDensity, normalQuantile } from '@/lib/estimates';

const relative = (value: number, expected: number) => Math.abs(value / expected - 1);

describe('the normal distribution', () => {
  it('is symmetric', () => {
    fc.assert(
      fc.property(fc.double({ min: -8, max: 8, noNaN: true }), (z) => {
        expect(normalCdf(z) + normalCdf(-z)).toBeCloseTo(1, 15);
      }),
    );
  });

  it('has its half at 0 and its ends at the infinities', () => {
    expect(normalCdf(0)).toBe(0.5);
    expect(normalCdf(Infinity)).toBe(1);
    expect(normalCdf(-Infinity)).toBe(0);
    expect(normalCdf(-40)).toBeGreaterThanOrEqual(0);
    expect(normalCdf(Number.NaN)).toBeNaN();
  });

  it('never falls', () => {
    const z = fc.double({ min: -40, max: 40, noNaN: true });
    fc.assert(
      fc.property(z, fc.double({ min: 1e-6, max: 2, noNaN: true }), (low, step) => {
        expect(normalCdf(low + step)).toBeGreaterThanOrEqual(normalCdf(low));
      }),
    );
  });

  it('has its density as the slope of the cdf', () => {
    fc.assert(
      fc.property(fc.double({ min: -6, max: 6, noNaN: true }), (z) => {
        const slope = (normalCdf(z + 1e-5) - normalCdf(z - 1e-5)) / 2e-5;
        expect(slope).toBeCloseTo(normalDensity(z), 8);
      }),
    );
  });
});

describe('the normal quantile', () => {
  it('undoes the cdf, far into the lower tail', () => {
    fc.assert(
      fc.property(fc.double({ min: -37, max: 5, noNaN: true }), (z) => {
        const p = normalCdf(z);
        expect(relative(normalCdf(normalQuantile(p)), p)).toBeLessThan(1e-12);
      }),
    );
  });

  it('knows its limits', () => {
    expect(normalQuantile(0)).toBe(-Infinity);
    expect(normalQuantile(1)).toBe(Infinity);
    expect(normalQuantile(0.5)).toBe(0);
    for (const p of [-0.1, 1.1, Number.NaN]) expect(normalQuantile(p)).toBeNaN();
  });
});
