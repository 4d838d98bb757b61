import type { Activity, Estimate, Unit } from '@/lib/schedule/activity';
import type { ActivityList, ReadingOptions } from '@/lib/schedule/activity-list';
import type { CellContent } from '@/lib/schedule/sheet';
import { memo } from './memo';

/** Working days in one of a unit. */
export function daysIn(unit: Unit, reading: ReadingOptions): number {
  if (unit === 'hour') return 1 / reading.hoursPerDay;
  return unit === 'week' ? reading.daysPerWeek : 1;
}

/** Clears what a division leaves behind the twelfth figure: 0.30000000000000004 → 0.3. */
const tidy = (value: number) => Number(value.toPrecision(12));

const LETTER: Record<Unit, string> = { day: 'd', hour: 'h', week: 'w' };

/** A number with what stands around it: blanks before, a unit after. */
const NUMBER_AND_UNIT = /^(\s*)([-+−]?\d[\d.,'’\s]*?)(\s*\p{L}[\p{L}. ]*|\s*)$/u;
const COMMA = /\d,(?:\d{1,2}|\d{4,})(?!\d)/;
const POINT = /\d\.(?:\d{1,2}|\d{4,})(?!\d)/;

const partsOf = (activity: Activity) => [activity.likely, activity.optimistic, activity.pessimistic];

/** The decimal mark of the durations that are kept as text. */
const decimalMark = memo((list: ActivityList): '.' | ',' => {
  let [commas, points] = [0, 0];
  for (const { content, problem } of list.activities.flatMap(partsOf)) {
    if (typeof content !== 'string' || problem !== null) continue;
    if (COMMA.test(content)) commas += 1;
    else if (POINT.test(content)) points += 1;
  }
  return commas > points ? ',' : '.';
});

const markIn = (text: string, list: ActivityList) =>
  COMMA.test(text) ? ',' : POINT.test(text) ? '.' : decimalMark(list);

/** A number as text that cannot be taken for one with a thousands mark: 1.234 is written 1.2340. */
function numberText(value: number, mark: '.' | ','): string {
  const text = String(value);
  const plain = /^-?[1-9]\d{0,2}\.\d{3}$/.test(text) ? `${text}0` : text;
  return plain.replace('.', mark);
}

function numberIn(text: string, mark: '.' | ','): number {
  const digits = text.replace(/[\s'’]/g, '').replace('−', '-');
  return Number(digits.replaceAll(mark === ',' ? '.' : ',', '').replace(mark, '.'));
}

/**
 * The number that stands for one working day in a cell that was read: what it holds over what it was read
 * as, since its unit may be one of which no estimate speaks (minutes, a clock's share of a day).
 */
function perDay({ days, content, problem }: Estimate, list: ActivityList): number | null {
  if (problem !== null || days === null || days === 0) return null;
  const text = typeof content === 'string' ? NUMBER_AND_UNIT.exec(content)?.[2] : undefined;
  const held = text === undefined ? content : numberIn(text, markIn(text, list));
  return typeof held === 'number' && held !== 0 && Number.isFinite(held) ? held / days : null;
}

/** By the cell itself, else by a number beside it in the same unit, else by the unit. */
function scaleOf(estimate: Estimate, beside: Activity, list: ActivityList): number {
  const own = perDay(estimate, list);
  if (own !== null) return own;
  for (const other of partsOf(beside)) {
    const alike = typeof other.content === 'number' && other.unit === estimate.unit;
    const scale = alike && typeof estimate.content !== 'string' ? perDay(other, list) : null;
    if (scale !== null) return scale;
  }
  return 1 / daysIn(estimate.unit ?? list.unit.value, list.reading);
}

/**
 * What to write into an estimate's cell so that it says so many working days: in the unit of the cell, a
 * number where it keeps numbers, and in a text cell the text with another number in it ("5 d" → "6 d").
 */
export function written(
  days: number,
  estimate: Estimate,
  activity: Activity,
  list: ActivityList,
): CellContent {
  const { content, problem, unit } = estimate;
  const value = tidy(days * scaleOf(estimate, activity, list));
  if (typeof content === 'number' && problem === 'unreadable') {
    // A number that its format makes a date: only as text can it say a duration.
    return `${numberText(value, decimalMark(list))} ${LETTER[unit ?? list.unit.value]}`;
  }
  if (typeof content !== 'string') return value;
  const text = numberText(value, markIn(content, list));
  const parts = NUMBER_AND_UNIT.exec(content);
  if (parts && problem !== 'unreadable') return `${parts[1] ?? ''}${text}${parts[3] ?? ''}`;
  if (unit !== null && /\p{L}/u.test(content)) return `${text} ${LETTER[unit]}`;
  return problem === 'unreadable' ? value : text;
}
