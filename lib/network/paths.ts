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
  /** Exact up to 2^53, beyond that to sixteen digits; Infinity beyond the largest double. */
  readonly count: number;
}

/** Critical activities with those that drive them, all by rank, in order. */
interface CriticalGraph {
  readonly ranks: readonly number[];
  /** Drivers of rank r: driver[start[r]] … driver[end[r] − 1]; only for critical ranks. */
  readonly start: Int32Array;
  readonly end: Int32Array;
  readonly driver: Int32Array;
  /** 1 where a critical activity drives a further one. */
  readonly drives: Uint8Array;
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
  const ends = graph.ranks.filter((r) => graph.drives[r] === 0);
  const { best, sum } = largestVariance(plan, graph, ends, variance);
  const others = listPaths(graph, ends, limit + 1).filter((path) => !isSame(path, best));
  const toActivities = (path: readonly number[]) => path.map((r) => plan.order[r]!);
  return {
    variance: sum,
    listed: best.length === 0 ? [] : [best, ...others].slice(0, limit).map(toActivities),
    count: countPaths(plan.count, graph, ends),
  };
}

function criticalGraph(plan: Plan, { earlyStart }: ForwardPass, critical: Uint8Array): CriticalGraph {
  const { count, order, start: into, source, weight } = plan;
  const ranks: number[] = [];
  const start = new Int32Array(count);
  const end = new Int32Array(count);
  const driver = new Int32Array(source.length);
  const drives = new Uint8Array(count);
  const seenFor = new Int32Array(count).fill(-1);
  let next = 0;
  for (let r = 0; r < count; r++) {
    if (critical[order[r]!] === 0) continue;
    ranks.push(r);
    start[r] = next;
    for (let position = into[r]!; position < into[r + 1]!; position++) {
      const from = source[position]!;
      const slack = earlyStart[r]! - (earlyStart[from]! + weight[position]!);
      if (slack > TOLERANCE || seenFor[from] === r || critical[order[from]!] === 0) continue;
      seenFor[from] = r;
      driver[next++] = from;
      drives[from] = 1;
    }
    end[r] = next;
  }
  return { ranks, start, end, driver, drives };
}

function largestVariance(plan: Plan, graph: CriticalGraph, ends: readonly number[], variance: Float64Array) {
  const sums = new Float64Array(plan.count);
  const before = new Int32Array(plan.count).fill(-1);
  for (const r of graph.ranks) {
    let best = -1;
    for (let k = graph.start[r]!; k < graph.end[r]!; k++) {
      const from = graph.driver[k]!;
      if (best === -1 || sums[from]! > sums[best]!) best = from;
    }
    before[r] = best;
    sums[r] = variance[plan.order[r]!]! + (best === -1 ? 0 : sums[best]!);
  }
  const path: number[] = [];
  const [first = -1, ...rest] = ends;
  const last = rest.reduce((best, r) => (sums[r]! > sums[best]! ? r : best), first);
  for (let r = last; r !== -1; r = before[r]!) path.push(r);
  return { best: path.reverse(), sum: last === -1 ? 0 : sums[last]! };
}

function countPaths(count: number, graph: CriticalGraph, ends: readonly number[]): number {
  const paths = new Float64Array(count);
  for (const r of graph.ranks) {
    let sum = graph.start[r] === graph.end[r] ? 1 : 0;
    for (let k = graph.start[r]!; k < graph.end[r]!; k++) sum += paths[graph.driver[k]!]!;
    paths[r] = sum;
  }
  return ends.reduce((sum, r) => sum + paths[r]!, 0);
}

/** Up to `limit` paths, walked back from the ends; every step back leads to a path, so none is in vain. */
function listPaths(graph: CriticalGraph, ends: readonly number[], limit: number): number[][] {
  const paths: number[][] = [];
  for (const last of ends) {
    const chain = [last];
    const cursor = [graph.start[last]!];
    while (chain.length > 0 && paths.length < limit) {
      const depth = chain.length - 1;
      const r = chain[depth]!;
      if (graph.start[r] === graph.end[r]) paths.push(chain.toReversed());
      const k = cursor[depth]!;
      if (k < graph.end[r]!) {
        cursor[depth] = k + 1;
        const from = graph.driver[k]!;
        chain.push(from);
        cursor.push(graph.start[from]!);
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
