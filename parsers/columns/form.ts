import { columnLetters } from '@/lib/schedule/cell';
import { type Field, FIELDS } from '@/lib/schedule/field';
import type { Sheet } from '@/lib/schedule/sheet';
import { type Choice, missing } from './assign';
import type { SheetReading } from './detection';
import type { MatchingError } from './unmatched';

/** What a person or a script settles about reading a file; what it leaves out is told from the file. */
export interface MatchingForm {
  /** Names of the sheets that make up the list, in order. */
  readonly sheet?: readonly string[] | undefined;
  /** Column index (0 = A) by field. */
  readonly columns?: Readonly<Record<string, number>> | undefined;
  /** From 1; 0 where there is no header. */
  readonly headerRow?: number | undefined;
}

const ESTIMATES: readonly Field[] = ['optimistic', 'likely', 'pessimistic', 'duration'];

/** The sheets that the form names, with an error for each name that is none. */
export function namedSheets(
  sheets: readonly Sheet[],
  names: readonly string[],
): { found: Sheet[]; errors: MatchingError[] } {
  const found: Sheet[] = [];
  const errors: MatchingError[] = [];
  for (const name of new Set(names)) {
    const sheet =
      sheets.find((one) => one.name === name) ??
      sheets.find((one) => one.name.trim().toLowerCase() === name.trim().toLowerCase());
    if (sheet) found.push(sheet);
    else
      errors.push({
        path: 'sheet',
        message: `There is no sheet called \u201c${name}\u201d in this file. It has ${listed(sheets.map((one) => one.name))}.`,
      });
  }
  return { found: [...new Set(found)], errors };
}

/** What is wrong with the columns that the form gives for a sheet. */
export function checkColumns(columns: Readonly<Record<string, number>>, sheet: Sheet): MatchingError[] {
  const errors: MatchingError[] = [];
  const holders = new Map<number, string>();
  for (const [field, column] of Object.entries(columns)) {
    const path = `columns.${field}`;
    if (!isField(field)) {
      errors.push({
        path,
        message: `There is no field called \u201c${field}\u201d. The fields are ${Object.keys(FIELDS).join(', ')}.`,
      });
    } else if (!Number.isInteger(column) || column < 0 || column >= sheet.columnCount) {
      const last = sheet.columnCount - 1;
      errors.push({
        path,
        message: `Column ${column} is not in the sheet \u201c${sheet.name}\u201d, whose columns are 0 (A) to ${last} (${columnLetters(last)}).`,
      });
    } else if (holders.has(column)) {
      errors.push({
        path,
        message: `Column ${columnLetters(column)} is given for ${holders.get(column)} and for ${field}. One column holds one field.`,
      });
    } else holders.set(column, field);
  }
  return errors;
}

export function isField(name: string): name is Field {
  return Object.hasOwn(FIELDS, name);
}

/**
 * The reading with the columns that were chosen. A choice that names an ID and a duration or estimate is the
 * whole matching: what it leaves out is not used. A choice without them is completed from what was told.
 */
export function withChosen(reading: SheetReading, columns: Readonly<Record<string, number>>): SheetReading {
  const chosen = new Map<Field, Choice>();
  for (const [field, column] of Object.entries(columns)) {
    if (isField(field)) chosen.set(field, { column, confidence: 1, reason: 'It was chosen.' });
  }
  const isWhole = chosen.has('id') && ESTIMATES.some((field) => chosen.has(field));
  if (isWhole) return { ...reading, choices: chosen, problems: missing(chosen) };
  const used = new Set([...chosen.values()].map(({ column }) => column));
  const choices = new Map(chosen);
  for (const [field, choice] of reading.choices) {
    if (!choices.has(field) && !used.has(choice.column)) choices.set(field, choice);
  }
  const told = new Map([...choices].filter(([, { confidence }]) => confidence > 0.4));
  return { ...reading, choices, problems: missing(told) };
}

function listed(names: readonly string[]): string {
  const quoted = names.slice(0, 8).map((name) => `\u201c${name}\u201d`);
  return quoted.length < names.length
    ? `${quoted.join(', ')} and ${names.length - quoted.length} more`
    : quoted.join(', ');
}
