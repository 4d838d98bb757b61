import { chanceBy } from '@/lib/estimates';
import { dateOfFinish, type WorkCalendar } from '@/lib/schedule/calendar';

export interface Nearby {
  readonly days: number;
  readonly date: string;
  readonly before: number;
}

/** The chance at whole weeks before and after a number of working days; for reading off and copying. */
export function nearby(
  { mean, deviation, days }: { mean: number; deviation: number; days: number },
  calendar: WorkCalendar,
  start: string,
): Nearby[] {
  const week = Math.max(1, calendar.workingDays.length);
  return [-4, -3, -2, -1, 0, 1, 2, 3, 4]
    .map((weeks) => days + weeks * week)
    .filter((at) => at >= 0)
    .map((at) => ({
      days: at,
      date: dateOfFinish(calendar, start, at),
      before: chanceBy(at, mean, deviation),
    }));
}
