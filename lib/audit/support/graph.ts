import type { Network } from '@/lib/network';
import { memo } from './memo';

/** How many steps all searches of an audit may take together; beyond, a link is taken to close a loop. */
const STEPS = 2_000_000;

interface Reach {
  /** Position in an order in which links lead upwards; activities in or after a loop come last, alike. */
  readonly rank: Int32Array;
  readonly seen: Int32Array;
  search: number;
  steps: number;
}

/** Kahn's order, as far as it goes. */
function ranks({ count, predecessorStart, successorStart, successor }: Network): Int32Array {
  const waiting = new Int32Array(count);
  const rank = new Int32Array(count).fill(count);
  const queue = new Int32Array(count);
  let end = 0;
  for (let i = 0; i < count; i++) {
    waiting[i] = (predecessorStart[i + 1] ?? 0) - (predecessorStart[i] ?? 0);
    if (waiting[i] === 0) queue[end++] = i;
  }
  for (let at = 0; at < end; at++) {
    const activity = queue[at] ?? 0;
    rank[activity] = at;
    for (let k = successorStart[activity] ?? 0; k < (successorStart[activity + 1] ?? 0); k++) {
      const next = successor[k] ?? 0;
      waiting[next] = (waiting[next] ?? 0) - 1;
      if (waiting[next] === 0) queue[end++] = next;
    }
  }
  return rank;
}

const reachOf = memo((network: Network): Reach => {
  return { rank: ranks(network), seen: new Int32Array(network.count), search: 0, steps: STEPS };
});

/** Whether links lead from one activity to another. */
function leadsTo(network: Network, from: number, to: number): boolean {
  const reach = reachOf(network);
  const { rank, seen } = reach;
  const limit = rank[to] ?? 0;
  if (from !== to && limit < network.count && limit <= (rank[from] ?? 0)) return false;
  const search = ++reach.search;
  const stack = [from];
  for (let activity = stack.pop(); activity !== undefined; activity = stack.pop()) {
    if (activity === to || --reach.steps < 0) return true;
    for (
      let k = network.successorStart[activity] ?? 0;
      k < (network.successorStart[activity + 1] ?? 0);
      k++
    ) {
      const next = network.successor[k] ?? 0;
      if (seen[next] === search || (rank[next] ?? 0) > limit) continue;
      seen[next] = search;
      stack.push(next);
    }
  }
  return false;
}

/** Whether a link from one activity to another would close a loop (or might: the search is bounded). */
export const wouldLoop = (network: Network, from: number, to: number) => leadsTo(network, to, from);
