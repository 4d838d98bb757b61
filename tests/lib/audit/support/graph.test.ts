import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { wouldLoop } from '@/lib/audit/support/graph';
import { compile } from '@/lib/network';
import { list } from '@/tests/support/networks';

describe('wouldLoop', () => {
  it('agrees with a search by hand, loops or not', () => {
    const end = fc.integer({ min: 0, max: 7 });
    fc.assert(
      fc.property(fc.array(fc.tuple(end, end), { maxLength: 14 }), end, end, (links, from, to) => {
        const rows = Array.from({ length: 8 }, (_, i) => {
          const before = links.filter(([, target]) => target === i).map(([source]) => `A${source}`);
          return `A${i} 1${before.length === 0 ? '' : ` <- ${before.join(', ')}`}`;
        });
        const reached = new Set([to]);
        for (let round = 0; round < 8; round++) {
          for (const [source, target] of links) if (reached.has(source)) reached.add(target);
        }
        return wouldLoop(compile(list(...rows)), from, to) === reached.has(from);
      }),
      { numRuns: 500 },
    );
  });

  it('takes a link from an activity to itself for a loop', () => {
    expect(wouldLoop(compile(list('A 1')), 0, 0)).toBe(true);
  });
});
