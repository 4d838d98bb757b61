import type { Figures } from '@/lib/contract/submission';
import { chanceBy } from '@/lib/estimates';
import type { Analysis } from '@/lib/network';
import { dateOfFinish, workingDaysThrough, type WorkCalendar } from '@/lib/schedule/calendar';
import type { ScheduleState } from '@/lib/schedule/weight';

/** What turns working days into dates. */
export interface ProjectDates {
  readonly start: string;
  readonly targetFinish: string | null;
  readonly calendar: WorkCalendar;
}

const NOT_COMPUTABLE = {
  computable: false,
  expectedDuration: null,
  finish: null,
  variance: null,
  standardDeviation: null,
  chanceOfTarget: null,
} as const;

/** The figures of a state; `analysis` is null where a blocking finding stands in the way. */
export function figuresOf(state: ScheduleState, analysis: Analysis | null, dates: ProjectDates): Figures {
  if (!analysis?.computable) return { state, ...NOT_COMPUTABLE };
  const { expectedDuration, variance, standardDeviation } = analysis;
  const figures = { state, computable: true, expectedDuration, variance, standardDeviation };
  return redated({ ...figures, finish: null, chanceOfTarget: null }, dates);
}

/** Kept figures under the project's present start, target and calendar: durations stay, dates are made anew. */
export function redated(figures: Figures, { start, targetFinish, calendar }: ProjectDates): Figures {
  const { expectedDuration, standardDeviation } = figures;
  if (expectedDuration === null || standardDeviation === null) return figures;
  return {
    ...figures,
    finish: dateOfFinish(calendar, start, expectedDuration),
    chanceOfTarget:
      targetFinish === null
        ? null
        : chanceBy(workingDaysThrough(calendar, start, targetFinish), expectedDuration, standardDeviation),
  };
}
