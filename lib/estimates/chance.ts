import { TOLERANCE } from '@/lib/schedule/tolerance';
import { normalCdf, normalQuantile } from './normal';

/** What the normal approximation says of a finish; days are working days from time 0. */
export interface Chance {
  /** (x − mean) / sd; null where the deviation is 0. */
  readonly z: number | null;
  /** Chance of finishing within x days, 0 … 1. */
  readonly before: number;
  /** Chance of being later; 1 − before, kept exact where before is close to 1. */
  readonly after: number;
}

/**
 * Chance of finishing within `x` days when the finish is normal with that mean and standard deviation (both in
 * working days). With a deviation of 0 it is a step: 1 at and after the mean.
 */
export function chance(x: number, mean: number, sd: number): Chance {
  if (sd === 0) {
    const before = x >= mean - TOLERANCE ? 1 : 0;
    return { z: null, before, after: 1 - before };
  }
  const z = (x - mean) / sd;
  return { z, before: normalCdf(z), after: normalCdf(-z) };
}

/** Chance of finishing within `x` days, 0 … 1; see `chance`. */
export function chanceBy(x: number, mean: number, sd: number): number {
  return chance(x, mean, sd).before;
}

/** Days within which the work finishes with that confidence (between 0 and 1, both excluded). */
export function daysFor(confidence: number, mean: number, sd: number): number {
  return sd === 0 ? mean : mean + sd * normalQuantile(confidence);
}

/** z to the two decimals a printed table has; halves away from zero. */
export function tableZ(z: number): number {
  // 1.005 is stored a little below itself, and z comes out of sums: what is a half but for noise is a half.
  const rounded = Math.round(Math.abs(z) * 100 + 1e-9) / 100;
  return rounded === 0 ? 0 : Math.sign(z) * rounded;
}

/** Φ(z) as read off a printed table: z to two decimals, the area to four. */
export function tableValue(z: number): number {
  return Math.round(normalCdf(tableZ(z)) * 1e4) / 1e4;
}
