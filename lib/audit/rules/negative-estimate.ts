import { cellAddress } from '@/lib/schedule/cell';
import type { Activity } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import type { Rule } from '../rule';
import { aboutActivity, at } from '../support/about';
import {
  durationName,
  type EstimateCell,
  estimateCells,
  estimateFix,
  inOrder,
  threeOf,
} from '../support/estimate-cells';
import { PRACTICE } from '../support/sources';
import { called, shown } from '../support/words';

/** The three with every sign taken off. */
function positive(activity: Activity) {
  const { optimistic: a, likely: m, pessimistic: b } = threeOf(activity);
  const size = (value: number | null) => (value === null ? null : Math.abs(value));
  return { optimistic: size(a), likely: size(m), pessimistic: size(b) };
}

/** The positive value: the fix where the three are then in order, else only one that can be had. */
function fixesFor(list: ActivityList, activity: Activity, cell: EstimateCell) {
  const days = Math.abs(cell.estimate.days ?? 0);
  const ordered = inOrder(positive(activity));
  const reason = ordered
    ? 'The same number without its sign keeps a ≤ m ≤ b.'
    : 'The same number without its sign; a ≤ m ≤ b does not hold with it.';
  const fix = estimateFix(list, activity, Object.fromEntries(cell.parts.map((part) => [part, days])), reason);
  if (!fix) return {};
  return ordered ? { fix } : { alternatives: [fix] };
}

export const rule: Rule = {
  id: 'negative-estimate',
  meta: {
    weight: 'distorts',
    title: 'An estimate is below zero',
    about:
      'No activity takes less than no time. A minus sign before an estimate is a slip, and the expected duration comes out too short by it.',
    source: PRACTICE,
    messages: {
      negative: (data) =>
        `The ${data.name} of ${data.id} is ${data.value}, and no activity takes less than no time.`,
    },
  },
  limits: {},
  check({ list }) {
    return list.activities.flatMap((activity) =>
      estimateCells(activity, list)
        .filter(({ estimate }) => estimate.problem === null && (estimate.days ?? 0) < 0)
        .map((cell) => ({
          about: `${aboutActivity(list, activity)}|${cell.key}`,
          message: 'negative',
          data: {
            id: called(activity),
            name: durationName(cell.name),
            value: shown(cell.estimate, list),
            cell: cell.estimate.cell ? cellAddress(cell.estimate.cell) : null,
          },
          ...at(activity, cell.estimate.cell),
          ...fixesFor(list, activity, cell),
        })),
    );
  },
};
