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

/** What a removed link asks for: nothing that anything could miss. */
const NOTHING = -Infinity;

/**
 * A network on which changes are tried out and taken back: weights of its own, links removed and links added,
 * and the early start and the largest variance of a driving chain up to each activity.
 */
export class WorkingNetwork {
  readonly duration: Float64Array;
  readonly added: AddedLink[] = [];
  readonly earlyStart: Float64Array;
  /** The largest sum of variances on a chain without slack that ends with the activity, itself included. */
  readonly chainVariance: Float64Array;
  /** Activities whose estimates are not the list's own. */
  readonly altered = new Set<number>();
  /** The start-to-start weight of each link, by position. */
  private readonly weight: Float64Array;
  private readonly lag: Float64Array;
  private readonly variance: Float64Array;
  private readonly positionOf: Int32Array;
  private readonly successorOf: Int32Array;
  private readonly restore: (() => void)[] = [];

  constructor(readonly network: Network) {
    const { count, linkCount } = network;
    this.duration = network.expected.slice();
    this.variance = network.variance.slice();
    this.lag = network.lag.slice();
    this.earlyStart = new Float64Array(count);
    this.chainVariance = new Float64Array(count);
    this.positionOf = positionsByLink(network);
    this.successorOf = successorsByPosition(network);
    this.weight = new Float64Array(linkCount);
    for (let position = 0; position < linkCount; position++) this.weight[position] = this.weigh(position);
  }

  /** Position of a link of the list; −1 where the network goes without it. */
  position(link: number): number {
    return this.positionOf[link] ?? -1;
  }

  /** The activity that the link at a position leads to. */
  successorAt(position: number): number {
    return this.successorOf[position]!;
  }

  isRemoved(position: number): boolean {
    return this.weight[position] === NOTHING;
  }

  /** How much later the successor starts than the link at a position asks for. */
  slackAt(position: number): number {
    const { earlyStart, weight, network } = this;
    return (
      earlyStart[this.successorAt(position)]! -
      (earlyStart[network.predecessor[position]!]! + weight[position]!)
    );
  }

  apply(change: NetworkChange): void {
    switch (change.kind) {
      case 'estimates':
        return this.estimate(change);
      case 'add-link':
        return this.add(change);
      case 'remove-link':
        return this.set(this.weight, this.position(change.link), NOTHING);
      case 'change-lag':
        this.set(this.lag, this.position(change.link), change.lag);
        return this.reweigh(this.position(change.link));
    }
  }

  /** Takes all changes back; early starts and chain variances are their keeper's to restore. */
  undo(): void {
    for (let step = this.restore.pop(); step; step = this.restore.pop()) step();
    this.added.length = 0;
    this.altered.clear();
  }

  /** Works out an activity's early start and chain variance anew; true where either changed. */
  evaluate(activity: number): boolean {
    const { predecessorStart, predecessor } = this.network;
    const { earlyStart, chainVariance, weight, added } = this;
    const first = predecessorStart[activity]!;
    const end = predecessorStart[activity + 1]!;
    let earliest = 0;
    for (let position = first; position < end; position++) {
      const bound = earlyStart[predecessor[position]!]! + weight[position]!;
      if (bound > earliest) earliest = bound;
    }
    for (const link of added) {
      if (link.to === activity) earliest = Math.max(earliest, this.boundOf(link));
    }
    let chain = 0;
    for (let position = first; position < end; position++) {
      const from = predecessor[position]!;
      const slack = earliest - (earlyStart[from]! + weight[position]!);
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

  /** Calls back with each link out of an activity that is not removed: where it leads, and its weight. */
  forEachLinkOutOf(activity: number, visit: (to: number, weight: number) => void): void {
    const { successorStart, successor, successorPosition } = this.network;
    for (let k = successorStart[activity]!; k < successorStart[activity + 1]!; k++) {
      // A removed link may run against the mended order.
      const weight = this.weight[successorPosition[k]!]!;
      if (weight !== NOTHING) visit(successor[k]!, weight);
    }
    for (const link of this.added) if (link.from === activity) visit(link.to, this.weightOf(link));
  }

  private weigh(position: number): number {
    const { predecessor, relation } = this.network;
    const from = this.duration[predecessor[position]!]!;
    const to = this.duration[this.successorOf[position]!]!;
    return startToStart(relation[position]!, this.lag[position]!, from, to);
  }

  private reweigh(position: number): void {
    if (position !== -1 && !this.isRemoved(position)) this.set(this.weight, position, this.weigh(position));
  }

  private boundOf(link: AddedLink): number {
    return this.earlyStart[link.from]! + this.weightOf(link);
  }

  private weightOf({ from, to, relation, lag }: AddedLink): number {
    return startToStart(relation, lag, this.duration[from]!, this.duration[to]!);
  }

  private estimate(change: Extract<NetworkChange, { kind: 'estimates' }>): void {
    const { activity } = change;
    if (!this.has(activity)) return;
    const { mean, variance } = threePoint(change.optimistic, change.likely, change.pessimistic);
    this.set(this.duration, activity, mean);
    this.set(this.variance, activity, variance);
    this.altered.add(activity);
    const { predecessorStart, successorStart, successorPosition } = this.network;
    for (let k = predecessorStart[activity]!; k < predecessorStart[activity + 1]!; k++) this.reweigh(k);
    for (let k = successorStart[activity]!; k < successorStart[activity + 1]!; k++) {
      this.reweigh(successorPosition[k]!);
    }
  }

  private add({ from, to, type, lag }: Extract<NetworkChange, { kind: 'add-link' }>): void {
    if (this.has(from) && this.has(to)) this.added.push({ from, to, relation: RELATION_CODE[type], lag });
  }

  private has(activity: number): boolean {
    return activity >= 0 && activity < this.network.count;
  }

  private set(values: Float64Array, at: number, value: number): void {
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
