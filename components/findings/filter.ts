import type { FindingView } from '@/lib/contract/submission';
import { FINDING_STATES, WEIGHTS, type FindingState, type Weight } from '@/lib/schedule/weight';

/** Empty sets leave everything in. */
export interface FindingFilter {
  readonly weights: ReadonlySet<Weight>;
  readonly rules: ReadonlySet<string>;
  readonly states: ReadonlySet<FindingState>;
  readonly text: string;
}

export const NO_FILTER: FindingFilter = { weights: new Set(), rules: new Set(), states: new Set(), text: '' };

export const WEIGHT_NAMES = Object.keys(WEIGHTS) as readonly Weight[];

export function isFiltered(filter: FindingFilter): boolean {
  return filter.weights.size + filter.rules.size + filter.states.size > 0 || filter.text.trim() !== '';
}

/** Everything of a finding that the search looks through, in lower case. */
function haystack(finding: FindingView): string {
  return [
    finding.cell,
    finding.activityId,
    finding.activityName,
    finding.title,
    finding.message,
    finding.rule,
    finding.sheet,
  ]
    .filter((part) => part !== null)
    .join('\n')
    .toLowerCase();
}

/** A test to run over each finding: every word typed must occur in it. */
export function matches(filter: FindingFilter): (finding: FindingView) => boolean {
  const words = filter.text.toLowerCase().split(/\s+/).filter(Boolean);
  return (finding) => {
    if (filter.weights.size > 0 && !filter.weights.has(finding.weight)) return false;
    if (filter.rules.size > 0 && !filter.rules.has(finding.rule)) return false;
    if (filter.states.size > 0 && !filter.states.has(finding.state)) return false;
    if (words.length === 0) return true;
    const text = haystack(finding);
    return words.every((word) => text.includes(word));
  };
}

export interface FindingCounts {
  readonly all: number;
  readonly weights: Readonly<Record<Weight, number>>;
  readonly states: Readonly<Record<FindingState, number>>;
  /** By rule, most frequent first. */
  readonly rules: readonly { readonly rule: string; readonly title: string; readonly count: number }[];
}

/** How many there are of each; what the chips and menus show. */
export function countFindings(findings: readonly FindingView[]): FindingCounts {
  const weights: Record<Weight, number> = { blocks: 0, distorts: 0, query: 0 };
  const states: Record<FindingState, number> = { open: 0, corrected: 0, waived: 0, answered: 0 };
  const rules = new Map<string, { rule: string; title: string; count: number }>();
  for (const finding of findings) {
    weights[finding.weight] += 1;
    states[finding.state] += 1;
    const rule = rules.get(finding.rule);
    if (rule) rule.count += 1;
    else rules.set(finding.rule, { rule: finding.rule, title: finding.title, count: 1 });
  }
  const byCount = [...rules.values()].sort((x, y) => y.count - x.count || x.rule.localeCompare(y.rule));
  return { all: findings.length, weights, states, rules: byCount };
}

/** A copy of the set with the member taken in or out. */
export function toggled<T>(set: ReadonlySet<T>, member: T): ReadonlySet<T> {
  const next = new Set(set);
  if (!next.delete(member)) next.add(member);
  return next;
}

/** The filter as it stands in the address, so that it can be sent to a colleague. */
export function filterToQuery(filter: FindingFilter): URLSearchParams {
  const query = new URLSearchParams();
  for (const weight of filter.weights) query.append('weight', weight);
  for (const rule of filter.rules) query.append('rule', rule);
  for (const state of filter.states) query.append('state', state);
  if (filter.text.trim()) query.set('q', filter.text.trim());
  return query;
}

export function filterFromQuery(query: URLSearchParams): FindingFilter {
  const weights = WEIGHT_NAMES.filter((weight) => query.getAll('weight').includes(weight));
  const states = FINDING_STATES.filter((state) => query.getAll('state').includes(state));
  return {
    weights: new Set(weights),
    rules: new Set(query.getAll('rule')),
    states: new Set(states),
    text: query.get('q') ?? '',
  };
}
