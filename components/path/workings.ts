import type { Format } from '@/components/ui/locale';
import type { Working } from '@/components/ui/worked-line';
import type { AnalysedActivity } from '@/lib/contract/submission';

const SOURCE = 'Malcolm, Roseboom, Clark, Fazar 1959';

type Estimates = Pick<AnalysedActivity, 'optimistic' | 'likely' | 'pessimistic'>;

export function expectedWorking(activity: Estimates & { expected: number }, format: Format): Working {
  const { optimistic: a, likely: m, pessimistic: b } = activity;
  return {
    title: 'Expected duration',
    formula: '(a + 4m + b) / 6',
    figures: `(${exact(a)} + 4 × ${exact(m)} + ${exact(b)}) / 6`,
    result: format.days(activity.expected, 4),
    source: SOURCE,
  };
}

export function varianceWorking(activity: Estimates & { variance: number }, format: Format): Working {
  return {
    title: 'Variance',
    formula: '((b − a) / 6)²',
    figures: `((${exact(activity.pessimistic)} − ${exact(activity.optimistic)}) / 6)²`,
    result: `${format.number(activity.variance, 4)} d²`,
    source: SOURCE,
  };
}

/** The sum of the path's variances, written out; of a long path only its ends are. */
export function pathVarianceWorking(
  path: readonly AnalysedActivity[],
  total: number,
  format: Format,
): Working {
  const terms = path
    .filter((activity) => activity.variance > 0)
    .map((activity) => format.number(activity.variance, 2));
  const shown =
    terms.length > 14 ? [...terms.slice(0, 7), `… (${terms.length - 12} more)`, ...terms.slice(-5)] : terms;
  return {
    title: 'Variance of the critical path',
    formula: 'sum of ((b − a) / 6)² along the path',
    figures: shown.length > 0 ? shown.join(' + ') : '0',
    result: `${format.number(total, 4)} d²`,
    source: SOURCE,
    note: 'Durations are taken as independent of one another. Where several paths are critical, the one with the largest variance counts.',
  };
}

function exact(value: number): string {
  return String(Number(value.toPrecision(10))).replace('-', '−');
}
