import type { ActivityList } from '@/lib/schedule/activity-list';
import type { Defect, MessageData, Rule } from '../rule';
import { aboutActivity, at, WHOLE_LIST } from '../support/about';
import { hasOneDuration, threeOf } from '../support/estimate-cells';
import { GAO_RISK } from '../support/sources';
import { called, capital, counted, shown } from '../support/words';

/** A list with one duration column says so once; where only some of its sheets have one, each of those does. */
function oneColumn(list: ActivityList): Defect[] {
  const counts = new Map<string, number>();
  for (const activity of list.activities) {
    if (!hasOneDuration(activity, list) || (threeOf(activity).likely ?? 0) <= 0) continue;
    const about = list.singleDuration ? 'list' : activity.sheet;
    counts.set(about, (counts.get(about) ?? 0) + 1);
  }
  return [...counts].map(([about, count]) => ({
    about,
    message: list.singleDuration ? 'list' : 'sheet',
    data: { count, sheet: about },
    ...WHOLE_LIST,
    sheet: list.singleDuration ? null : about,
  }));
}

const activities = (data: MessageData) => counted(Number(data.count), 'activity', 'activities');

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
      list: (data) =>
        `The list gives one duration for each activity (${activities(data)}), so no finish can be given a spread.`,
      sheet: (data) =>
        `Sheet “${data.sheet}” gives one duration for each activity (${activities(data)}), so these add no spread to the finish.`,
    },
  },
  limits: {},
  check({ list }) {
    const rows = list.activities.flatMap((activity) => {
      const { optimistic: a, likely: m, pessimistic: b } = threeOf(activity);
      if (m === null || m <= 0 || a !== m || b !== m || hasOneDuration(activity, list)) return [];
      return [
        {
          about: aboutActivity(list, activity),
          message: 'row',
          data: { id: called(activity), value: shown(activity.likely, list) },
          ...at(activity, activity.likely.cell),
        },
      ];
    });
    return [...oneColumn(list), ...rows];
  },
};
