import type { Rule } from '../rule';
import { threeOf } from '../support/estimate-cells';
import { isComparable, orderDefect, SLIP_LIMIT } from '../support/order-defect';
import { THREE_POINTS } from '../support/sources';
import { capital } from '../support/words';

export const rule: Rule = {
  id: 'likely-below-optimistic',
  meta: {
    weight: 'distorts',
    title: 'The best case is longer than the likely one',
    about:
      'The optimistic estimate a is the shortest an activity can take, so a ≤ m ≤ b. Where a is over m, two were exchanged, a zero slipped in, or one of them is wrong, and neither the expected duration nor its variance is right.',
    source: THREE_POINTS,
    messages: {
      over: (data) =>
        `${capital(data.id)}: a = ${data.a} is over m = ${data.m}; the best case is longer than the likely one.`,
    },
  },
  limits: { slip: SLIP_LIMIT },
  check({ list }, limits) {
    return list.activities.flatMap((activity) => {
      const { optimistic: a, likely: m, pessimistic: b } = threeOf(activity);
      if (a === null || m === null || a <= m || !isComparable(list, activity)) return [];
      // a > m > b is one defect, and the other rule's.
      if (b !== null && m > b) return [];
      return [
        orderDefect(list, activity, 'over', ['optimistic', 'likely'], limits.slip ?? SLIP_LIMIT.default),
      ];
    });
  },
};
