import { TOLERANCE } from '@/lib/schedule/tolerance';
import type { Plan } from './plan';
import type { Times } from './types';

/** Early starts by rank and the project's finish (the largest early finish; 0 without activities). */
export interface ForwardPass {
  readonly earlyStart: Float64Array;
  readonly finish: number;
}

/** Earliest starts, none below 0. */
export function forwardPass({ count, start, source, weight, duration }: Plan): ForwardPass {
  const earlyStart = new Float64Array(count);
  let finish = count > 0 ? -Infinity : 0;
  let position = 0;
  for (let r = 0; r < count; r++) {
    const end = start[r + 1]!;
    let earliest = 0;
    for (; position < end; position++) {
      const bound = earlyStart[source[position]!]! + weight[position]!;
      if (bound > earliest) earliest = bound;
    }
    earlyStart[r] = earliest;
    const earlyFinish = earliest + duration[r]!;
    if (earlyFinish > finish) finish = earlyFinish;
  }
  return { earlyStart, finish };
}

/** Latest starts and free floats, by rank. */
interface BackwardPass {
  readonly lateStart: Float64Array;
  readonly freeFloat: Float64Array;
}

/** Latest starts, no finish above the project's; each rank hands its bound back to those it waits for. */
function backwardPass(plan: Plan, { earlyStart, finish }: ForwardPass): BackwardPass {
  const { count, start, source, weight, duration } = plan;
  const lateStart = new Float64Array(count);
  const freeFloat = new Float64Array(count);
  for (let r = 0; r < count; r++) {
    lateStart[r] = finish - duration[r]!;
    freeFloat[r] = finish - (earlyStart[r]! + duration[r]!);
  }
  let position = start[count]! - 1;
  for (let r = count - 1; r >= 0; r--) {
    const first = start[r]!;
    const latest = lateStart[r]!;
    const earliest = earlyStart[r]!;
    for (; position >= first; position--) {
      const from = source[position]!;
      const length = weight[position]!;
      const bound = latest - length;
      if (bound < lateStart[from]!) lateStart[from] = bound;
      // Taken this way round, a link that drives its successor has a slack of exactly 0.
      const slack = earliest - (earlyStart[from]! + length);
      if (slack < freeFloat[from]!) freeFloat[from] = slack;
    }
  }
  return { lateStart, freeFloat };
}

/** The four times and the floats of every activity, by activity, from a forward pass. */
export function times(plan: Plan, forward: ForwardPass): Times {
  const { count, order, duration } = plan;
  const backward = backwardPass(plan, forward);
  const result = {
    earlyStart: new Float64Array(count),
    earlyFinish: new Float64Array(count),
    lateStart: new Float64Array(count),
    lateFinish: new Float64Array(count),
    totalFloat: new Float64Array(count),
    freeFloat: new Float64Array(count),
    critical: new Uint8Array(count),
  };
  for (let r = 0; r < count; r++) {
    const activity = order[r]!;
    const earlyStart = forward.earlyStart[r]!;
    const lateStart = backward.lateStart[r]!;
    // Nothing can have to start before it can: what is below 0 is noise of the sums.
    const totalFloat = Math.max(0, lateStart - earlyStart);
    result.earlyStart[activity] = earlyStart;
    result.earlyFinish[activity] = earlyStart + duration[r]!;
    result.lateStart[activity] = lateStart;
    result.lateFinish[activity] = lateStart + duration[r]!;
    result.totalFloat[activity] = totalFloat;
    result.freeFloat[activity] = backward.freeFloat[r]!;
    result.critical[activity] = totalFloat <= TOLERANCE ? 1 : 0;
  }
  return result;
}
