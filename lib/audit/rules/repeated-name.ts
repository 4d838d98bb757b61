import type { Activity } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import type { Rule } from '../rule';
import { at, isLaterBearer } from '../support/about';
import { PRACTICE } from '../support/sources';
import { called, capital, joined, listIn } from '../support/words';

/** How many IDs a finding keeps; the count says the rest. */
const KEPT = 50;

const folded = (name: string) => name.normalize('NFKC').trim().replace(/\s+/g, ' ').toLowerCase();

/** Activities by name, in case and blanks alike; a row whose ID is a repetition is another rule's. */
function byName(list: ActivityList): Map<string, Activity[]> {
  const names = new Map<string, Activity[]>();
  for (const activity of list.activities) {
    const name = folded(activity.name);
    if (name === '' || isLaterBearer(list, activity)) continue;
    const known = names.get(name);
    if (known) known.push(activity);
    else names.set(name, [activity]);
  }
  return names;
}

export const rule: Rule = {
  id: 'repeated-name',
  meta: {
    weight: 'query',
    title: 'Several activities bear one name',
    about:
      'Activities with the same name are told apart by their IDs alone. They may be the same work, entered twice, or work in different places that the names should say. One finding a name.',
    source: PRACTICE,
    messages: {
      repeated: (data) =>
        `${capital(joined(listIn(data, 'ids'), 'and', Number(data.count)))} are all named “${data.name}”.`,
      twice: (data) => `${capital(joined(listIn(data, 'ids')))} are both named “${data.name}”.`,
    },
  },
  limits: {},
  check({ list }) {
    return [...byName(list)].flatMap(([about, activities]) => {
      const [first, second] = activities;
      if (!first || !second) return [];
      const count = activities.length;
      return [
        {
          about,
          message: count === 2 ? 'twice' : 'repeated',
          data: { name: first.name.trim(), ids: activities.slice(0, KEPT).map(called), count },
          ...at(second, second.nameCell),
        },
      ];
    });
  },
};
