import { threePoint } from '@/lib/estimates';
import type { NetworkChange } from '@/lib/schedule/edit';
import type { Base } from './base';

/** What floats more than this cannot come to set the finish by noise. */
export const MARGIN = 1e-3;

/**
 * The most by which the changes can bring the finish forward, in working days: what they take from critical
 * activities and links. An activity that floats more than that, before and after, has no part in the finish.
 * Asked before the changes are made.
 */
export function reachOf({ working, lateStart }: Base, changes: readonly NetworkChange[]): number {
  const { earlyStart, network } = working;
  const isFree = (activity: number) => lateStart[activity]! - earlyStart[activity]! > MARGIN;
  let reach = 0;
  for (const change of changes) {
    if (change.kind === 'estimates') {
      const { activity, optimistic, likely, pessimistic } = change;
      if (activity < 0 || activity >= network.count || isFree(activity)) continue;
      reach += Math.abs(threePoint(optimistic, likely, pessimistic).mean - network.expected[activity]!);
    } else if (change.kind !== 'add-link') {
      const position = working.position(change.link);
      if (position === -1) continue;
      if (isFree(working.successorAt(position)) || working.slackAt(position) > MARGIN) continue;
      reach += change.kind === 'remove-link' ? Infinity : Math.max(0, network.lag[position]! - change.lag);
    }
  }
  return reach;
}
