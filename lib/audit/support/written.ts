import type { Estimate, Unit } from '@/lib/schedule/activity';
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
const NUMBER_AND_UNIT = /^(\s*)([-+−]?\d[\d.,'’\s]*?)(\s*[\p{L}][\p{L}. ]*|\s*)$/u;
const COMMA = /\d,(?:\d{1,2}|\d{4,})(?!\d)/;
const POINT = /\d\.(?:\d{1,2}|\d{4,})(?!\d)/;

/** The decimal mark of the durations that are kept as text. */
const decimalMark = memo((list: ActivityList): '.' | ',' => {
  let [commas, points] = [0, 0];
  for (const activity of list.activities) {
    for (const { content, problem } of [activity.optimistic, activity.likely, activity.pessimistic]) {
      if (typeof content !== 'string' || problem !== null) continue;
      if (COMMA.test(content)) commas += 1;
      else if (POINT.test(content)) points += 1;
    }
  }
  return commas > points ? ',' : '.';
});

/** A number as text that cannot be taken for one with a thousands mark: 1.234 is written 1.2340. */
function numberText(value: number, mark: '.' | ','): string {
  const text = String(value);
  const plain = /^-?[1-9]\d{0,2}\.\d{3}$/.test(text) ? `${text}0` : text;
  return plain.replace('.', mark);
}

const markIn = (text: string, list: ActivityList) =>
  COMMA.test(text) ? ',' : POINT.test(text) ? '.' : decimalMark(list);

/**
 * What to write into an estimate's cell so that it says so many working days: in the unit of the cell, a
 * number where it keeps numbers, and in a text cell the text with another number in it ("5 d" → "6 d").
 */
export function written(days: number, estimate: Estimate, list: ActivityList): CellContent {
  const value = tidy(days / daysIn(estimate.unit ?? list.unit.value, list.reading));
  const { content, problem, unit } = estimate;
  if (typeof content !== 'string') return value;
  const text = numberText(value, markIn(content, list));
  const parts = NUMBER_AND_UNIT.exec(content);
  if (parts && problem !== 'unreadable') return `${parts[1] ?? ''}${text}${parts[3] ?? ''}`;
  const statesUnit = unit !== null && /\p{L}/u.test(content);
  if (statesUnit) return `${text} ${LETTER[unit]}`;
  return problem === null || problem === 'ambiguous' ? text : value;
}
