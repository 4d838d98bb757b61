import type { Field, Matching, SheetMatching } from '@/lib/schedule/field';
import type { Sheet } from '@/lib/schedule/sheet';
import { isBlank } from '@/parsers/cells/text';
import { UNREADABLE } from '@/parsers/errors';
import { LIMITS } from '@/parsers/limits';
import { type Detection, detectSheet, type SheetReading, toDetectedSheet } from './detection';
import { checkColumns, type MatchingForm, namedSheets, withChosen } from './form';
import { type MatchingError, UnmatchedColumns } from './unmatched';

export type { DetectedColumn, DetectedSheet, Detection } from './detection';
export type { MatchingForm } from './form';
export { type MatchingError, UnmatchedColumns } from './unmatched';

const SURE = 0.8;
const WANTED: readonly Field[] = [
  'id',
  'likely',
  'duration',
  'predecessors',
  'successors',
  'optimistic',
  'pessimistic',
];

interface Outcome {
  readonly detection: Detection;
  readonly errors: readonly MatchingError[];
}

/**
 * Tells the sheet, the header row and the columns of an activity list. What a form settles is taken as said,
 * and the rest is told from the file. Never throws: what cannot be told is among the problems.
 */
export function detectMatching(sheets: readonly Sheet[], form: MatchingForm = {}): Detection {
  return detect(sheets, form).detection;
}

/** The matching a form and the file give; throws UnmatchedColumns where it cannot be told or cannot be. */
export function matchingFrom(form: MatchingForm, sheets: readonly Sheet[]): Matching {
  const { detection, errors } = detect(sheets, form);
  if (errors.length > 0) throw new UnmatchedColumns(detection, errors);
  return detection.matching;
}

function detect(sheets: readonly Sheet[], form: MatchingForm): Outcome {
  const readings = sheets.map((sheet) => detectSheet(sheet));
  const named = namedSheets(sheets, form.sheet ?? []);
  const ranked = rank(readings);
  const first = named.found.length > 0 ? named.found : ranked.slice(0, 1).map(({ sheet }) => sheet);
  const chosen = choose(first, readings, form);
  const errors = [...named.errors, ...errorsOf(chosen, form)];
  const shown = readings.map((reading) => chosen.find(({ sheet }) => sheet === reading.sheet) ?? reading);
  const rivals =
    named.found.length > 0
      ? 0
      : ranked.filter(({ sheet, problems }) => !sheet.hidden && problems.length === 0).length - 1;
  return {
    errors,
    detection: {
      sheets: shown.map(toDetectedSheet),
      proposed: chosen[0]?.sheet.name ?? null,
      matching: chosen.map(toMatching),
      sure: errors.length === 0 && rivals < 1 && chosen.every((reading) => isSure(reading, form)),
      problems: errors.map(({ message }) => message),
    },
  };
}

/** Sheets that hold anything, likeliest first. */
function rank(readings: readonly SheetReading[]): SheetReading[] {
  const rankOf = ({ sheet, problems, choices, rows }: SheetReading) => {
    let rank =
      (sheet.hidden ? -60 : 0) + (problems.length === 0 ? 100 : 0) + Math.min(5, Math.log2(rows + 1) / 4);
    for (const field of WANTED) rank += 5 * (choices.get(field)?.confidence ?? 0);
    return rank;
  };
  return readings.filter(({ sheet }) => sheet.rows.length > 0).sort((a, b) => rankOf(b) - rankOf(a));
}

/** The chosen sheets as they are to be read; a sheet that goes on without a header has the columns of the first. */
function choose(
  sheets: readonly Sheet[],
  readings: readonly SheetReading[],
  form: MatchingForm,
): SheetReading[] {
  const chosen: SheetReading[] = [];
  for (const sheet of sheets) {
    const told = readings.find((reading) => reading.sheet === sheet) ?? detectSheet(sheet);
    const [leader] = chosen;
    if (!leader) {
      const reading = form.headerRow === undefined ? told : detectSheet(sheet, form.headerRow);
      chosen.push(form.columns ? withChosen(reading, form.columns) : reading);
    } else if (form.columns || told.header.row === 0 || told.problems.length > 0) {
      chosen.push({ ...told, choices: leader.choices, problems: leader.problems });
    } else chosen.push(told);
  }
  return chosen;
}

function errorsOf(chosen: readonly SheetReading[], { columns, headerRow }: MatchingForm): MatchingError[] {
  const [first] = chosen;
  if (!first) return [{ path: 'sheet', message: 'No sheet of this file holds anything.' }];
  const errors = columns ? chosen.flatMap(({ sheet }) => checkColumns(columns, sheet)) : [];
  if (errors.length > 0)
    return errors.filter((error, i) => errors.findIndex(({ path }) => path === error.path) === i);
  const last = first.sheet.rows.at(-1)?.number ?? 0;
  if (headerRow !== undefined && headerRow >= last) {
    return [
      {
        path: 'headerRow',
        message: `Nothing stands below row ${headerRow} of the sheet \u201c${first.sheet.name}\u201d.`,
      },
    ];
  }
  if (isTooLong(chosen)) return [{ path: 'file', message: UNREADABLE['too-many-rows'] }];
  const problems = [...first.problems];
  if (first.rows === 0 && problems.length === 0) problems.push('Nothing stands below the header.');
  return problems.map((message) => ({ path: 'columns', message }));
}

/** Whether more rows that hold anything stand below the headers than a list may have. */
function isTooLong(chosen: readonly SheetReading[]): boolean {
  const count = chosen.reduce((sum, { sheet }) => sum + sheet.rows.length, 0);
  if (count <= LIMITS.rows) return false;
  const below = chosen.map(
    ({ sheet, header }) =>
      sheet.rows.filter(({ number, cells }) => number > header.row && !cells.every(isBlank)).length,
  );
  return below.reduce((sum, rows) => sum + rows, 0) > LIMITS.rows;
}

function isSure({ sheet, choices, header }: SheetReading, form: MatchingForm): boolean {
  if (form.columns) return true;
  if (sheet.hidden) return false;
  const links = choices.has('predecessors') || choices.has('successors');
  return header.row > 0 && links && WANTED.every((field) => (choices.get(field)?.confidence ?? 1) >= SURE);
}

function toMatching({ sheet, header, choices }: SheetReading): SheetMatching {
  const columns = Object.fromEntries([...choices].map(([field, { column }]) => [field, column]));
  return { sheet: sheet.name, headerRow: header.row, columns };
}
