import type { AnalysedActivity, AnalysisView } from '@/lib/contract/submission';

type Computed = Extract<AnalysisView, { computable: true }>;

/** The figures of the reported path, put into the formulas. */
export interface PathWorking {
  readonly steps: readonly AnalysedActivity[];
  readonly expected: number;
  /** What lags, leads and overlaps along the path add to the sum of the expected durations. */
  readonly offset: number;
  readonly variance: number;
}

/** Below this many working days a difference is floating point's. */
const NOTHING = 1e-6;

export function pathWorking(analysis: Computed): PathWorking {
  const byId = new Map(analysis.activities.map((activity) => [activity.id, activity]));
  const steps = (analysis.criticalPaths[0] ?? [])
    .map((id) => byId.get(id))
    .filter((activity) => activity !== undefined);
  const expected = steps.reduce((sum, step) => sum + step.expected, 0);
  const offset = analysis.expectedDuration - expected;
  return {
    steps,
    expected,
    offset: Math.abs(offset) < NOTHING ? 0 : offset,
    variance: steps.reduce((sum, step) => sum + step.variance, 0),
  };
}
