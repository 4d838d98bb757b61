/** Numbers in a row between neighbours closer than this are dealt out anew. */
const CLOSEST = 1e-7;

/** Nodes in a line, any of which can be moved beside another at once; positions only compare. */
export class Line {
  readonly position: Float64Array;
  private readonly before: Int32Array;
  private readonly after: Int32Array;
  /** Stands before the first and after the last node. */
  private readonly ends: number;

  constructor(order: readonly number[]) {
    this.ends = order.length;
    this.position = new Float64Array(order.length + 1);
    this.before = new Int32Array(order.length + 1);
    this.after = new Int32Array(order.length + 1);
    let last = this.ends;
    for (const node of order) {
      this.join(last, node);
      last = node;
    }
    this.join(last, this.ends);
    this.number();
  }

  move(node: number, { beside, side }: { readonly beside: number; readonly side: 'before' | 'after' }): void {
    this.join(this.before[node]!, this.after[node]!);
    const left = side === 'after' ? beside : this.before[beside]!;
    const right = this.after[left]!;
    this.join(left, node);
    this.join(node, right);
    const low = left === this.ends ? this.position[right]! - 2 : this.position[left]!;
    const high = right === this.ends ? low + 2 : this.position[right]!;
    this.position[node] = (low + high) / 2;
    if (high - low < CLOSEST) this.number();
  }

  private join(left: number, right: number): void {
    this.after[left] = right;
    this.before[right] = left;
  }

  private number(): void {
    let k = 0;
    for (let node = this.after[this.ends]!; node !== this.ends; node = this.after[node]!) {
      this.position[node] = k++;
    }
  }
}
