import { TOLERANCE } from '@/lib/schedule/tolerance';
import type { ForwardPass } from './passes';
import type { Plan } from './plan';

/*
 * A critical path is a chain of critical activities joined by links without slack, from one that nothing
 * drives to one that sets the finish. A chain that could be carried on further is not counted apart: where a
 * milestone follows the activity that sets the finish, the path ends at the milestone. Links of one pair are
 * one step.
 */

export interface CriticalPaths {
  /** The largest sum of variances on a critical path, working days². */
  readonly variance: number;
  /** By activity; the path with the largest variance first, at most `limit`. */
  readonly listed: readonly (readonly number[])[];
  /** Exact up to 2^53, beyond that to sixteen digits; the largest double where it holds no more. */
  readonly count: number;
}

/**
 * The critical activities, numbered among themselves in order, with those that drive each: few, as a rule, so
 * that nothing here is as large as the network.
 */
interface CriticalGraph {
  readonly activity: readonly number[];
  /** Drivers of the k-th: driver[start[k]] … driver[start[k + 1] − 1], each numbered as here. */
  readonly start: readonly number[];
  readonly driver: readonly number[];
  /** Those that drive no further one. */
  readonly ends: readonly number[];
}

/** Finds, counts and lists the critical paths; counting and the largest variance need no list of them. */
export function criticalPaths(
  plan: Plan,
  forward: ForwardPass,
  critical: Uint8Array,
  variance: Float64Array,
  limit: number,
): CriticalPaths {
  const graph = criticalGraph(plan, forward, critical);
  const { best, sum } = largestVariance(graph, variance);
  const others = listPaths(graph, limit + 1).filter((path) => !isSame(path, best));
  const toActivities = (path: readonly number[]) => path.map((k) => graph.activity[k]!);
  return {
    variance: sum,
    listed: best.length === 0 ? [] : [best, ...others].slice(0, limit).map(toActivities),
    count: countPaths(graph),
  };
}

function criticalGraph(plan: Plan, { earlyStart }: ForwardPass, critical: Uint8Array): CriticalGraph {
  const { count, order, start: into, source, weight } = plan;
  const activity: number[] = [];
  const start = [0];
  const driver: number[] = [];
  const drives: boolean[] = [];
  const numberOf = new Map<number, number>();
  for (let r = 0; r < count; r++) {
    if (critical[order[r]!] === 0) continue;
    const first = driver.length;
    for (let position = into[r]!; position < into[r + 1]!; position++) {
      const from = source[position]!;
      if (earlyStart[r]! - (earlyStart[from]! + weight[position]!) > TOLERANCE) continue;
      const k = numberOf.get(from);
      if (k === undefined || driver.indexOf(k, first) !== -1) continue;
      driver.push(k);
      drives[k] = true;
    }
    numberOf.set(r, activity.length);
    activity.push(order[r]!);
    start.push(driver.length);
  }
  const ends = activity.map((_, k) => k).filter((k) => !drives[k]);
  return { activity, start, driver, ends };
}

function largestVariance({ activity, start, driver, ends }: CriticalGraph, variance: Float64Array) {
  const sums: number[] = [];
  const before: number[] = [];
  for (let k = 0; k < activity.length; k++) {
    let best = -1;
    for (let p = start[k]!; p < start[k + 1]!; p++) {
      if (best === -1 || sums[driver[p]!]! > sums[best]!) best = driver[p]!;
    }
    before.push(best);
    sums.push(variance[activity[k]!]! + (best === -1 ? 0 : sums[best]!));
  }
  const path: number[] = [];
  const [first = -1, ...rest] = ends;
  const last = rest.reduce((best, k) => (sums[k]! > sums[best]! ? k : best), first);
  for (let k = last; k !== -1; k = before[k]!) path.push(k);
  return { best: path.reverse(), sum: last === -1 ? 0 : sums[last]! };
}

function countPaths({ activity, start, driver, ends }: CriticalGraph): number {
  const paths: number[] = [];
  for (let k = 0; k < activity.length; k++) {
    let sum = start[k] === start[k + 1] ? 1 : 0;
    for (let p = start[k]!; p < start[k + 1]!; p++) sum += paths[driver[p]!]!;
    paths.push(sum);
  }
  const total = ends.reduce((sum, k) => sum + paths[k]!, 0);
  return Math.min(total, Number.MAX_VALUE);
}

/** Up to `limit` paths, walked back from the ends; every step back leads to a path, so none is in vain. */
function listPaths({ start, driver, ends }: CriticalGraph, limit: number): number[][] {
  const paths: number[][] = [];
  for (const last of ends) {
    const chain = [last];
    const cursor = [start[last]!];
    while (chain.length > 0 && paths.length < limit) {
      const depth = chain.length - 1;
      const k = chain[depth]!;
      if (start[k] === start[k + 1]) paths.push(chain.toReversed());
      const p = cursor[depth]!;
      if (p < start[k + 1]!) {
        cursor[depth] = p + 1;
        const from = driver[p]!;
        chain.push(from);
        cursor.push(start[from]!);
      } else {
        chain.pop();
        cursor.pop();
      }
    }
  }
  return paths;
}

function isSame(a: readonly number[], b: readonly number[]): boolean {
  return a.length === b.length && a.every((value, i) => value === b[i]);
}
