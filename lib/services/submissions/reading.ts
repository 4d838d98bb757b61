import type { ProjectRow } from '@/db/queries/projects';
import type { ReadingOptions } from '@/lib/schedule/activity-list';

/** How a list received for the project is read: a week is the project's working week, a day its hours. */
export function readingOf({ project }: Pick<ProjectRow, 'project'>): ReadingOptions {
  const { unit, hoursPerDay, workingDays } = project;
  return { unit, hoursPerDay, daysPerWeek: workingDays.length };
}
