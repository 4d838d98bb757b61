import { threePoint } from '@/lib/estimates';
import type { NetworkChange } from '@/lib/schedule/edit';
import { TOLERANCE } from '@/lib/schedule/tolerance';
import { forwardPass, times } from '../passes';
import { plan } from '../plan';
import type { Network } from '../types';
import { LocalOrder } from './local-order';
import { Moved } from './moved';
import { RankQueue } from './rank-queue';
import { WorkingNetwork } from './working';

/** What changes do to the figures: new less old. */
export interface Effect {
  /** Working days. */
  readonly expectedDuration: number;
  /** Working days². */
  readonly variance: number;
}

export interface FinishEffects {
  /** The effect of these changes together; null where they, or the list itself, make a loop. */
  effect(changes: readonly NetworkChange[]): Effect | null;
}

/**
 * Prepares the finish effect of any number of fixes of one list. Each effect follows only what its changes move,
 * and only as far as it can reach the finish: an effect is the same as that of computing the list afresh, at a
 * small part of its cost. Changes that name what the network does not have (an unknown predecessor's link, say)
 * do nothing.
 */
export function prepareEffects(network: Network): FinishEffects {
  const base = prepareBase(network);
  return { effect: (changes) => base && effectOf(base, changes) };
}

interface Base {
  readonly working: WorkingNetwork;
  readonly order: LocalOrder;
  readonly queue: RankQueue;
  readonly moved: Moved;
  readonly lateStart: Float64Array;
  /** Activities from the latest early finish to the earliest. */
  readonly byFinish: Int32Array;
  readonly finish: number;
  readonly variance: number;
}

function prepareBase(network: Network): Base | null {
  const ordered = plan(network);
  if (!ordered) return null;
  const { lateStart, earlyFinish } = times(ordered, forwardPass(ordered));
  const working = new WorkingNetwork(network);
  for (const activity of ordered.order) working.evaluate(activity);
  const byFinish = ordered.order.slice().sort((a, b) => earlyFinish[b]! - earlyFinish[a]!);
  const order = new LocalOrder(ordered.order, ordered.rank);
  const moved = new Moved(working);
  const figures = figuresOf(working, byFinish, moved);
  return { working, order, queue: new RankQueue(network.count), moved, lateStart, byFinish, ...figures };
}

function effectOf(base: Base, changes: readonly NetworkChange[]): Effect | null {
  const { working, order, moved } = base;
  const reach = reachOf(base, changes);
  for (const change of changes) working.apply(change);
  try {
    if (!working.added.every((link) => order.admit(link, working))) return null;
    propagate(base, changes, reach);
    const { finish, variance } = figuresOf(working, base.byFinish, moved);
    return {
      expectedDuration: withoutNoise(finish - base.finish),
      variance: withoutNoise(variance - base.variance),
    };
  } finally {
    moved.undo();
    working.undo();
    order.undo();
  }
}

/** A difference of two sums that is all noise is none. */
const withoutNoise = (value: number) => (Math.abs(value) < 1e-9 ? 0 : value);

/** What floats more than this cannot come to set the finish by noise. */
const MARGIN = 1e-3;

/**
 * The most by which the changes can bring the finish forward: what they take from critical activities and
 * links. An activity that floats more than that, before and after, has no part in the finish.
 */
function reachOf({ working, lateStart }: Base, changes: readonly NetworkChange[]): number {
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

/** Works out anew what the changes touch and what follows from it, in order. */
function propagate(base: Base, changes: readonly NetworkChange[], reach: number): void {
  const { working, order, queue, moved, lateStart } = base;
  const { successorStart, successor, successorPosition, predecessor } = working.network;
  const { earlyStart, chainVariance, altered, added } = working;
  const { rank } = order;
  // Behind the last change nothing has another way to the finish than it had.
  let lastChange = -1;
  const touch = (from: number, to: number) => {
    queue.add(rank[to]!);
    lastChange = Math.max(lastChange, rank[from]!);
  };
  for (const activity of altered) touch(activity, activity);
  for (const { from, to } of added) touch(from, to);
  for (const change of changes) {
    if (change.kind !== 'remove-link' && change.kind !== 'change-lag') continue;
    const position = working.position(change.link);
    if (position !== -1) touch(predecessor[position]!, working.successorAt(position));
  }
  for (let r = queue.take(); r !== -1; r = queue.take()) {
    const activity = order.order[r]!;
    const startBefore = earlyStart[activity]!;
    const varianceBefore = chainVariance[activity]!;
    if (!working.evaluate(activity) && !altered.has(activity)) continue;
    moved.add(activity, startBefore, varianceBefore);
    const latest = Math.max(startBefore, earlyStart[activity]!);
    if (r > lastChange && lateStart[activity]! - latest > reach + MARGIN) continue;
    for (let k = successorStart[activity]!; k < successorStart[activity + 1]!; k++) {
      // A removed link may run against the mended order.
      if (!working.isRemoved(successorPosition[k]!)) queue.add(rank[successor[k]!]!);
    }
    for (const link of added) if (link.from === activity) queue.add(rank[link.to]!);
  }
}

/** The finish and the largest variance of a chain that sets it. */
function figuresOf(working: WorkingNetwork, byFinish: Int32Array, moved: Moved) {
  const { earlyStart, duration, chainVariance } = working;
  const earlyFinish = (activity: number) => earlyStart[activity]! + duration[activity]!;
  let finish = byFinish.length > 0 ? -Infinity : 0;
  for (const activity of moved.activities) finish = Math.max(finish, earlyFinish(activity));
  const still = byFinish.find((activity) => !moved.has(activity));
  if (still !== undefined) finish = Math.max(finish, earlyFinish(still));
  let variance = 0;
  const count = (activity: number) => {
    const sets = earlyFinish(activity) >= finish - TOLERANCE;
    if (sets) variance = Math.max(variance, chainVariance[activity]!);
    return sets;
  };
  for (const activity of moved.activities) count(activity);
  for (const activity of byFinish) if (!moved.has(activity) && !count(activity)) break;
  return { finish, variance };
}
