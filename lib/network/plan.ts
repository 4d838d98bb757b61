import type { Network } from './types';

/**
 * A network put in order: activities renumbered by rank, so that every link runs from a lower rank to a higher
 * one and the passes walk through memory forwards, and each link reduced to one start-to-start weight.
 */
export interface Plan {
  readonly count: number;
  /** Activity by rank, and rank by activity. */
  readonly order: Int32Array;
  readonly rank: Int32Array;
  /** Links into rank r: positions start[r] … start[r + 1] − 1. */
  readonly start: Int32Array;
  /** Rank of the predecessor, by position. */
  readonly source: Int32Array;
  /** The successor starts at least this long after its predecessor's start, by position. */
  readonly weight: Float64Array;
  /** Expected durations, by rank. */
  readonly duration: Float64Array;
}

/** Puts a network in order; null where it has a loop. */
export function plan(network: Network): Plan | null {
  const order = topologicalOrder(network);
  if (!order) return null;
  const { count, linkCount, expected, predecessorStart, predecessor, relation, lag } = network;
  const rank = new Int32Array(count);
  const duration = new Float64Array(count);
  for (let r = 0; r < count; r++) {
    const activity = order[r]!;
    rank[activity] = r;
    duration[r] = expected[activity]!;
  }
  const start = new Int32Array(count + 1);
  const source = new Int32Array(linkCount);
  const weight = new Float64Array(linkCount);
  let next = 0;
  for (let r = 0; r < count; r++) {
    const activity = order[r]!;
    const end = predecessorStart[activity + 1]!;
    for (let position = predecessorStart[activity]!; position < end; position++) {
      const from = rank[predecessor[position]!]!;
      source[next] = from;
      weight[next++] = startToStart(relation[position]!, lag[position]!, duration[from]!, duration[r]!);
    }
    start[r + 1] = next;
  }
  return { count, order, rank, start, source, weight, duration };
}

/**
 * The weight of a link when it is said of starts alone: FS start ≥ finish + lag, SS start ≥ start + lag,
 * FF finish ≥ finish + lag, SF finish ≥ start + lag; all in working days. `relation` is a code of the network.
 */
export function startToStart(relation: number, lag: number, from: number, to: number): number {
  switch (relation) {
    case 0:
      return from + lag;
    case 1:
      return lag;
    case 2:
      return from + lag - to;
    default:
      return lag - to;
  }
}

/**
 * Activities in an order in which each comes after all it waits for (Kahn, "Topological Sorting of Large
 * Networks", Communications of the ACM 5, 1962); null where there is none.
 */
function topologicalOrder(network: Network): Int32Array | null {
  const { count, predecessorStart, successorStart, successor } = network;
  const order = new Int32Array(count);
  const waiting = new Int32Array(count);
  let placed = 0;
  for (let i = 0; i < count; i++) {
    waiting[i] = predecessorStart[i + 1]! - predecessorStart[i]!;
    if (waiting[i] === 0) order[placed++] = i;
  }
  for (let r = 0; r < placed; r++) {
    const activity = order[r]!;
    const end = successorStart[activity + 1]!;
    for (let k = successorStart[activity]!; k < end; k++) {
      const next = successor[k]!;
      if (--waiting[next]! === 0) order[placed++] = next;
    }
  }
  return placed === count ? order : null;
}
