import type { FindingView } from '@/lib/contract/submission';
import type { Weight } from '@/lib/schedule/weight';

/** The orders offered; one table for the menu and the type. */
export const ORDERS = {
  costliest: 'Costliest first',
  weight: 'By weight',
  row: 'By row',
  activity: 'By activity',
  rule: 'By rule',
} as const;
export type FindingOrder = keyof typeof ORDERS;

const HEAVIEST: Record<Weight, number> = { blocks: 0, distorts: 1, query: 2 };
const collator = new Intl.Collator('en', { numeric: true, sensitivity: 'base' });

type Compare = (x: FindingView, y: FindingView) => number;

/** Differences of infinities are no numbers, so compared and not subtracted. */
const ascending = (x: number, y: number): number => (x < y ? -1 : Number(x > y));

const byWeight: Compare = (x, y) => HEAVIEST[x.weight] - HEAVIEST[y.weight];

/** What hangs on the whole list (no row) stands behind the rows. */
const byCell: Compare = (x, y) =>
  Number(x.sheet === null) - Number(y.sheet === null) ||
  collator.compare(x.sheet ?? '', y.sheet ?? '') ||
  ascending(x.row ?? Infinity, y.row ?? Infinity) ||
  collator.compare(x.cell ?? '', y.cell ?? '');

/** Days the finish moves by, whichever way; what blocks costs the whole answer. */
function cost(finding: FindingView): number {
  if (finding.weight === 'blocks' && finding.state === 'open') return Infinity;
  return Math.abs(finding.fix?.effect?.expectedDuration ?? 0);
}

const byCost: Compare = (x, y) => ascending(cost(y), cost(x));

const byActivity: Compare = (x, y) =>
  Number(x.activityId === null) - Number(y.activityId === null) ||
  collator.compare(x.activityId ?? '', y.activityId ?? '');

const byRule: Compare = (x, y) => collator.compare(x.rule, y.rule);

const CHAINS: Record<FindingOrder, readonly Compare[]> = {
  costliest: [byCost, byWeight, byCell],
  weight: [byWeight, byCost, byCell],
  row: [byCell, byWeight, byRule],
  activity: [byActivity, byCell, byWeight],
  rule: [byRule, byWeight, byCell],
};

/** A new array in the order asked for; the id settles ties, so that the order never depends on the input's. */
export function ordered(findings: readonly FindingView[], order: FindingOrder): FindingView[] {
  const chain = CHAINS[order];
  return [...findings].sort((x, y) => {
    for (const compare of chain) {
      const difference = compare(x, y);
      if (difference !== 0) return difference;
    }
    return x.id < y.id ? -1 : Number(x.id > y.id);
  });
}

/**
 * `findings` in the places their ids had in `places`; those without a place keep the input's order at the end.
 * A row that has just been corrected costs nothing any more, and still must not jump away under the hand.
 */
export function keepPlaces(findings: readonly FindingView[], places: readonly string[]): FindingView[] {
  const place = new Map(places.map((id, at) => [id, at]));
  return [...findings].sort((x, y) => ascending(place.get(x.id) ?? Infinity, place.get(y.id) ?? Infinity));
}

export function isOrder(text: string | null): text is FindingOrder {
  return text !== null && Object.hasOwn(ORDERS, text);
}
