import type { EstimateProblem, Unit } from '@/lib/schedule/activity';
import type { ReadingOptions } from '@/lib/schedule/activity-list';
import { type CellValue, ErrorValue } from '@/lib/schedule/sheet';
import { asShown, formatKind, formatLiteral } from './number-format';
import { type DecimalMark, type NumberReading, readNumber, valuesOf } from './number';
import { clean } from './text';
import { numbersWithin } from './number-within';
import { daysIn, readUnit, type WrittenUnit } from './unit';

/** A cell as the reader of durations is given it. */
export interface DurationCell {
  readonly value: CellValue;
  readonly format: string;
  readonly date1904: boolean;
  /** Text of a formula the file keeps no result for; null where there is none. */
  readonly formula: string | null;
}

/** How a column's cells are to be read. */
export interface DurationContext {
  /** What separates decimals in the column's texts, where they settle it. */
  readonly mark: DecimalMark | null;
  /** Ways the header's unit can be meant; null where it states none. */
  readonly header: readonly WrittenUnit[] | null;
  /** The unit of a number that states none. */
  readonly unit: Unit;
  readonly options: ReadingOptions;
}

export interface Duration {
  /** Working days; null where the cell gives none. */
  readonly days: number | null;
  readonly text: string;
  readonly problem: EstimateProblem | null;
  readonly unit: Unit | null;
  readonly readings: readonly number[];
}

const NO_READINGS: readonly number[] = [];
const DASHES = /^[-\u2012-\u2015\u2212]+$/;
const PART =
  /^([+\-\u2212\u2013]?[\d.,'\u2019/\u2044\u00bc-\u00be\u2150-\u215e ]*[\d.\u00bc-\u00be\u2150-\u215e](?:[eE][+-]?\d{1,2}(?![\p{L}\d]))?)\s*(\p{L}[\p{L} ./-]*)?$/u;
/** Serial numbers below this are small numbers that a date format hides: before the year 1903. */
const SMALL_SERIAL = 1000;

/** Reads a duration: a number or a text, with the unit of the cell, its format, its column or its project. */
export function readDuration(cell: DurationCell, context: DurationContext): Duration {
  const { value, formula } = cell;
  if (value instanceof ErrorValue) return fail('error', value.code);
  if (typeof value === 'number') return readNumeric(value, cell, context);
  if (typeof value === 'boolean') return fail('unreadable', value ? 'TRUE' : 'FALSE');
  const text = clean(value ?? '');
  if (text === '' && formula !== null) return fail('unreadable', `=${formula}`);
  if (text === '' || DASHES.test(text)) return fail('empty', text);
  return readText(text, context);
}

/** The numbers in a text, for settling the column's decimal mark. */
export function numberIn(text: string): NumberReading | null {
  const cleaned = clean(text);
  return readNumber(PART.exec(cleaned)?.[1] ?? cleaned);
}

function readNumeric(value: number, { format, date1904 }: DurationCell, context: DurationContext): Duration {
  const text = asShown(value, format, date1904);
  const kind = formatKind(format);
  if (kind === 'elapsed' || kind === 'time') {
    const hours = value * 24;
    return done(hours * daysIn('hour', context.options), `${Number(hours.toPrecision(12))} h`, 'hour');
  }
  if (kind === 'date') return fail('unreadable', text, value < SMALL_SERIAL ? [value] : []);
  if (kind === 'percent') return fail('unreadable', text);
  return inUnits([value], unitOfFormat(format) ?? context.header, text, context);
}

const unitsOfFormats = new Map<string, readonly WrittenUnit[] | null>();

/** The unit that a number format shows beside the number. */
function unitOfFormat(code: string): readonly WrittenUnit[] | null {
  let units = unitsOfFormats.get(code);
  if (units === undefined) {
    units = readUnit(formatLiteral(code));
    if (unitsOfFormats.size > 5000) unitsOfFormats.clear();
    unitsOfFormats.set(code, units);
  }
  return units;
}

function readText(text: string, context: DurationContext): Duration {
  const [, number = '', word] = PART.exec(text) ?? [];
  const reading = readNumber(number.trim());
  const stated = word === undefined ? context.header : readUnit(word);
  if (reading && (word === undefined || stated))
    return inUnits(valuesOf(reading, context.mark), stated, text, context);
  const sum = readSum(text, context);
  if (sum !== null) return sum;
  return fail('unreadable', text, numbersWithin(text, context));
}

/** Working days of one value, or of each of several that could be meant. */
function inUnits(
  values: readonly number[],
  stated: readonly WrittenUnit[] | null,
  text: string,
  { unit, options }: DurationContext,
): Duration {
  const [only, other] = stated ?? [];
  if (values.length === 1 && values[0] !== undefined && !other) {
    const days = values[0] * (only?.times ?? 1) * daysIn(only?.unit ?? unit, options);
    return done(days, text, only?.unit ?? null);
  }
  const units = stated ?? [{ unit, times: 1 }];
  const days = units.flatMap((one) => values.map((value) => value * one.times * daysIn(one.unit, options)));
  const named = stated?.length === 1 ? (stated[0]?.unit ?? null) : null;
  if (units.length > 1) return fail('unreadable', text, days);
  return { ...fail('ambiguous', text, days), unit: named };
}

/** Several numbers, each with its unit, as in `2w 3d`. */
function readSum(text: string, { mark, options }: DurationContext): Duration | null {
  const parts = text.match(/\d[\d.,]*\s*\p{L}+\.?/gu) ?? [];
  if (parts.length < 2 || text.replace(/[\s,+]+/g, '') !== parts.join('').replace(/[\s,+]+/g, ''))
    return null;
  let days = 0;
  let first: Unit | null = null;
  for (const part of parts) {
    const [, number = '', word = ''] = /^([\d.,]+)\s*(.+)$/.exec(part) ?? [];
    const reading = readNumber(number);
    const units = readUnit(word);
    const [value, other] = reading ? valuesOf(reading, mark) : [];
    if (value === undefined || other !== undefined || units?.length !== 1 || !units[0]) return null;
    first ??= units[0].unit;
    days += value * units[0].times * daysIn(units[0].unit, options);
  }
  return done(days, text, first);
}

function done(days: number, text: string, unit: Unit | null): Duration {
  return Number.isFinite(days)
    ? { days, text, problem: null, unit, readings: NO_READINGS }
    : fail('unreadable', text);
}

function fail(problem: EstimateProblem, text: string, readings: readonly number[] = NO_READINGS): Duration {
  return {
    days: null,
    text,
    problem,
    unit: null,
    readings: readings.length > 1 ? [...new Set(readings)] : readings,
  };
}
