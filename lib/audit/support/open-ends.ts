import type { Activity } from '@/lib/schedule/activity';
import type { AuditContext } from '../rule';
import { canBeNamed } from './about';
import { takesNoTime } from './estimate-cells';
import { detachedGroups } from './groups';
import { intended } from './intended';
import { memo } from './memo';

export interface OpenEnds {
  /** The activity that rightly waits for none; null where there is at most one that does. */
  readonly start: Activity | null;
  /** The others that wait for none. */
  readonly starts: readonly Activity[];
  /** The activity for which rightly none waits. */
  readonly finish: Activity | null;
  readonly finishes: readonly Activity[];
}

interface Open {
  readonly activity: Activity;
  /** Nothing before and nothing after it. */
  readonly alone: boolean;
  /** In a group that has no link to the rest. */
  readonly detached: boolean;
}

/**
 * A milestone (it takes no time), else the first or the last; in a group without a link to the rest only where
 * there is no other. A milestone without any link could be either: in the upper half of the list it counts as a
 * start, in the lower half as a finish.
 */
function pick(open: readonly Open[], rows: number, end: 'start' | 'finish', not: Activity | null) {
  const inHalf = ({ index }: Activity) => (end === 'start' ? index < rows / 2 : index >= rows / 2);
  const others = open.filter(({ activity }) => activity !== not);
  const attached = others.filter(({ detached }) => !detached);
  const candidates = (attached.length > 0 ? attached : others.length > 0 ? others : open).toSorted(
    (one, other) =>
      end === 'start' ? one.activity.index - other.activity.index : other.activity.index - one.activity.index,
  );
  const milestone = candidates.find(
    ({ activity, alone }) => takesNoTime(activity) && (!alone || inHalf(activity)),
  );
  return (milestone ?? candidates[0])?.activity ?? null;
}

/**
 * The activities at which the network begins and ends. Links that are meant but wrongly written count, and
 * rows that no link can name (no ID, or one that an earlier row bears) are left out: other rules have those.
 */
export const openEnds = memo((context: AuditContext): OpenEnds => {
  const { list, linksInto, linksOutOf } = context;
  const { links, waiting, followed } = intended(context);
  const isLink = (index: number) => list.links[index]?.fromIndex !== list.links[index]?.toIndex;
  const [hasBefore, hasAfter] = [new Set(waiting), new Set(followed)];
  for (const [from, to] of links) {
    hasAfter.add(from);
    hasBefore.add(to);
  }
  list.activities.forEach((_, index) => {
    if (linksInto[index]?.some(isLink)) hasBefore.add(index);
    if (linksOutOf[index]?.some(isLink)) hasAfter.add(index);
  });
  const nameable = list.activities.filter((activity) => canBeNamed(list, activity));
  const inDetached = new Set(detachedGroups(context).flat());
  const toOpen = (activity: Activity): Open => ({
    activity,
    detached: inDetached.has(activity.index),
    alone: !hasBefore.has(activity.index) && !hasAfter.has(activity.index),
  });
  const starts = nameable.filter(({ index }) => !hasBefore.has(index)).map(toOpen);
  const finishes = nameable.filter(({ index }) => !hasAfter.has(index)).map(toOpen);
  const rows = list.activities.length;
  const start = pick(starts, rows, 'start', null);
  const finish = pick(finishes, rows, 'finish', start);
  const without = (open: readonly Open[], end: Activity | null) =>
    open.map(({ activity }) => activity).filter((activity) => activity !== end);
  return { start, starts: without(starts, start), finish, finishes: without(finishes, finish) };
});
