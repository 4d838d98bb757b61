import { TOLERANCE } from '@/lib/schedule/tolerance';
import type { ForwardPass } from '../passes';
import type { Plan } from '../plan';

/** Gates of a network at most, their least distance in ranks, and what a gate keeps. */
const GATES = 256;
const LEAST_SPACING = 16;
const KEPT = 64;

/**
 * A place in the order that every path to the finish has to pass, start behind or end before. For the
 * activities up to it: how long the longest path is that leaves them last, and its largest variance.
 */
export interface Gate {
  /** The activities that stand furthest, longest first; −1 for paths that start behind the gate. */
  readonly activity: readonly number[];
  /** Working days from time 0 to the end of the path. */
  readonly length: readonly number[];
  /** Of the longest of them. */
  readonly variance: readonly number[];
  /** No path of an activity left out is longer. */
  readonly others: number;
}

/** What the gates are made from; all by rank, of the list as it is. */
export interface GateSource {
  readonly plan: Plan;
  readonly forward: ForwardPass;
  readonly lateStart: Float64Array;
  /** The largest variance of a driving chain up to each rank, and of a longest path from each, itself included. */
  readonly chainVariance: Float64Array;
  readonly tailVariance: Float64Array;
}

/** The gates of a network, each made when it is first asked for. */
export class Gates {
  private readonly spacing: number;
  private readonly made: (Gate | undefined)[] = [];
  private readonly length: Float64Array;
  private readonly variance: Float64Array;

  constructor(private readonly source: GateSource) {
    const { count } = source.plan;
    this.spacing = Math.max(LEAST_SPACING, Math.ceil(count / GATES));
    this.length = new Float64Array(count);
    this.variance = new Float64Array(count);
  }

  /** Number of the first gate at or behind a rank. */
  from(rank: number): number {
    return Math.ceil((rank + 1) / this.spacing) - 1;
  }

  /** The last rank before a gate; Infinity where there is none so far back. */
  rank(gate: number): number {
    const rank = (gate + 1) * this.spacing - 1;
    return rank < this.source.plan.count - 1 ? rank : Infinity;
  }

  at(gate: number): Gate {
    return (this.made[gate] ??= this.make(this.rank(gate)));
  }

  private make(last: number): Gate {
    const { plan, forward, lateStart, chainVariance, tailVariance } = this.source;
    const { earlyStart, finish } = forward;
    const { length, variance } = this;
    for (let r = 0; r <= last; r++) {
      length[r] = earlyStart[r]! + plan.duration[r]!;
      variance[r] = chainVariance[r]!;
    }
    const behind = new Longest();
    let position = plan.start[last + 1]!;
    for (let r = last + 1; r < plan.count; r++) {
      const tail = finish - lateStart[r]!;
      behind.offer(tail, tailVariance[r]!);
      for (; position < plan.start[r + 1]!; position++) {
        const from = plan.source[position]!;
        if (from > last) continue;
        const whole = earlyStart[from]! + plan.weight[position]! + tail;
        if (whole < length[from]! - TOLERANCE) continue;
        const sum = chainVariance[from]! + tailVariance[r]!;
        variance[from] = whole > length[from]! + TOLERANCE ? sum : Math.max(variance[from]!, sum);
        length[from] = Math.max(length[from]!, whole);
      }
    }
    return this.select(last, behind);
  }

  private select(last: number, behind: Longest): Gate {
    const gate = { activity: [-1], length: [behind.length], variance: [behind.variance], others: -Infinity };
    // Those close to the gate tend to stand furthest: from there, few have to make room.
    for (let r = last; r >= 0; r--) {
      const length = this.length[r]!;
      if (length <= gate.others) continue;
      let k = gate.length.length;
      while (k > 0 && gate.length[k - 1]! < length) k--;
      gate.activity.splice(k, 0, this.source.plan.order[r]!);
      gate.length.splice(k, 0, length);
      gate.variance.splice(k, 0, this.variance[r]!);
      if (gate.length.length <= KEPT) continue;
      gate.others = gate.length.pop()!;
      gate.activity.pop();
      gate.variance.pop();
    }
    return gate;
  }
}

/** The longest of the paths offered and, among those as long, the largest variance. */
export class Longest {
  length = -Infinity;
  variance = 0;

  offer(length: number, variance: number): void {
    if (length < this.length - TOLERANCE) return;
    this.variance = length > this.length + TOLERANCE ? variance : Math.max(this.variance, variance);
    this.length = Math.max(this.length, length);
  }
}
