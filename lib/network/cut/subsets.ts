import type { CutGraph } from './graph';

/** Graphs up to this size are settled over all subsets of their nodes. */
export const SUBSET_LIMIT = 14;

/**
 * The cheapest set of edges without which a small graph has no loop: for every set of nodes, the cheapest
 * order in which they can stand first, an edge against the order being cut.
 *
 * Source: Held and Karp, "A Dynamic Programming Approach to Sequencing Problems", SIAM Journal 10 (1962).
 */
export function cheapestOverSubsets(graph: CutGraph): number[] {
  const { count, from, to, cost } = graph;
  const price = new Float64Array(count * count);
  for (let edge = 0; edge < from.length; edge++) price[from[edge]! * count + to[edge]!]! += cost[edge]!;
  const size = 1 << count;
  const cheapest = new Float64Array(size).fill(Infinity);
  const last = new Uint8Array(size);
  cheapest[0] = 0;
  for (let placed = 0; placed < size; placed++) {
    for (let node = 0; node < count; node++) {
      if (placed & (1 << node)) continue;
      let sum = cheapest[placed]!;
      for (let rest = placed; rest !== 0; rest &= rest - 1) {
        sum += price[node * count + (31 - Math.clz32(rest & -rest))]!;
      }
      const next = placed | (1 << node);
      if (sum < cheapest[next]!) {
        cheapest[next] = sum;
        last[next] = node;
      }
    }
  }
  const position = new Int32Array(count);
  for (let placed = size - 1, k = count - 1; placed !== 0; k--) {
    const node = last[placed]!;
    position[node] = k;
    placed ^= 1 << node;
  }
  return backwardEdges(graph, position);
}

/** Edges that run against an order of the nodes; without them there is no loop. */
export function backwardEdges({ from, to }: CutGraph, position: ArrayLike<number>): number[] {
  const edges: number[] = [];
  for (let edge = 0; edge < from.length; edge++) {
    if (position[from[edge]!]! > position[to[edge]!]!) edges.push(edge);
  }
  return edges;
}
