import { inOrder, PARTS, type Part, type Three } from './estimate-cells';

/** How three estimates that are out of order can be put into it. */
export interface Reordering {
  readonly how: 'exchange' | 'slip' | 'sort';
  /** The parts that change. */
  readonly parts: readonly Part[];
  readonly three: Three;
}

type Swap = readonly [Part, Part];

function exchanged(three: Three, [one, other]: Swap): Three {
  return { ...three, [one]: three[other], [other]: three[one] };
}

/** How many times too large the larger of two neighbours in the wrong order is; 1 where all are in order. */
function disorder({ optimistic: a, likely: m, pessimistic: b }: Three): number {
  const ratio = (before: number | null, after: number | null) =>
    before === null || after === null || before <= after ? 1 : before / after;
  return Math.max(ratio(a, m), ratio(m, b));
}

/** One of the three ten times larger or smaller, where that puts them in order. */
function slips(three: Three, least: number): Reordering[] {
  if (disorder(three) < least) return [];
  return PARTS.flatMap((part) =>
    [0.1, 10].flatMap((factor): Reordering[] => {
      const value = three[part];
      if (value === null) return [];
      const slipped = { ...three, [part]: factor < 1 ? value / 10 : value * 10 };
      return inOrder(slipped) ? [{ how: 'slip', parts: [part], three: slipped }] : [];
    }),
  );
}

function sorted(three: Three): Reordering {
  const present = PARTS.filter((part) => three[part] !== null);
  const values = present.map((part) => three[part] ?? 0).sort((one, other) => one - other);
  const inPlace = { ...three, ...Object.fromEntries(present.map((part, i) => [part, values[i] ?? 0])) };
  return { how: 'sort', parts: present.filter((part) => inPlace[part] !== three[part]), three: inPlace };
}

const same = (one: Three, other: Three) => PARTS.every((part) => one[part] === other[part]);

/**
 * The ways to put a, m and b in order, the one to be proposed first: the two that stand the wrong way round
 * exchanged; else a ten-fold slip where only one would do; else the three sorted.
 * @param least a ten-fold slip is considered where one estimate is at least so many times its neighbour
 */
export function reorderings(three: Three, swap: Swap, least: number): Reordering[] {
  const exchange: Reordering = { how: 'exchange', parts: swap, three: exchanged(three, swap) };
  const slipped = slips(three, least);
  const all = [
    ...(inOrder(exchange.three) ? [exchange] : []),
    ...(slipped.length === 1 ? slipped : []),
    sorted(three),
    ...(slipped.length === 1 ? [] : slipped),
  ];
  return all.filter((one, i) => all.findIndex((other) => same(one.three, other.three)) === i);
}
