import type { ActivityList } from '@/lib/schedule/activity-list';
import type { Defect, Rule } from '../rule';
import { aboutActivity, at, WHOLE_LIST } from '../support/about';
import { threeOf } from '../support/estimate-cells';
import { GAO_RISK } from '../support/sources';
import { called, capital, counted, shown } from '../support/words';

/** A list with one duration column says so once. */
function singleColumn(list: ActivityList): Defect[] {
  const timed = list.activities.filter((activity) => (threeOf(activity).likely ?? 0) > 0);
  if (timed.length === 0) return [];
  return [{ about: 'list', message: 'single', data: { count: timed.length }, ...WHOLE_LIST }];
}

export const rule: Rule = {
  id: 'no-spread',
  meta: {
    weight: 'query',
    title: 'The three estimates are one',
    about:
      'Where a = m = b the duration counts as certain: it adds nothing to the variance of the path, and the chance of the target comes out better than it is. Some activities are that certain; most are not.',
    source: GAO_RISK,
    messages: {
      row: (data) =>
        `${capital(data.id)} is estimated at ${data.value} in the best, the likely and the worst case.`,
      single: (data) =>
        `The list gives one duration for each activity (${counted(Number(data.count), 'activity', 'activities')}), so no finish can be given a spread.`,
    },
  },
  limits: {},
  check({ list }) {
    if (list.singleDuration) return singleColumn(list);
    return list.activities.flatMap((activity) => {
      const { optimistic: a, likely: m, pessimistic: b } = threeOf(activity);
      if (m === null || m <= 0 || a !== m || b !== m) return [];
      return [
        {
          about: aboutActivity(list, activity),
          message: 'row',
          data: { id: called(activity), value: shown(activity.likely, list) },
          ...at(activity, activity.likely.cell),
        },
      ];
    });
  },
};
