import type { Activity } from '@/lib/schedule/activity';
import type { Rule } from '../rule';
import { aboutActivity, at } from '../support/about';
import { estimateFix, readable, takesNoTime } from '../support/estimate-cells';
import { PRACTICE } from '../support/sources';
import { called, capital, shown } from '../support/words';

/** `Milestone: roof tight`, `Roof tight (milestone)`, `Roof tight milestone`. */
const NAMED = /^\s*\(?milestone\b\s*(?:\)|[:–—-]|no\b|\d)|\bmilestone\s*\)?\s*(?:\d+\s*)?$/i;

const isNamedSo = ({ name }: Activity) => NAMED.test(name);

export const rule: Rule = {
  id: 'milestone-with-duration',
  meta: {
    weight: 'distorts',
    title: 'A milestone takes time',
    about:
      'A milestone is a moment: something is reached, and it takes no time to be reached. One with a duration is work that should be named for what it is, or the duration is a slip.',
    source: PRACTICE,
    messages: {
      timed: (data) => `${capital(data.id)} is named a milestone (“${data.name}”), and takes ${data.value}.`,
    },
  },
  limits: {},
  check({ list }) {
    return list.activities.flatMap((activity) => {
      const likely = readable(activity.likely);
      if (!isNamedSo(activity) || likely === null || likely < 0 || takesNoTime(activity)) return [];
      const none = { optimistic: 0, likely: 0, pessimistic: 0 };
      const fix = estimateFix(list, activity, none, 'A milestone takes no time.');
      return [
        {
          about: aboutActivity(list, activity),
          message: 'timed',
          data: { id: called(activity), name: activity.name.trim(), value: shown(activity.likely, list) },
          ...at(activity, activity.likely.cell),
          ...(fix ? { fix } : {}),
        },
      ];
    });
  },
};
