import type { AddedLink, WorkingNetwork } from './working';

/**
 * The order of a network, mended where an added link runs against it: what follows the link's end is moved
 * behind its beginning, within the stretch between the two and nowhere else.
 *
 * Source: after Pearce and Kelly, "A Dynamic Topological Sort Algorithm for Directed Acyclic Graphs", ACM
 * Journal of Experimental Algorithmics 11 (2007).
 */
export class LocalOrder {
  private readonly moved: { readonly from: number; readonly order: Int32Array }[] = [];
  private readonly seen: Int32Array;
  private round = 0;

  constructor(
    readonly order: Int32Array,
    readonly rank: Int32Array,
  ) {
    this.seen = new Int32Array(order.length);
  }

  /** Makes room for a link; false where it closes a loop. Links added earlier are taken into account. */
  admit(link: AddedLink, working: WorkingNetwork): boolean {
    const first = this.rank[link.to]!;
    const last = this.rank[link.from]!;
    if (last < first) return true;
    if (!this.mark(link, last, working)) return false;
    const stretch = this.order.slice(first, last + 1);
    this.moved.push({ from: first, order: stretch });
    const follows = (activity: number) => this.seen[activity] === this.round;
    const mended = [...stretch.filter((i) => !follows(i)), ...stretch.filter(follows)];
    this.place(first, mended);
    return true;
  }

  /** The last rank that mending has reached; −1 where nothing is mended. */
  get mendedTo(): number {
    return this.moved.reduce((last, { from, order }) => Math.max(last, from + order.length - 1), -1);
  }

  undo(): void {
    for (let step = this.moved.pop(); step; step = this.moved.pop()) this.place(step.from, step.order);
  }

  private place(first: number, stretch: ArrayLike<number>): void {
    for (let k = 0; k < stretch.length; k++) {
      this.order[first + k] = stretch[k]!;
      this.rank[stretch[k]!] = first + k;
    }
  }

  /** Marks what follows the link's end up to a rank; false where the link's beginning is among it. */
  private mark(link: AddedLink, last: number, working: WorkingNetwork): boolean {
    this.round++;
    const stack = [link.to];
    const visit = (activity: number) => {
      if (this.seen[activity] === this.round || this.rank[activity]! > last) return;
      this.seen[activity] = this.round;
      stack.push(activity);
    };
    this.seen[link.to] = this.round;
    for (let activity = stack.pop(); activity !== undefined; activity = stack.pop()) {
      if (activity === link.from) return false;
      working.forEachLinkOutOf(activity, visit);
    }
    return true;
  }
}
