/** Mean and variance of an activity's duration. */
export interface Moments {
  /** Working days. */
  readonly mean: number;
  /** Working days². */
  readonly variance: number;
}

/**
 * Expected duration (a + 4m + b) / 6 and variance ((b − a) / 6)² from the optimistic, most likely and
 * pessimistic estimates, in working days.
 *
 * Source: Malcolm, Roseboom, Clark, Fazar, "Application of a Technique for Research and Development Program
 * Evaluation", Operations Research 7 (1959).
 */
export function threePoint(a: number, m: number, b: number): Moments {
  // a = m = b must come back as it is: a sum of six of them over six need not.
  if (a === b && a === m) return { mean: m, variance: 0 };
  return { mean: (a + 4 * m + b) / 6, variance: ((b - a) / 6) ** 2 };
}
