import type { AnalysedActivity } from '@/lib/contract/submission';

export const SHOWN = {
  all: 'all activities',
  near: 'critical and near-critical',
  critical: 'critical only',
} as const;
export type Shown = keyof typeof SHOWN;

/** How an activity stands to the finish; `near` within the chosen float. */
export type Standing = 'critical' | 'near' | 'slack';

export function standing(
  activity: Pick<AnalysedActivity, 'critical' | 'totalFloat'>,
  nearWithin: number,
): Standing {
  if (activity.critical) return 'critical';
  return activity.totalFloat <= nearWithin + 1e-9 ? 'near' : 'slack';
}

/** The activities to draw, earliest first; of two that start together the one with less float first. */
export function rowsToDraw(
  activities: readonly AnalysedActivity[],
  shown: Shown,
  nearWithin: number,
): AnalysedActivity[] {
  return activities
    .filter((activity) => {
      const where = standing(activity, nearWithin);
      return shown === 'all' || where === 'critical' || (shown === 'near' && where === 'near');
    })
    .sort((p, q) => p.earlyStart - q.earlyStart || p.totalFloat - q.totalFloat || p.row - q.row);
}

/** First and one-past-last row of those in sight, with a margin so that scrolling shows no gap. */
export function rowsInSight(scrollTop: number, height: number, rowHeight: number, count: number, margin = 8) {
  const first = Math.max(0, Math.floor(scrollTop / rowHeight) - margin);
  const end = Math.min(count, Math.ceil((scrollTop + height) / rowHeight) + margin);
  return { first, end: Math.max(first, end) };
}
