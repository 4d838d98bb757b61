import fc from 'fast-check';
import { DirectedGraph } from 'graphology';
import { hasCycle, topologicalSort, willCreateCycle } from 'graphology-dag';
import { describe, expect, it } from 'vitest';
import { analyse, compile, prepareEffects } from '@/lib/network';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { randomLists } from '../lib/network/random-lists';

/** The list as a graph of an independent package; links of one pair are one edge. */
function graphOf({ activities, links }: ActivityList): DirectedGraph {
  const graph = new DirectedGraph();
  for (const { index } of activities) graph.addNode(index);
  for (const { fromIndex, toIndex } of links) graph.mergeEdge(fromIndex, toIndex);
  return graph;
}

describe('an independent package for acyclic graphs', () => {
  it('finds a loop where we do', () => {
    fc.assert(
      fc.property(randomLists({ size: 12, links: 16, loops: true }), (activities) => {
        expect(analyse(compile(activities)).computable).toBe(!hasCycle(graphOf(activities)));
      }),
      { numRuns: 500 },
    );
  });

  it('foresees the loop that an added link closes', () => {
    fc.assert(
      fc.property(randomLists({ size: 12, links: 16 }), fc.nat(), fc.nat(), (activities, a, b) => {
        const count = activities.activities.length;
        const [from, to] = [a % count, b % count];
        const effects = prepareEffects(compile(activities));
        const effect = effects.effect([{ kind: 'add-link', from, to, type: 'FS', lag: 0 }]);
        expect(effect === null).toBe(from === to || willCreateCycle(graphOf(activities), from, to));
      }),
      { numRuns: 500 },
    );
  });

  it('orders the activities so that its longest path is ours', () => {
    fc.assert(
      fc.property(randomLists({ size: 60, links: 150, step: 0.25 }), (activities) => {
        const analysis = analyse(compile(activities));
        if (!analysis.computable) throw new Error('Random lists without loops are computable.');
        const days = activities.activities.map(
          ({ optimistic, likely, pessimistic }) =>
            ((optimistic.days ?? 0) + 4 * (likely.days ?? 0) + (pessimistic.days ?? 0)) / 6,
        );
        const start = days.map(() => 0);
        for (const node of topologicalSort(graphOf(activities))) {
          const to = Number(node);
          for (const { fromIndex, toIndex, type, lag } of activities.links) {
            if (toIndex !== to) continue;
            const from = (start[fromIndex] ?? 0) + (type[0] === 'F' ? (days[fromIndex] ?? 0) : 0);
            const bound = from + lag - (type[1] === 'F' ? (days[to] ?? 0) : 0);
            start[to] = Math.max(start[to] ?? 0, bound);
          }
        }
        const finish = Math.max(...start.map((t, i) => t + (days[i] ?? 0)));
        expect(analysis.expectedDuration).toBeCloseTo(finish, 9);
        start.forEach((t, i) => expect(analysis.times.earlyStart[i]).toBeCloseTo(t, 9));
      }),
      { numRuns: 200 },
    );
  });
});
