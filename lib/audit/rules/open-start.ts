import type { Rule } from '../rule';
import { aboutActivity, at } from '../support/about';
import { addLink, linkColumnCell } from '../support/link-fixes';
import { openEnds } from '../support/open-ends';
import { DCMA_LOGIC, GAO_LOGIC } from '../support/sources';
import { called } from '../support/words';

export const rule: Rule = {
  id: 'open-start',
  meta: {
    weight: 'query',
    title: 'An activity waits for nothing',
    about:
      'Every activity but the start waits for another. One that waits for none is scheduled at time 0, whatever happens before it, and a delay elsewhere never reaches it. The start is the milestone among those that wait for nothing, else the first of them.',
    source: `${GAO_LOGIC}. ${DCMA_LOGIC}`,
    messages: {
      open: (data) =>
        `${data.id} waits for nothing. The list starts with ${data.start}; only a start should.`,
    },
  },
  limits: {},
  check(context) {
    const { list } = context;
    const { start, starts } = openEnds(context);
    if (!start) return [];
    return starts.map((activity) => {
      const reason = `The list starts with ${start.id}, so ${activity.id} waits at least for that.`;
      const fix = addLink(list, start, activity, reason);
      return {
        about: aboutActivity(list, activity),
        message: 'open',
        data: { id: called(activity), start: called(start), others: starts.length },
        ...at(activity, linkColumnCell(list, activity, 'predecessors')),
        ...(fix ? { fix } : {}),
      };
    });
  },
};
