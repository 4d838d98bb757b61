import type { Rule } from '../rule';
import { aboutActivity, at } from '../support/about';
import { addLink, linkColumnCell } from '../support/link-fixes';
import { openEnds } from '../support/open-ends';
import { DCMA_LOGIC, GAO_LOGIC } from '../support/sources';
import { called } from '../support/words';

export const rule: Rule = {
  id: 'open-finish',
  meta: {
    weight: 'query',
    title: 'Nothing waits for an activity',
    about:
      'Every activity but the finish is followed by another. One that leads nowhere can be as late as it likes without moving the finish, so its float is too large. The finish is the milestone among those that nothing waits for, else the last of them.',
    source: `${GAO_LOGIC}. ${DCMA_LOGIC}`,
    messages: {
      open: (data) =>
        `Nothing waits for ${data.id}. The list ends with ${data.finish}; only a finish should lead nowhere.`,
    },
  },
  limits: {},
  check(context) {
    const { list } = context;
    const { finish, finishes } = openEnds(context);
    if (!finish) return [];
    return finishes.map((activity) => {
      const reason = `The list ends with ${finish.id}, so that waits at least for ${activity.id}.`;
      const fix = addLink(list, activity, finish, reason);
      return {
        about: aboutActivity(list, activity),
        message: 'open',
        data: { id: called(activity), finish: called(finish), others: finishes.length },
        ...at(activity, linkColumnCell(list, activity, 'successors') ?? activity.idCell),
        ...(fix ? { fix } : {}),
      };
    });
  },
};
