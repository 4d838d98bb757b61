import fc from 'fast-check';
import { type CutGraph, cutGraph } from '@/lib/network/cut/graph';

/** Random directed graphs, one edge a pair at most, that cost whole numbers to cut. */
export function randomGraphs(size: number, edges: number): fc.Arbitrary<CutGraph> {
  return fc.integer({ min: 2, max: size }).chain((count) =>
    fc
      .uniqueArray(
        fc.record({ from: fc.nat(count - 1), to: fc.nat(count - 1), cost: fc.integer({ min: 1, max: 9 }) }),
        { maxLength: edges, selector: ({ from, to }) => from * count + to },
      )
      .map((drawn) =>
        cutGraph(
          count,
          drawn.filter(({ from, to }) => from !== to),
        ),
      ),
  );
}

export const costOf = ({ cost }: CutGraph, edges: readonly number[]) =>
  edges.reduce((sum, edge) => sum + (cost[edge] ?? Number.NaN), 0);

/** Whether a graph has a loop without these edges: nodes that nothing enters are taken away until none is left. */
export function hasLoop({ count, from, to }: CutGraph, cut: readonly number[]): boolean {
  const edges = Array.from(from, (node, edge) => ({ from: node, to: to[edge], edge })).filter(
    ({ edge }) => !cut.includes(edge),
  );
  const left = new Set(Array.from({ length: count }, (_, node) => node));
  for (let before = -1; before !== left.size;) {
    before = left.size;
    for (const node of left) {
      if (!edges.some((edge) => edge.to === node && left.has(edge.from))) left.delete(node);
    }
  }
  return left.size > 0;
}
