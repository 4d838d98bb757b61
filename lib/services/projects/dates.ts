import { Invalid } from '@/lib/contract/errors';

/** A target before the start could never be met. */
export function requireOrder(start: string, targetFinish: string | null | undefined): void {
  if (targetFinish && targetFinish < start) {
    throw Invalid.field('targetFinish', 'The target finish lies before the start.');
  }
}

/** In order and each once, as they are compared and shown. */
export function tidyCalendar(calendar: { workingDays: number[]; holidays: string[] }) {
  return {
    workingDays: [...new Set(calendar.workingDays)].sort((a, b) => a - b),
    holidays: [...new Set(calendar.holidays)].sort(),
  };
}
