import type { Rule } from '../rule';
import { threeOf } from '../support/estimate-cells';
import { isComparable, orderDefect, SLIP_LIMIT } from '../support/order-defect';
import { THREE_POINTS } from '../support/sources';
import { capital } from '../support/words';

export const rule: Rule = {
  id: 'pessimistic-below-likely',
  meta: {
    weight: 'distorts',
    title: 'The worst case is shorter than the likely one',
    about:
      'The pessimistic estimate b is the longest an activity can take, so a ≤ m ≤ b. Where m is over b, two were exchanged, a zero was lost, or one of them is wrong, and neither the expected duration nor its variance is right. Three that run downwards are one finding.',
    source: THREE_POINTS,
    messages: {
      over: (data) =>
        `${capital(data.id)}: m = ${data.m} is over b = ${data.b}; the worst case is shorter than the likely one.`,
      downwards: (data) =>
        `${capital(data.id)}: a = ${data.a}, m = ${data.m} and b = ${data.b} run downwards.`,
    },
  },
  limits: { slip: SLIP_LIMIT },
  check({ list }, limits) {
    return list.activities.flatMap((activity) => {
      const { optimistic: a, likely: m, pessimistic: b } = threeOf(activity);
      if (m === null || b === null || m <= b || !isComparable(list, activity)) return [];
      const message = a !== null && a > m ? 'downwards' : 'over';
      return [
        orderDefect(list, activity, message, ['likely', 'pessimistic'], limits.slip ?? SLIP_LIMIT.default),
      ];
    });
  },
};
