import type { Rule } from '../rule';
import { doubtOf } from '../support/doubtful';
import { estimateCells } from '../support/estimate-cells';
import { PRACTICE } from '../support/sources';
import { joinedIn } from '../support/words';

export const rule: Rule = {
  id: 'unreadable-estimate',
  meta: {
    weight: 'blocks',
    title: 'An estimate cannot be read',
    about:
      'The cell holds something, and it is no duration: words, a date, a range, a number with a unit that is none of time. What is not read is not guessed.',
    source: PRACTICE,
    messages: {
      none: (data) =>
        `“${data.text}” in ${data.cell} is no duration, so the ${data.name} of ${data.id} is not known.`,
      one: (data) =>
        `“${data.text}” in ${data.cell}, the ${data.name} of ${data.id}, cannot be read as it stands; ${joinedIn(data, 'likely')} seems to be meant.`,
      several: (data) =>
        `“${data.text}” in ${data.cell}, the ${data.name} of ${data.id}, can be read as ${joinedIn(data, 'readings', 'or')}.`,
      formula: (data) =>
        `The formula in ${data.cell} has no stored result, so the ${data.name} of ${data.id} is not known.`,
    },
  },
  limits: {},
  check({ list }) {
    return list.activities.flatMap((activity) =>
      estimateCells(activity, list)
        .filter(({ estimate }) => estimate.problem === 'unreadable')
        .map((cell) => {
          const { defect, likely } = doubtOf(list, activity, cell);
          const count = likely.length === 0 ? 'none' : likely.length === 1 ? 'one' : 'several';
          const isFormula = cell.estimate.text.trim() === '' || cell.estimate.text.startsWith('=');
          return { ...defect, message: likely.length === 0 && isFormula ? 'formula' : count };
        }),
    );
  },
};
