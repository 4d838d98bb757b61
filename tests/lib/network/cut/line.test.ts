import fc from 'fast-check';
import { expect, it } from 'vitest';
import { Line } from '@/lib/network/cut/line';

it('a line keeps its nodes in the order that moves give them', () => {
  const move = fc.record({
    node: fc.nat(7),
    beside: fc.nat(7),
    side: fc.constantFrom('before' as const, 'after' as const),
  });
  fc.assert(
    fc.property(fc.array(move, { maxLength: 200 }), (moves) => {
      const nodes = [0, 1, 2, 3, 4, 5, 6, 7];
      const line = new Line(nodes);
      let order = [...nodes];
      for (const { node, beside, side } of moves.filter((each) => each.node !== each.beside)) {
        line.move(node, { beside, side });
        order = order.filter((other) => other !== node);
        order.splice(order.indexOf(beside) + (side === 'after' ? 1 : 0), 0, node);
      }
      const byPosition = nodes.toSorted((a, b) => (line.position[a] ?? 0) - (line.position[b] ?? 0));
      expect(byPosition).toEqual(order);
    }),
  );
});
