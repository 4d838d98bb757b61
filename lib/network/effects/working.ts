import { threePoint } from '@/lib/estimates';
import type { NetworkChange } from '@/lib/schedule/edit';
import { TOLERANCE } from '@/lib/schedule/tolerance';
import { RELATION_CODE } from '../compile';
import { startToStart } from '../plan';
import type { Network } from '../types';

/** A link that the list does not have. */
export interface AddedLink {
  readonly from: number;
  readonly to: number;
  readonly relation: number;
  readonly lag: number;
}

/**
 * A network on which changes are tried out and taken back: durations, variances and lags of its own, links
 * removed and links added, and the early start and the largest variance of a driving chain up to each activity.
 */
export class WorkingNetwork {
  readonly duration: Float64Array;
  readonly lag: Float64Array;
  readonly removed: Uint8Array;
  readonly added: AddedLink[] = [];
  readonly earlyStart: Float64Array;
  /** The largest sum of variances on a chain without slack that ends with the activity, itself included. */
  readonly chainVariance: Float64Array;
  /** Activities whose duration or variance is not the network's own. */
  readonly altered = new Set<number>();
  private readonly variance: Float64Array;
  private readonly positionOf: Int32Array;
  private readonly successorOf: Int32Array;
  private readonly restore: (() => void)[] = [];

  constructor(readonly network: Network) {
    this.duration = network.expected.slice();
    this.variance = network.variance.slice();
    this.lag = network.lag.slice();
    this.removed = new Uint8Array(network.linkCount);
    this.earlyStart = new Float64Array(network.count);
    this.chainVariance = new Float64Array(network.count);
    this.positionOf = positionsByLink(network);
    this.successorOf = successorsByPosition(network);
  }

  /** Position of a link of the list; −1 where the network goes without it. */
  position(link: number): number {
    return this.positionOf[link] ?? -1;
  }

  /** The activity that the link at a position leads to. */
  successorAt(position: number): number {
    return this.successorOf[position]!;
  }

  apply(change: NetworkChange): void {
    switch (change.kind) {
      case 'estimates':
        return this.estimate(change);
      case 'add-link':
        return this.add(change);
      case 'remove-link':
        return this.set(this.removed, this.position(change.link), 1);
      case 'change-lag':
        return this.set(this.lag, this.position(change.link), change.lag);
    }
  }

  /** Takes all changes back; early starts and chain variances are their keeper's to restore. */
  undo(): void {
    for (let step = this.restore.pop(); step; step = this.restore.pop()) step();
    this.added.length = 0;
    this.altered.clear();
  }

  /** The start-to-start weight of the link at a position that ends in `to`, as changed. */
  weight(position: number, to: number): number {
    const { predecessor, relation } = this.network;
    const from = this.duration[predecessor[position]!]!;
    return startToStart(relation[position]!, this.lag[position]!, from, this.duration[to]!);
  }

  /** Works out an activity's early start and chain variance anew; true where either changed. */
  evaluate(activity: number): boolean {
    const { predecessorStart, predecessor } = this.network;
    const { earlyStart, chainVariance, removed, added } = this;
    const first = predecessorStart[activity]!;
    const end = predecessorStart[activity + 1]!;
    let earliest = 0;
    for (let position = first; position < end; position++) {
      if (removed[position] === 1) continue;
      const bound = earlyStart[predecessor[position]!]! + this.weight(position, activity);
      if (bound > earliest) earliest = bound;
    }
    for (const link of added) {
      if (link.to === activity) earliest = Math.max(earliest, this.boundOf(link));
    }
    let chain = 0;
    for (let position = first; position < end; position++) {
      if (removed[position] === 1) continue;
      const from = predecessor[position]!;
      const slack = earliest - (earlyStart[from]! + this.weight(position, activity));
      if (slack <= TOLERANCE && chainVariance[from]! > chain) chain = chainVariance[from]!;
    }
    for (const link of added) {
      if (link.to === activity && earliest - this.boundOf(link) <= TOLERANCE) {
        chain = Math.max(chain, chainVariance[link.from]!);
      }
    }
    const sum = this.variance[activity]! + chain;
    const changed = earlyStart[activity] !== earliest || chainVariance[activity] !== sum;
    earlyStart[activity] = earliest;
    chainVariance[activity] = sum;
    return changed;
  }

  private boundOf({ from, to, relation, lag }: AddedLink): number {
    return this.earlyStart[from]! + startToStart(relation, lag, this.duration[from]!, this.duration[to]!);
  }

  private estimate(change: Extract<NetworkChange, { kind: 'estimates' }>): void {
    if (!this.has(change.activity)) return;
    const { mean, variance } = threePoint(change.optimistic, change.likely, change.pessimistic);
    this.set(this.duration, change.activity, mean);
    this.set(this.variance, change.activity, variance);
    this.altered.add(change.activity);
  }

  private add({ from, to, type, lag }: Extract<NetworkChange, { kind: 'add-link' }>): void {
    if (this.has(from) && this.has(to)) this.added.push({ from, to, relation: RELATION_CODE[type], lag });
  }

  private has(activity: number): boolean {
    return activity >= 0 && activity < this.network.count;
  }

  private set(values: Float64Array | Uint8Array, at: number, value: number): void {
    if (at < 0) return;
    const before = values[at]!;
    values[at] = value;
    this.restore.push(() => {
      values[at] = before;
    });
  }
}

function positionsByLink({ linkIndex }: Network): Int32Array {
  const links = linkIndex.reduce((most, link) => Math.max(most, link + 1), 0);
  const positions = new Int32Array(links).fill(-1);
  linkIndex.forEach((link, position) => (positions[link] = position));
  return positions;
}

function successorsByPosition({ linkCount, successor, successorPosition }: Network): Int32Array {
  const successors = new Int32Array(linkCount);
  successorPosition.forEach((position, k) => (successors[position] = successor[k]!));
  return successors;
}
