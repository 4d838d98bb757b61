import type { NetworkChange } from '@/lib/schedule/edit';
import type { Network } from '../types';
import { type Base, prepareBase } from './base';
import { figuresOf, propagate } from './propagate';
import { reachOf } from './reach';

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
  const before = base && figuresOf(base);
  return { effect: (changes) => base && before && effectOf(base, before, changes) };
}

function effectOf(
  base: Base,
  before: { readonly finish: number; readonly variance: number },
  changes: readonly NetworkChange[],
): Effect | null {
  const { working, order, moved } = base;
  const reach = reachOf(base, changes);
  for (const change of changes) working.apply(change);
  try {
    if (!working.added.every((link) => order.admit(link, working))) return null;
    const { finish, variance } = propagate(base, changes, reach);
    return {
      expectedDuration: withoutNoise(finish - before.finish),
      variance: withoutNoise(variance - before.variance),
    };
  } finally {
    moved.undo();
    working.undo();
    order.undo();
  }
}

/** A difference of two sums that is all noise is none. */
const withoutNoise = (value: number) => (Math.abs(value) < 1e-9 ? 0 : value);
