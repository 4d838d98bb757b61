import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { compile } from '@/lib/network';
import { plan, startToStart } from '@/lib/network/plan';
import { list } from '@/tests/support/networks';
import { randomLists } from './random-lists';

describe('the order of a network', () => {
  it('has every activity once, each after all it waits for', () => {
    fc.assert(
      fc.property(randomLists({ size: 30, links: 80 }), (activities) => {
        const network = compile(activities);
        const ordered = plan(network);
        expect([...(ordered?.order ?? [])].sort((a, b) => a - b)).toEqual([...network.expected.keys()]);
        ordered?.order.forEach((activity, r) => {
          expect(ordered.rank[activity]).toBe(r);
          for (let p = ordered.start[r] ?? 0; p < (ordered.start[r + 1] ?? 0); p++) {
            expect(ordered.source[p]).toBeLessThan(r);
          }
        });
      }),
    );
  });

  it('is none where there is a loop', () => {
    expect(plan(compile(list('A 1 <- B', 'B 1 <- A', 'C 1')))).toBeNull();
  });
});

describe('a link said of starts alone', () => {
  it.each([
    ['FS', 0, 5],
    ['SS', 1, 1],
    ['FF', 2, 2],
    ['SF', 3, -2],
  ])('%s', (_, relation, weight) => {
    expect(startToStart(relation, 1, 4, 3)).toBe(weight);
  });
});
