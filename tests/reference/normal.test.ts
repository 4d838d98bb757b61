import cdf from '@stdlib/stats-base-dists-normal-cdf';
import fc from 'fast-check';
import { normal as jStat } from 'jstat';
import { describe, expect, it } from 'vitest';
import {
  AREA_FROM_ZERO,
  AS_241,
  CUMULATIVE_TABLE,
  FAR_TAIL,
  FIFTEEN_DECIMALS,
  QUANTILES,
} from '@/fixtures/published/normal';
import { chanceBy, daysFor, normalCdf, normalDensity, normalQuantile, tableValue } from '@/lib/estimates';

describe('published values of the normal distribution', () => {
  it.each(CUMULATIVE_TABLE)('Φ(%d) is %d in the cumulative table', (z, area) => {
    expect(tableValue(z)).toBe(area);
  });

  it.each(AREA_FROM_ZERO)('the area from 0 to %d is %d', (z, area) => {
    expect(normalCdf(z) - 0.5).toBeCloseTo(area, 5);
  });

  it.each(FIFTEEN_DECIMALS)('Φ(%d) is %d, the density there %d', (z, area, density) => {
    expect(normalCdf(z)).toBeCloseTo(area, 14);
    expect(normalDensity(z)).toBeCloseTo(density, 14);
  });

  it.each(FAR_TAIL)('the area beyond %d is 10 to the −%d', (x, minusLog) => {
    expect(-Math.log10(normalCdf(-x))).toBeCloseTo(minusLog, 5);
  });

  it.each(AS_241)('the quantile of %d is %d, to the last digits', (p, z) => {
    expect(Math.abs(normalQuantile(p) / z - 1)).toBeLessThan(4e-16);
  });

  it.each(QUANTILES)('the quantile of %d is %d', (p, z) => {
    expect(normalQuantile(p)).toBeCloseTo(z, 6);
  });
});

describe('an independent package', () => {
  const z = fc.double({ min: -37, max: 9, noNaN: true });

  it('gives the same probabilities, in the far tail as well', () => {
    fc.assert(
      fc.property(z, (x) => {
        expect(Math.abs(normalCdf(x) / cdf(x, 0, 1) - 1)).toBeLessThan(5e-13);
      }),
      { numRuns: 2000 },
    );
  });

  it('gives the same chance of a finish, and the days back for it', () => {
    const mean = fc.double({ min: 1, max: 2000, noNaN: true });
    const sd = fc.double({ min: 0.01, max: 100, noNaN: true });
    fc.assert(
      fc.property(fc.double({ min: -5, max: 5, noNaN: true }), mean, sd, (steps, m, s) => {
        const x = m + steps * s;
        const before = chanceBy(x, m, s);
        expect(before).toBeCloseTo(cdf(x, m, s), 12);
        expect(daysFor(before, m, s)).toBeCloseTo(x, 6);
      }),
      { numRuns: 1000 },
    );
  });
});

describe('jStat', () => {
  const z = fc.double({ min: -5, max: 5, noNaN: true });

  it('agrees within its usual range', () => {
    fc.assert(
      fc.property(z, (x) => {
        expect(normalCdf(x)).toBeCloseTo(jStat.cdf(x, 0, 1), 8);
        expect(normalDensity(x)).toBeCloseTo(jStat.pdf(x, 0, 1), 12);
        const p = normalCdf(x);
        if (p > 1e-5 && p < 1 - 1e-5) expect(normalQuantile(p)).toBeCloseTo(jStat.inv(p, 0, 1), 6);
      }),
      { numRuns: 1000 },
    );
  });

  it('has lost the lower tail where ours still holds it, which is why we have our own', () => {
    const off = (value: number, exact: number) => Math.abs(value / exact - 1);
    // Φ(−10), Abramowitz and Stegun (1964), Table 26.2.
    const exact = 10 ** -23.11805;
    expect(off(normalCdf(-10), exact)).toBeLessThan(1e-4);
    expect(off(jStat.cdf(-10, 0, 1), exact)).toBeGreaterThan(0.5);
  });
});
