import type { Rule } from '../rule';
import { aboutActivity, at } from '../support/about';
import { PRACTICE } from '../support/sources';
import { called, capital } from '../support/words';

export const rule: Rule = {
  id: 'hidden-row',
  meta: {
    weight: 'query',
    title: 'A hidden row is part of the list',
    about:
      'The row is hidden in the sheet, so whoever reads the workbook does not see it, and it is computed with all the same. It may be a leftover, or something that was not meant to be seen.',
    source: PRACTICE,
    messages: {
      hidden: (data) =>
        `${capital(data.id)} stands in row ${data.row}, which is hidden, and is part of the list.`,
    },
  },
  limits: {},
  check({ list }) {
    return list.activities
      .filter(({ hidden }) => hidden)
      .map((activity) => ({
        about: aboutActivity(list, activity),
        message: 'hidden',
        data: { id: called(activity), row: activity.row },
        ...at(activity, activity.idCell),
      }));
  },
};
