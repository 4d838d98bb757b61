import type { AnalysedActivity, AnalysisView } from '@/lib/contract/submission';
import { usedEstimates, type Analysis } from '@/lib/network';
import { threePoint } from '@/lib/estimates';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { dateOfFinish, datesOf } from '@/lib/schedule/calendar';
import type { ScheduleState } from '@/lib/schedule/weight';
import { listedActivities } from '@/lib/services/activities/view';
import type { ProjectDates } from '@/lib/services/submissions/figures';

type Computed = Extract<Analysis, { computable: true }>;

/** The analysis by IDs and dates; nothing is rounded. */
export function analysisView(
  state: ScheduleState,
  list: ActivityList,
  analysis: Computed,
  { start, calendar }: ProjectDates,
): AnalysisView {
  const idOf = (index: number): string => list.activities[index]?.id ?? '';
  return {
    computable: true,
    state,
    unit: 'working day',
    calendar: { workingDays: [...calendar.workingDays], holidays: [...calendar.holidays] },
    start: datesOf(calendar, start, 0, 1).start,
    finish: dateOfFinish(calendar, start, analysis.expectedDuration),
    expectedDuration: analysis.expectedDuration,
    variance: analysis.variance,
    standardDeviation: analysis.standardDeviation,
    criticalPaths: analysis.criticalPaths.map((path) => path.map(idOf)),
    // JSON has no infinity.
    criticalPathCount: Math.min(analysis.criticalPathCount, Number.MAX_VALUE),
    activities: activitiesOf(list, analysis, { start, calendar }),
  };
}

function activitiesOf(
  list: ActivityList,
  { times }: Computed,
  { start, calendar }: Pick<ProjectDates, 'start' | 'calendar'>,
): AnalysedActivity[] {
  return listedActivities(list).map(({ id, name, row, data }, index) => {
    const activity = list.activities[index];
    const used = activity ? usedEstimates(activity) : { optimistic: 0, likely: 0, pessimistic: 0 };
    const { mean, variance } = threePoint(used.optimistic, used.likely, used.pessimistic);
    const at = (values: ArrayLike<number>): number => values[index] ?? 0;
    const dates = datesOf(calendar, start, at(times.earlyStart), at(times.earlyFinish));
    return {
      id,
      name,
      row,
      optimistic: used.optimistic,
      likely: used.likely,
      pessimistic: used.pessimistic,
      expected: mean,
      variance,
      earlyStart: at(times.earlyStart),
      earlyFinish: at(times.earlyFinish),
      lateStart: at(times.lateStart),
      lateFinish: at(times.lateFinish),
      totalFloat: at(times.totalFloat),
      freeFloat: at(times.freeFloat),
      critical: at(times.critical) === 1,
      startDate: dates.start,
      finishDate: dates.finish,
      predecessors: [...data.predecessors],
    };
  });
}
