import { tangledComponents } from './components';
import { cheapestCut } from './cut/fewest';
import { type Budget, type CutGraph, cutGraph, type Edge, Walker } from './cut/graph';
import type { Network, Tangle } from './types';

/** Edges that may be looked at for all tangles of a list: about half a second where it is used up. */
const WORK = 10_000_000;

/**
 * The tangles of a network, by their first activity: activities that wait for one another in a ring. Each with
 * a shortest loop and the fewest links to cut; among equally few, the links that contradict the list's order
 * (whose predecessor stands below its successor) are preferred. All links of one pair are cut together.
 */
export function findTangles(network: Network): Tangle[] {
  const { count, successorStart, successor } = network;
  const components = tangledComponents({ count, start: successorStart, target: successor });
  const local = new Int32Array(count).fill(-1);
  // The small ones first, each with its share: what they leave over is for the large.
  const budget = { left: 0 };
  const tangles = components
    .toSorted((a, b) => a.length - b.length)
    .map((activities) => {
      activities.forEach((activity, i) => (local[activity] = i));
      budget.left = Math.max(0, budget.left) + WORK / components.length;
      const tangle = untangle(network, activities, local, budget);
      for (const activity of activities) local[activity] = -1;
      return tangle;
    });
  return tangles.sort((a, b) => a.activities[0]! - b.activities[0]!);
}

/** The links of one pair. */
interface Pair extends Edge {
  readonly links: number[];
}

function untangle(network: Network, activities: number[], local: Int32Array, budget: Budget): Tangle {
  const { pairs, scale } = pairsOf(network, activities, local);
  const graph = cutGraph(activities.length, pairs);
  const { edges, atLeast } = cheapestCut(graph, budget);
  const cut = edges.flatMap((edge) => pairs[edge]!.links).sort((a, b) => a - b);
  const loop = shortestLoop(graph, edges, budget).map((node) => activities[node]!);
  return { activities, loop, cut, cutIsSmallest: Math.ceil(atLeast / scale) >= cut.length };
}

/**
 * The pairs of a tangle with what it costs to cut them: `scale` for each link, less one for each that
 * contradicts the list's order. As there are fewer links than `scale`, the number of links comes first.
 */
function pairsOf(network: Network, activities: readonly number[], local: Int32Array) {
  const { successorStart, successor, successorPosition, linkIndex } = network;
  const found: { from: number; to: number; links: number[] }[] = [];
  const pairTo = new Map<number, (typeof found)[number]>();
  let scale = 1;
  activities.forEach((activity, from) => {
    pairTo.clear();
    for (let k = successorStart[activity]!; k < successorStart[activity + 1]!; k++) {
      const to = local[successor[k]!]!;
      if (to === -1) continue;
      let pair = pairTo.get(to);
      if (!pair) {
        pair = { from, to, links: [] };
        pairTo.set(to, pair);
        found.push(pair);
      }
      pair.links.push(linkIndex[successorPosition[k]!]!);
      scale++;
    }
  });
  const pairs = found.map((pair): Pair => {
    const perLink = pair.from > pair.to ? scale - 1 : scale;
    return { ...pair, cost: pair.links.length * perLink };
  });
  return { pairs, scale };
}

/**
 * A shortest loop, from its first node on. Every loop goes through an edge of the cut, so that one search from
 * each of them finds it; where the budget is used up, the shortest seen so far.
 */
function shortestLoop(graph: CutGraph, cut: readonly number[], budget: Budget): number[] {
  const walker = new Walker(graph);
  const removed = new Uint8Array(graph.from.length);
  let shortest: number[] = [];
  for (const edge of cut) {
    if (shortest.length > 0 && budget.left < -WORK) break;
    const longest = shortest.length > 0 ? shortest.length - 2 : graph.count;
    const way = walker.way(graph.to[edge]!, graph.from[edge]!, removed, longest, budget);
    if (way) shortest = [edge, ...way];
  }
  const nodes = shortest.map((edge) => graph.from[edge]!);
  const first = nodes.indexOf(nodes.reduce((least, node) => Math.min(least, node), Infinity));
  return [...nodes.slice(first), ...nodes.slice(0, first)];
}
