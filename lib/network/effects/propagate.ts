import type { NetworkChange } from '@/lib/schedule/edit';
import { TOLERANCE } from '@/lib/schedule/tolerance';
import type { Base } from './base';
import { type Gate, Longest } from './gates';
import { MARGIN } from './reach';

export interface Figures {
  readonly finish: number;
  readonly variance: number;
}

/** Where changes bite: activities whose own times or links out they change, and the last of their ranks. */
interface Bite {
  readonly activities: Set<number>;
  readonly last: number;
}

/** Activities followed before a gate is looked for: most effects end sooner, and a gate has to be made. */
const PATIENCE = 32;

/**
 * Works out anew what the changes touch and what follows from it, in order, and gives the figures. It stops at
 * the first gate behind the changes: from there on every path is as long as it was.
 */
export function propagate(base: Base, changes: readonly NetworkChange[], reach: number): Figures {
  const { working, order, queue, moved, gates, lateStart } = base;
  const { earlyStart, chainVariance, altered } = working;
  const bite = biteOf(base, changes);
  const behind = Math.max(bite.last, order.mendedTo);
  let gate: number | null = null;
  let wait = PATIENCE;
  for (let r = queue.take(), steps = 0; r !== -1; r = queue.take(), steps++) {
    if (gate !== null && r > gates.rank(gate)) {
      const figures = figuresAt(base, bite.activities, gates.at(gate), gates.rank(gate));
      if (figures) {
        queue.clear();
        return figures;
      }
      gate = null;
      wait *= 2;
    }
    if (gate === null && steps >= wait) gate = gates.from(Math.max(behind, r));
    const activity = order.order[r]!;
    const startBefore = earlyStart[activity]!;
    const varianceBefore = chainVariance[activity]!;
    if (!working.evaluate(activity) && !altered.has(activity)) continue;
    moved.add(activity, startBefore, varianceBefore);
    const latest = Math.max(startBefore, earlyStart[activity]!);
    // Behind the last change nothing has another way to the finish than it had.
    if (r > bite.last && lateStart[activity]! - latest > reach + MARGIN) continue;
    working.forEachLinkOutOf(activity, (to) => queue.add(order.rank[to]!));
  }
  return figuresOf(base);
}

/** Finds where the changes bite, and puts what they touch at first into the queue. */
function biteOf({ working, order, queue }: Base, changes: readonly NetworkChange[]): Bite {
  const activities = new Set<number>();
  let last = -1;
  const touch = (from: number, to: number) => {
    queue.add(order.rank[to]!);
    activities.add(from);
    last = Math.max(last, order.rank[from]!);
  };
  for (const activity of working.altered) touch(activity, activity);
  for (const { from, to } of working.added) touch(from, to);
  for (const change of changes) {
    if (change.kind !== 'remove-link' && change.kind !== 'change-lag') continue;
    const position = working.position(change.link);
    if (position === -1) continue;
    touch(working.network.predecessor[position]!, working.successorAt(position));
  }
  return { activities, last };
}

/** The figures by the paths through a gate; null where the gate does not keep enough of them to tell. */
function figuresAt(base: Base, bitten: ReadonlySet<number>, gate: Gate, last: number): Figures | null {
  const { working, order, moved, lateStart, tailVariance, finish } = base;
  const { earlyStart, chainVariance, duration } = working;
  const longest = new Longest();
  const offer = (activity: number) => {
    const chain = chainVariance[activity]!;
    longest.offer(earlyStart[activity]! + duration[activity]!, chain);
    working.forEachLinkOutOf(activity, (to, weight) => {
      if (order.rank[to]! <= last) return;
      longest.offer(earlyStart[activity]! + weight + finish - lateStart[to]!, chain + tailVariance[to]!);
    });
  };
  for (const activity of moved.activities) offer(activity);
  for (const activity of bitten) if (!moved.has(activity)) offer(activity);
  for (let k = 0; k < gate.activity.length && gate.length[k]! >= longest.length - TOLERANCE; k++) {
    const activity = gate.activity[k]!;
    if (activity !== -1 && (moved.has(activity) || bitten.has(activity))) continue;
    longest.offer(gate.length[k]!, gate.variance[k]!);
  }
  if (gate.others >= longest.length - TOLERANCE) return null;
  return { finish: longest.length, variance: longest.variance };
}

/** The finish and the largest variance of a chain that sets it, as things stand. */
export function figuresOf({ working, byFinish, nextFinish, moved }: Base): Figures {
  const { earlyStart, duration, chainVariance } = working;
  const longest = new Longest();
  const offer = (activity: number) =>
    longest.offer(earlyStart[activity]! + duration[activity]!, chainVariance[activity]!);
  for (const activity of moved.activities) offer(activity);
  for (let at = 0; at < byFinish.length;) {
    const activity = byFinish[at]!;
    if (moved.has(activity)) {
      at += 1;
      continue;
    }
    if (earlyStart[activity]! + duration[activity]! < longest.length - TOLERANCE) break;
    offer(activity);
    // Of those that finish at once and did not move, the first has the largest variance.
    at = nextFinish[at]!;
  }
  return { finish: byFinish.length > 0 ? longest.length : 0, variance: longest.variance };
}
