import { cheapestCover } from './cover';
import { type Budget, type CutGraph, Walker } from './graph';

/** A cut, and a cost that no cut can go below. */
export interface BoundedCut {
  readonly edges: readonly number[];
  readonly atLeast: number;
}

/**
 * The cheapest cut by way of the loops: the cheapest cover of the loops seen so far is a lower bound, and where
 * it leaves no loop it is the answer; else the loops it leaves are added. Starts from a cut that is known to
 * break every loop (every loop goes through one of its edges, so only those need be looked at).
 */
export function cheapestOverLoops(graph: CutGraph, known: readonly number[], budget: Budget): BoundedCut {
  const costOf = (edges: readonly number[]) => edges.reduce((sum, edge) => sum + graph.cost[edge]!, 0);
  const walker = new Walker(graph);
  const knownCost = costOf(known);
  const loops: number[][] = [];
  let cover: number[] = [];
  while (budget.left > 0) {
    const left = loopsLeft(graph, walker, known, cover, budget);
    if (left.length === 0) return { edges: cover, atLeast: costOf(cover) };
    loops.push(...left);
    const next = cheapestCover(loops, graph.cost, knownCost, budget);
    if (next === null) return { edges: known, atLeast: knownCost };
    if (next === undefined) break;
    cover = next;
  }
  return { edges: known, atLeast: costOf(cover) };
}

/** Shortest loops, sharing no edge, through the known edges that the cover does not cut. */
function loopsLeft(
  graph: CutGraph,
  walker: Walker,
  known: readonly number[],
  cover: readonly number[],
  budget: Budget,
): number[][] {
  const removed = new Uint8Array(graph.from.length);
  for (const edge of cover) removed[edge] = 1;
  const loops: number[][] = [];
  for (const edge of known) {
    if (removed[edge] === 1) continue;
    const way = walker.way(graph.to[edge]!, graph.from[edge]!, removed, graph.count, budget);
    if (!way) continue;
    const loop = [edge, ...way];
    loops.push(loop);
    for (const used of loop) removed[used] = 1;
  }
  return loops;
}
