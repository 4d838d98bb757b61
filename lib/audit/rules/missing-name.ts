import type { Rule } from '../rule';
import { aboutActivity, at } from '../support/about';
import { PRACTICE } from '../support/sources';
import { called, capital } from '../support/words';

export const rule: Rule = {
  id: 'missing-name',
  meta: {
    weight: 'query',
    title: 'An activity has no name',
    about:
      'The list names its activities and leaves this one without a name, so no one can tell what work it stands for.',
    source: PRACTICE,
    messages: { missing: (data) => `${capital(data.id)} has no name.` },
  },
  limits: {},
  check({ list }) {
    const named = new Set(
      list.matching.filter(({ columns }) => columns.name !== undefined).map(({ sheet }) => sheet),
    );
    const unreadable = new Set(
      list.errorCells.filter(({ field }) => field === 'name').map(({ owner }) => owner),
    );
    return list.activities
      .filter(({ name, sheet, id }) => id !== '' && name.trim() === '' && named.has(sheet))
      .filter(({ index }) => !unreadable.has(index))
      .map((activity) => ({
        about: aboutActivity(list, activity),
        message: 'missing',
        data: { id: called(activity) },
        ...at(activity, activity.nameCell),
      }));
  },
};
