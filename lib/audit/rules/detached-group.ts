import type { AuditContext, Rule } from '../rule';
import { aboutActivity, at } from '../support/about';
import { groupsOf } from '../support/groups';
import { intended } from '../support/intended';
import { GAO_LOGIC } from '../support/sources';
import { capital, called, joined, listIn } from '../support/words';

/** How many IDs a finding keeps; the count says the rest. */
const KEPT = 50;

/**
 * Groups of two or more beside the largest (of two as large, the one that begins first). An activity alone is
 * no group: it is an open start and an open finish. Nor is one detached whose links are there and cannot be
 * read: another rule has those.
 */
function detached(context: AuditContext): number[][] {
  const { obscure } = intended(context);
  const groups = groupsOf(context).filter(({ length }) => length > 1);
  const largest = groups.reduce(
    (best, group) => (group.length > best.length ? group : best),
    groups[0] ?? [],
  );
  return groups.filter((group) => group !== largest && !group.some((one) => obscure.has(one)));
}

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
    return detached(context).flatMap((group) => {
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
