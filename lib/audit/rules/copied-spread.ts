import type { ActivityList } from '@/lib/schedule/activity-list';
import type { Rule } from '../rule';
import { WHOLE_LIST } from '../support/about';
import { threeOf } from '../support/estimate-cells';
import { PRACTICE } from '../support/sources';

/** Ratios that agree to this share are one. */
const PRECISION = 1e4;
const SHARE = 80;
const ACTIVITIES = 10;

interface Pair {
  /** a and b as shares of m. */
  readonly low: number;
  readonly high: number;
  rows: number;
  readonly values: Set<number>;
}

/** Rows by the pair (a/m, b/m); those without a spread are another rule's. */
function pairsOf(list: ActivityList): { pairs: Pair[]; rows: number } {
  const pairs = new Map<string, Pair>();
  let rows = 0;
  for (const activity of list.activities) {
    const { optimistic: a, likely: m, pessimistic: b } = threeOf(activity);
    if (a === null || m === null || b === null || m <= 0) continue;
    rows += 1;
    if (a === m && b === m) continue;
    const [low, high] = [Math.round((a / m) * PRECISION), Math.round((b / m) * PRECISION)];
    const key = `${low} ${high}`;
    const pair = pairs.get(key) ?? { low: a / m, high: b / m, rows: 0, values: new Set() };
    pair.rows += 1;
    pair.values.add(m);
    pairs.set(key, pair);
  }
  return { pairs: [...pairs.values()], rows };
}

const percent = (share: number) => Number((share * 100).toFixed(1));

export const rule: Rule = {
  id: 'copied-spread',
  meta: {
    weight: 'query',
    title: 'The spreads are worked out, not judged',
    about:
      'On most rows the optimistic and the pessimistic estimate are the same shares of the likely one. Three estimates are three judgements of each piece of work; one percentage over a whole list says nothing about where the risk lies.',
    source: PRACTICE,
    messages: {
      copied: (data) =>
        `a is ${data.low} % and b is ${data.high} % of m on ${data.rows} of ${data.of} rows; these are not separate judgements.`,
    },
  },
  limits: {
    share: { title: 'Share of the rows with the same pair', unit: '%', default: SHARE },
    activities: { title: 'Rows with three estimates, at least', unit: 'rows', default: ACTIVITIES },
  },
  check({ list }, limits) {
    if (list.singleDuration) return [];
    const { pairs, rows } = pairsOf(list);
    const largest = pairs.reduce<Pair | null>(
      (best, pair) => (best && best.rows >= pair.rows ? best : pair),
      null,
    );
    if (!largest || rows < (limits.activities ?? ACTIVITIES) || largest.values.size < 2) return [];
    if (largest.rows * 100 < (limits.share ?? SHARE) * rows) return [];
    const { low, high } = largest;
    return [
      {
        about: 'list',
        message: 'copied',
        data: { low: percent(low), high: percent(high), rows: largest.rows, of: rows },
        ...WHOLE_LIST,
      },
    ];
  },
};
