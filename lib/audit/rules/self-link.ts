import type { Rule } from '../rule';
import { aboutActivity, at } from '../support/about';
import { removeLinks, writtenIn } from '../support/link-fixes';
import { GAO_LOGIC } from '../support/sources';
import { called, capital } from '../support/words';

export const rule: Rule = {
  id: 'self-link',
  meta: {
    weight: 'blocks',
    title: 'An activity waits for itself',
    about:
      'An activity that waits for itself can never start, so no date can be computed. It is the shortest of all loops, and usually a slip for a neighbouring ID.',
    source: GAO_LOGIC,
    messages: {
      alone: (data) => `${capital(data.id)} waits for itself, and for nothing else.`,
      beside: (data) => `${capital(data.id)} waits for itself.`,
    },
  },
  limits: {},
  check({ list, linksInto }) {
    return list.links.flatMap((link, index) => {
      const activity = list.activities[link.fromIndex];
      if (!activity || link.fromIndex !== link.toIndex) return [];
      const { cell, item } = writtenIn(list, link);
      const others = linksInto[activity.index]?.some(
        (into) => list.links[into]?.fromIndex !== activity.index,
      );
      return [
        {
          about: aboutActivity(list, activity),
          message: others ? 'beside' : 'alone',
          data: { id: called(activity), entry: item?.text ?? link.from },
          ...at(activity, cell?.cell ?? null),
          fix: removeLinks(list, [index], 'No activity can wait for itself, so the link is removed.'),
        },
      ];
    });
  },
};
