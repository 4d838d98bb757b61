import type { Rule } from '../rule';
import { aboutActivity, at } from '../support/about';
import { freeIdFix } from '../support/free-id-fix';
import { PRACTICE } from '../support/sources';

export const rule: Rule = {
  id: 'missing-id',
  meta: {
    weight: 'blocks',
    title: 'A row has no ID',
    about:
      'The row has estimates or a name, so it is an activity, and it bears no ID. No other activity can wait for it, and no finding, comment or later revision can name it.',
    source: PRACTICE,
    messages: {
      named: (data) => `Row ${data.row}, “${data.name}”, has no ID, so nothing can wait for it.`,
      unnamed: (data) => `Row ${data.row} has estimates and no ID, so nothing can wait for it.`,
    },
  },
  limits: {},
  check({ list }) {
    return list.activities
      .filter(({ id, idError }) => id === '' && idError === null)
      .map((activity) => ({
        about: aboutActivity(list, activity),
        message: activity.name.trim() === '' ? 'unnamed' : 'named',
        data: { row: activity.row, name: activity.name.trim() },
        ...at(activity, activity.idCell),
        ...freeIdFix(list, activity),
      }));
  },
};
