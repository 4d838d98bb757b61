import type { Rule } from '../rule';
import { PRACTICE } from '../support/sources';

export const rule: Rule = {
  id: 'refused-row',
  meta: {
    weight: 'distorts',
    title: 'A row could not be read',
    about:
      'The row looks like an activity and could not be read as one, so it is in no figure. Every row that is read is accounted for, this one as refused.',
    source: PRACTICE,
    messages: {
      refused: (data) => `Row ${data.row} of sheet “${data.sheet}” is left out. ${data.reason}`,
    },
  },
  limits: {},
  check({ list }) {
    return list.refused.map(({ sheet, row, reason }) => ({
      about: `${sheet}|${row}`,
      message: 'refused',
      data: { sheet, row, reason },
      activityId: null,
      sheet,
      row,
      cell: null,
    }));
  },
};
