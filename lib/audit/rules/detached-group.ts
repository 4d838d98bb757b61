import type { Rule } from '../rule';
import { aboutActivity, at } from '../support/about';
import { detachedGroups } from '../support/groups';
import { GAO_LOGIC } from '../support/sources';
import { capital, called, joined, listIn } from '../support/words';

/** How many IDs a finding keeps; the count says the rest. */
const KEPT = 50;

export const rule: Rule = {
  id: 'detached-group',
  meta: {
    weight: 'distorts',
    title: 'A group of activities hangs on nothing',
    about:
      'The activities of the group are linked to one another and to none of the rest. Nothing outside can delay them and they can delay nothing outside, so the path through the list is not the path through the work. Which link is missing only the contractor can say.',
    source: GAO_LOGIC,
    messages: {
      group: (data) =>
        `${capital(joined(listIn(data, 'ids'), 'and', Number(data.count)))} are linked to one another, and to none of the other ${data.rest} activities.`,
    },
  },
  limits: {},
  check(context) {
    const { list } = context;
    return detachedGroups(context).flatMap((group) => {
      const activities = group.flatMap((index) => list.activities[index] ?? []);
      const [first] = activities;
      if (!first) return [];
      return [
        {
          about: aboutActivity(list, first),
          message: 'group',
          data: {
            ids: activities.slice(0, KEPT).map(called),
            count: group.length,
            rest: list.activities.length - group.length,
          },
          ...at(first, first.idCell),
        },
      ];
    });
  },
};
