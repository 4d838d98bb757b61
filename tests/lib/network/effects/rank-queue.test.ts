import fc from 'fast-check';
import { expect, it } from 'vitest';
import { RankQueue } from '@/lib/network/effects/rank-queue';

it('a rank queue gives each rank once, from the lowest up, and can be used again', () => {
  const ranks = fc.array(fc.nat(500));
  fc.assert(
    fc.property(ranks, ranks, (first, later) => {
      const queue = new RankQueue(501);
      for (const batch of [first, later]) {
        for (const rank of batch) queue.add(rank);
        const taken: number[] = [];
        for (let rank = queue.take(); rank !== -1; rank = queue.take()) {
          taken.push(rank);
          // What follows from a rank is put in while the queue is being emptied.
          if (rank % 7 === 0 && rank < 490) queue.add(rank + 3);
        }
        const follows = new Set(batch);
        for (let rank = 0; rank < 490; rank += 7) if (follows.has(rank)) follows.add(rank + 3);
        expect(taken).toEqual([...follows].sort((a, b) => a - b));
      }
    }),
  );
});
