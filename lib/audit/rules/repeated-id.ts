import type { Rule } from '../rule';
import { aboutActivity, at, isLaterBearer } from '../support/about';
import { freeIdFix } from '../support/free-id-fix';
import { PRACTICE } from '../support/sources';
import { inRow } from '../support/words';

export const rule: Rule = {
  id: 'repeated-id',
  meta: {
    weight: 'blocks',
    title: 'Two rows bear the same ID',
    about:
      'An ID names one activity. Where a second row bears it, a link to that ID could mean either of them, and no one can tell which. Blanks around an ID do not count, and 7 and 7.0 are one ID; 7 and 007 are two.',
    source: PRACTICE,
    messages: {
      repeated: (data) =>
        `${data.id} is the ID of ${data.first} and again of row ${data.row}: a link to it could mean either.`,
    },
  },
  limits: {},
  check({ list }) {
    return list.activities
      .filter((activity) => isLaterBearer(list, activity))
      .map((activity) => {
        const { id, row, sheet } = activity;
        const first = list.activities[list.indexOf.get(id) ?? -1];
        return {
          about: aboutActivity(list, activity),
          message: 'repeated',
          data: { id, row, first: first ? inRow(first, sheet) : 'another row' },
          ...at(activity, activity.idCell),
          ...freeIdFix(list, activity),
        };
      });
  },
};
