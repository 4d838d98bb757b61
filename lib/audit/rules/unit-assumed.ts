import type { Rule } from '../rule';
import { WHOLE_LIST } from '../support/about';
import { PARTS } from '../support/estimate-cells';
import { GAO_DURATIONS } from '../support/sources';
import { counted } from '../support/words';

export const rule: Rule = {
  id: 'unit-assumed',
  meta: {
    weight: 'query',
    title: 'No unit is stated for the durations',
    about:
      'Neither the cells nor the header of a column say in what unit durations are given, and the project sets none. They are read as working days; in hours or weeks every date would be another.',
    source: GAO_DURATIONS,
    messages: {
      assumed: (data) =>
        `No unit is stated for the durations of ${counted(Number(data.count), 'activity', 'activities')}, and none is set for the project: they are read as working ${data.unit}s.`,
    },
  },
  limits: {},
  check({ list }) {
    if (list.unit.from !== 'assumed') return [];
    const count = list.activities.filter((activity) =>
      PARTS.some((part) => activity[part].unit === null && (activity[part].days ?? 0) !== 0),
    ).length;
    if (count === 0) return [];
    return [{ about: 'list', message: 'assumed', data: { count, unit: list.unit.value }, ...WHOLE_LIST }];
  },
};
