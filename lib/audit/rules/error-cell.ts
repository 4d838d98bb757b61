import { cellAddress } from '@/lib/schedule/cell';
import { type Field, FIELDS } from '@/lib/schedule/field';
import type { Rule } from '../rule';
import { aboutActivity } from '../support/about';
import { PRACTICE } from '../support/sources';
import { called } from '../support/words';

/** Without these the network cannot be computed. */
const NEEDED: ReadonlySet<string> = new Set<Field>(['id', 'optimistic', 'likely', 'pessimistic', 'duration']);

const isField = (field: string): field is Field => Object.hasOwn(FIELDS, field);

/** `Most likely (m)` → `most likely (m)`; abbreviations stay. */
function fieldName(field: string): string {
  const name = isField(field) ? FIELDS[field] : field;
  return /^\p{Lu}{2}/u.test(name) ? name : name.charAt(0).toLowerCase() + name.slice(1);
}

export const rule: Rule = {
  id: 'error-cell',
  meta: {
    weight: 'distorts',
    title: 'A cell shows an error in place of a value',
    about:
      'A formula in the workbook could not be worked out, and its cell shows #REF!, #N/A, #DIV/0! or the like. What should stand there only the contractor knows. In an ID or an estimate it keeps the network from being computed.',
    source: PRACTICE,
    messages: {
      activity: (data) => `${data.cell} shows ${data.code} where the ${data.field} of ${data.id} should be.`,
      row: (data) => `${data.cell} shows ${data.code} where a value of “${data.field}” should be.`,
    },
  },
  limits: {},
  check({ list }) {
    return list.errorCells.map(({ cell, field, code, owner }) => {
      const activity = list.activities[owner];
      const address = cellAddress(cell);
      return {
        about: `${activity ? aboutActivity(list, activity) : address}|${field}`,
        message: activity ? 'activity' : 'row',
        data: { cell: address, code, field: fieldName(field), id: activity ? called(activity) : null },
        weight: NEEDED.has(field) && activity ? ('blocks' as const) : ('distorts' as const),
        activityId: activity && activity.id !== '' ? activity.id : null,
        sheet: cell.sheet,
        row: cell.row,
        cell: address,
      };
    });
  },
};
