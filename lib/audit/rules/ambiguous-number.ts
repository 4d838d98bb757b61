import type { Rule } from '../rule';
import { doubtOf } from '../support/doubtful';
import { estimateCells } from '../support/estimate-cells';
import { PRACTICE } from '../support/sources';
import { joinedIn } from '../support/words';

export const rule: Rule = {
  id: 'ambiguous-number',
  meta: {
    weight: 'distorts',
    title: 'A number can be read in two ways',
    about:
      'A comma or a point may divide thousands or begin the decimals, and nothing else in the column tells which. 1,234 is then a little over one, or over a thousand.',
    source: PRACTICE,
    messages: {
      several: (data) =>
        `“${data.text}” in ${data.cell}, the ${data.name} of ${data.id}, can be read as ${joinedIn(data, 'readings', 'or')}.`,
    },
  },
  limits: {},
  check({ list }) {
    return list.activities.flatMap((activity) =>
      estimateCells(activity, list)
        .filter(({ estimate }) => estimate.problem === 'ambiguous')
        .map((cell) => {
          const { defect } = doubtOf(list, activity, cell);
          const unknown = cell.parts.includes('likely') && cell.estimate.days === null;
          return { ...defect, message: 'several', ...(unknown ? { weight: 'blocks' as const } : {}) };
        }),
    );
  },
};
