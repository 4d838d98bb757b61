import { tangledComponents } from '../components';
import { arrangedCut } from './arrange';
import { type Budget, type CutGraph, cutGraph, type Edge } from './graph';
import { cheapestOverLoops } from './loops';
import { reduce, type ReducedEdge } from './reduce';
import { cheapestOverSubsets, SUBSET_LIMIT } from './subsets';

/** A set of edges without which a graph has no loop. */
export interface Cut {
  readonly edges: readonly number[];
  /** A cost that no such set can go below; that of `edges` where none is cheaper. */
  readonly atLeast: number;
}

/**
 * The cheapest set of edges to cut so that no loop is left (the minimum feedback arc set: hard in general, easy
 * in the tangles that people make). Exact where a tangle is small once its chains are folded, or is held
 * together by few edges; a good one where the budget runs out before that is proved.
 */
export function cheapestCut(graph: CutGraph, budget: Budget): Cut {
  const { forced, edges } = reduce(graph);
  const cut = [...forced];
  let atLeast = forced.reduce((sum, edge) => sum + graph.cost[edge]!, 0);
  for (const part of tangledParts(graph.count, edges)) {
    const small = cutGraph(part.count, part.edges);
    const solved = solve(small, budget);
    for (const edge of solved.edges) cut.push(...part.edges[edge]!.cuts);
    atLeast += solved.atLeast;
  }
  return { edges: cut.sort((a, b) => a - b), atLeast };
}

function solve(graph: CutGraph, budget: Budget): Cut {
  if (graph.count <= SUBSET_LIMIT) {
    const edges = cheapestOverSubsets(graph);
    return { edges, atLeast: edges.reduce((sum, edge) => sum + graph.cost[edge]!, 0) };
  }
  return cheapestOverLoops(graph, arrangedCut(graph, budget), budget);
}

interface Part {
  readonly count: number;
  readonly edges: readonly (Edge & ReducedEdge)[];
}

/** The tangles that are left when forced edges are gone, each with nodes of its own. */
function tangledParts(count: number, edges: readonly ReducedEdge[]): Part[] {
  const whole = cutGraph(count, edges);
  const target = whole.outEdge.map((edge) => whole.to[edge]!);
  const components = tangledComponents({ count, start: whole.outStart, target });
  const part = new Int32Array(count).fill(-1);
  const local = new Int32Array(count);
  components.forEach((nodes, k) => {
    nodes.forEach((node, i) => {
      part[node] = k;
      local[node] = i;
    });
  });
  const parts = components.map((nodes) => ({ count: nodes.length, edges: [] as (Edge & ReducedEdge)[] }));
  for (const edge of edges) {
    const k = part[edge.from]!;
    if (k === -1 || part[edge.to] !== k) continue;
    parts[k]!.edges.push({ ...edge, from: local[edge.from]!, to: local[edge.to]! });
  }
  return parts;
}
