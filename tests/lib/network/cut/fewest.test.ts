import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { arrangedCut } from '@/lib/network/cut/arrange';
import { cheapestCut } from '@/lib/network/cut/fewest';
import { cutGraph, Walker } from '@/lib/network/cut/graph';
import { cheapestOverLoops } from '@/lib/network/cut/loops';
import { reduce } from '@/lib/network/cut/reduce';
import { cheapestOverSubsets } from '@/lib/network/cut/subsets';
import { costOf, hasLoop, randomGraphs } from './random-graphs';

const plenty = () => ({ left: 50_000_000 });

/** The cost of the cheapest cut, by trying every set of edges. */
function cheapestByTrial(graph: ReturnType<typeof cutGraph>): number {
  let best = Infinity;
  for (let choice = 0; choice < 2 ** graph.from.length; choice++) {
    const cut = [...graph.from.keys()].filter((edge) => choice & (1 << edge));
    if (costOf(graph, cut) < best && !hasLoop(graph, cut)) best = costOf(graph, cut);
  }
  return best;
}

describe('the cheapest cut', () => {
  it('is found over the subsets of the nodes', () => {
    fc.assert(
      fc.property(randomGraphs(5, 10), (graph) => {
        const cut = cheapestOverSubsets(graph);
        expect(hasLoop(graph, cut)).toBe(false);
        expect(costOf(graph, cut)).toBe(cheapestByTrial(graph));
      }),
      { numRuns: 100 },
    );
  });

  it('is found over the loops as well', () => {
    fc.assert(
      fc.property(randomGraphs(11, 34), (graph) => {
        const known = [...graph.from.keys()].filter(
          (edge) => (graph.from[edge] ?? 0) > (graph.to[edge] ?? 0),
        );
        const { edges, atLeast } = cheapestOverLoops(graph, known, plenty());
        expect(hasLoop(graph, edges)).toBe(false);
        expect(costOf(graph, edges)).toBe(atLeast);
        expect(atLeast).toBe(costOf(graph, cheapestOverSubsets(graph)));
      }),
      { numRuns: 300 },
    );
  });

  it('is the same when the graph is reduced first', () => {
    fc.assert(
      fc.property(randomGraphs(12, 22), (graph) => {
        const { edges, atLeast } = cheapestCut(graph, plenty());
        expect(hasLoop(graph, edges)).toBe(false);
        expect(new Set(edges).size).toBe(edges.length);
        expect(costOf(graph, edges)).toBe(atLeast);
        expect(atLeast).toBe(costOf(graph, cheapestOverSubsets(graph)));
      }),
      { numRuns: 300 },
    );
  });

  it('has a bound that holds, and breaks every loop, when the budget is small', () => {
    fc.assert(
      fc.property(randomGraphs(14, 70), fc.integer({ min: 0, max: 3000 }), (graph, left) => {
        const known = arrangedCut(graph, plenty());
        const { edges, atLeast } = cheapestOverLoops(graph, known, { left });
        const cheapest = costOf(graph, cheapestOverSubsets(graph));
        expect(hasLoop(graph, edges)).toBe(false);
        expect(atLeast).toBeLessThanOrEqual(cheapest);
        expect(costOf(graph, edges)).toBeGreaterThanOrEqual(cheapest);
      }),
      { numRuns: 100 },
    );
  });
});

describe('a good cut', () => {
  it('breaks every loop and is seldom dearer than the cheapest', () => {
    let dearer = 0;
    fc.assert(
      fc.property(randomGraphs(12, 40), (graph) => {
        const cut = arrangedCut(graph, plenty());
        expect(hasLoop(graph, cut)).toBe(false);
        if (costOf(graph, cut) > costOf(graph, cheapestOverSubsets(graph))) dearer++;
      }),
      { numRuns: 300, seed: 1 },
    );
    expect(dearer).toBeLessThan(60);
  });
});

describe('reducing', () => {
  it('folds a ring of chains into nothing but its cheapest edge', () => {
    const edges = [5, 4, 3, 7].map((cost, from) => ({ from, to: (from + 1) % 4, cost }));
    expect(reduce(cutGraph(4, edges))).toEqual({ forced: [2], edges: [] });
  });

  it('cuts two ways side by side together', () => {
    const pairs = [
      [0, 1, 2],
      [1, 3, 1],
      [0, 2, 1],
      [2, 3, 2],
      [3, 0, 3],
    ] as const;
    const graph = cutGraph(
      4,
      pairs.map(([from, to, cost]) => ({ from, to, cost })),
    );
    expect(reduce(graph).forced.toSorted()).toEqual([1, 2]);
  });
});

describe('the way between two nodes', () => {
  const path = [0, 1, 2, 3].map((from) => ({ from, to: from + 1, cost: 1 }));
  const graph = cutGraph(5, [...path, { from: 1, to: 4, cost: 1 }]);
  const walker = new Walker(graph);
  const none = new Uint8Array(5);

  it('is a shortest one', () => {
    expect(walker.way(0, 4, none, 9, plenty())).toEqual([0, 4]);
    expect(walker.way(4, 0, none, 9, plenty())).toBeNull();
  });

  it('goes round what is removed, and not further than allowed', () => {
    const removed = Uint8Array.of(0, 0, 0, 0, 1);
    expect(walker.way(0, 4, removed, 4, plenty())).toEqual([0, 1, 2, 3]);
    expect(walker.way(0, 4, removed, 3, plenty())).toBeNull();
  });

  it('costs what it looks at', () => {
    const budget = { left: 10 };
    walker.way(0, 4, none, 9, budget);
    expect(budget.left).toBe(7);
  });
});
