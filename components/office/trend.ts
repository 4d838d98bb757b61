import type { SubmissionView } from '@/lib/contract/submission';

/** One revision in a trend; null where its figure cannot be computed. */
export interface TrendPoint {
  readonly revision: number;
  readonly value: number | null;
}

/** Expected finish in working days, as corrected. */
export function finishTrend(revisions: readonly SubmissionView[]): TrendPoint[] {
  return revisions.map(({ revision, figures }) => ({ revision, value: figures.corrected.expectedDuration }));
}

/** Findings of every weight, as each revision came in: what is asked of a contractor should grow less. */
export function findingsTrend(revisions: readonly SubmissionView[]): TrendPoint[] {
  return revisions.map(({ revision, findings }) => ({
    revision,
    value: findings.blocks + findings.distorts + findings.query,
  }));
}

/** From the first to the last revision that has a figure; null with fewer than two. */
export function movement(
  points: readonly TrendPoint[],
): { from: TrendPoint; to: TrendPoint; by: number } | null {
  const known = points.filter((point): point is TrendPoint & { value: number } => point.value !== null);
  const from = known[0];
  const to = known.at(-1);
  return from && to && from !== to ? { from, to, by: to.value - from.value } : null;
}

/** Round marks that enclose the values: about `count` steps of 1, 2 or 5 times a power of ten. */
export function axisMarks(values: readonly number[], count = 3): number[] {
  const low = Math.min(...values);
  const high = Math.max(...values);
  const span = high - low || Math.max(1, Math.abs(high) * 0.1);
  const rough = span / count;
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = [1, 2, 5, 10].map((factor) => factor * power).find((size) => size >= rough) ?? 10 * power;
  const first = Math.floor(low / step);
  const last = Math.max(first + 1, Math.ceil(high / step));
  return Array.from({ length: last - first + 1 }, (_, index) => (first + index) * step);
}
