import { forwardPass, times } from './passes';
import { criticalPaths } from './paths';
import { plan } from './plan';
import { findTangles } from './tangles';
import type { Analysis, Network, Tangle } from './types';

/** Critical paths that are listed; all are counted. */
const LISTED_PATHS = 50;

/**
 * The recomputed schedule: times and floats in working days from time 0, critical paths and the largest
 * variance among them; or the tangles where loops leave nothing to compute. `tangles`, where they are known
 * already, are not looked for again. Near linear in activities and links.
 *
 * FS: start ≥ finish + lag; SS: start ≥ start + lag; FF: finish ≥ finish + lag; SF: finish ≥ start + lag.
 * Early starts are not below 0, late finishes not above the largest early finish. Total float: late start −
 * early start; free float: the most an activity can slip without moving a successor's early dates or the
 * finish; critical: total float within the tolerance. Method: Kelley and Walker, "Critical-Path Planning and
 * Scheduling" (1959); expected durations and variances after Malcolm, Roseboom, Clark, Fazar (1959).
 */
export function analyse(network: Network, tangles?: readonly Tangle[]): Analysis {
  const ordered = plan(network);
  if (!ordered) return { computable: false, tangles: tangles ?? findTangles(network) };
  const forward = forwardPass(ordered);
  const allTimes = times(ordered, forward);
  const paths = criticalPaths(ordered, forward, allTimes.critical, network.variance, LISTED_PATHS);
  return {
    computable: true,
    expectedDuration: forward.finish,
    variance: paths.variance,
    standardDeviation: Math.sqrt(paths.variance),
    criticalPaths: paths.listed,
    criticalPathCount: paths.count,
    times: allTimes,
  };
}
