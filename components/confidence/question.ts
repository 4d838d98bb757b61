import type { ChanceQuestion } from '@/lib/client/submissions';

export const WAYS = {
  date: 'by a date',
  days: 'within working days',
  confidence: 'for a confidence',
} as const;
export type Way = keyof typeof WAYS;

export interface Asked {
  readonly way: Way;
  /** As typed: a date, a number of days, a per cent. */
  readonly value: string;
}

/** The question typed, or the sentence that says why it is none yet. */
export function readQuestion({ way, value }: Asked): ChanceQuestion | string {
  const text = value
    .trim()
    .replace(',', '.')
    .replace(/\s*(%|d)$/, '');
  if (text === '') return 'Fill this in, and the answer stands beside it.';
  if (way === 'date') {
    return isCalendarDate(text) ? { date: text } : 'This is no date of the calendar.';
  }
  const number = Number(text);
  if (!Number.isFinite(number)) return `“${value}” is no number.`;
  if (way === 'days')
    return number >= 0 && number <= 1e6 ? { days: number } : 'Give a number of working days from 0 on.';
  return number > 0 && number < 100
    ? { confidence: number / 100 }
    : 'A confidence lies between 0 and 100 %, neither of them included: no date is certain.';
}

function isCalendarDate(text: string): boolean {
  const date = new Date(`${text}T00:00:00Z`);
  return !Number.isNaN(date.getTime()) && date.toISOString().startsWith(text) && text.length === 10;
}

/** What is asked where the address says nothing: the target where there is one, else the date for 80 %. */
export function firstQuestion(targetFinish: string | null): Asked {
  return targetFinish ? { way: 'date', value: targetFinish } : { way: 'confidence', value: '80' };
}
