import type { Figures } from '@/lib/contract/submission';
import { chanceBy } from '@/lib/estimates';
import type { Analysis } from '@/lib/network';
import { dateOfFinish, workingDaysThrough, type WorkCalendar } from '@/lib/schedule/calendar';
import type { ScheduleState } from '@/lib/schedule/weight';
import { proposeState } from '@/lib/services/schedule/propose';
import { computed, type Reading, type ReadState } from '@/lib/services/schedule/state';

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

/**
 * The figures as corrected and, where these cannot be computed, with the proposed fixes of the blocking
 * findings adopted as well.
 */
export async function correctedFigures(
  corrected: ReadState,
  how: Reading,
  declined: ReadonlySet<string>,
  dates: ProjectDates,
): Promise<{ corrected: Figures; proposed: Figures | null }> {
  const analysis = computed(corrected);
  if (analysis) return { corrected: figuresOf('corrected', analysis, dates), proposed: null };
  const proposed = await proposeState(corrected, how, declined);
  return {
    corrected: figuresOf('corrected', null, dates),
    proposed: figuresOf('proposed', computed(proposed), dates),
  };
}
