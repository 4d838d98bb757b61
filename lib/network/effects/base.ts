import { TOLERANCE } from '@/lib/schedule/tolerance';
import { forwardPass, times } from '../passes';
import { plan, type Plan } from '../plan';
import type { Network } from '../types';
import { Gates } from './gates';
import { LocalOrder } from './local-order';
import { Moved } from './moved';
import { RankQueue } from './rank-queue';
import { WorkingNetwork } from './working';

/** What all effects of a list have in common. */
export interface Base {
  readonly working: WorkingNetwork;
  readonly order: LocalOrder;
  readonly queue: RankQueue;
  readonly moved: Moved;
  readonly gates: Gates;
  /** By activity, of the list as it is. */
  readonly lateStart: Float64Array;
  /** The largest variance of a longest path from each activity to the finish, itself included; by activity. */
  readonly tailVariance: Float64Array;
  /** Activities from the latest early finish to the earliest; of one finish, from the largest variance down. */
  readonly byFinish: Int32Array;
  /** By position in `byFinish`: where the next earlier finish begins. */
  readonly nextFinish: Int32Array;
  /** The project's finish. */
  readonly finish: number;
}

/** Prepares a network for effects; null where it has a loop. */
export function prepareBase(network: Network): Base | null {
  const ordered = plan(network);
  if (!ordered) return null;
  const { count, order } = ordered;
  const forward = forwardPass(ordered);
  const { lateStart, earlyFinish } = times(ordered, forward);
  const working = new WorkingNetwork(network);
  for (const activity of order) working.evaluate(activity);
  const byRank = (values: Float64Array) => Float64Array.from(order, (activity) => values[activity]!);
  const late = byRank(lateStart);
  const tails = tailVariances(ordered, late, byRank(network.variance));
  const { chainVariance } = working;
  const byFinish = order
    .slice()
    .sort((a, b) => earlyFinish[b]! - earlyFinish[a]! || chainVariance[b]! - chainVariance[a]!);
  const tailVariance = new Float64Array(count);
  order.forEach((activity, r) => (tailVariance[activity] = tails[r]!));
  return {
    working,
    order: new LocalOrder(order.slice(), ordered.rank),
    queue: new RankQueue(count),
    moved: new Moved(working),
    gates: new Gates({
      plan: ordered,
      forward,
      lateStart: late,
      chainVariance: byRank(working.chainVariance),
      tailVariance: tails,
    }),
    lateStart,
    tailVariance,
    byFinish,
    nextFinish: nextDifferent(byFinish, earlyFinish),
    finish: forward.finish,
  };
}

/** By position: the first position behind it whose activity has another value. */
function nextDifferent(activities: Int32Array, value: Float64Array): Int32Array {
  const next = new Int32Array(activities.length);
  for (let at = activities.length - 1; at >= 0; at--) {
    const isSame = at + 1 < next.length && value[activities[at + 1]!] === value[activities[at]!];
    next[at] = isSame ? next[at + 1]! : at + 1;
  }
  return next;
}

/** By rank: the variance of the activity and the largest of what can follow it on a longest path to the finish. */
function tailVariances(
  { count, start, source, weight }: Plan,
  lateStart: Float64Array,
  variance: Float64Array,
): Float64Array {
  const tails = new Float64Array(count);
  for (let r = count - 1; r >= 0; r--) {
    tails[r] = variance[r]! + tails[r]!;
    for (let position = start[r]!; position < start[r + 1]!; position++) {
      const from = source[position]!;
      // Only a link that sets its predecessor's late start lies on a longest path from there.
      if (lateStart[r]! - weight[position]! - lateStart[from]! > TOLERANCE) continue;
      if (tails[r]! > tails[from]!) tails[from] = tails[r]!;
    }
  }
  return tails;
}
