import type { WorkingNetwork } from './working';

/** The activities that changes have moved, with what they were before; its arrays serve every effect in turn. */
export class Moved {
  /** In the order in which they moved. */
  readonly activities: number[] = [];
  private readonly earlyStart: Float64Array;
  private readonly chainVariance: Float64Array;
  private readonly flag: Uint8Array;

  constructor(private readonly working: WorkingNetwork) {
    const { count } = working.network;
    this.earlyStart = new Float64Array(count);
    this.chainVariance = new Float64Array(count);
    this.flag = new Uint8Array(count);
  }

  has(activity: number): boolean {
    return this.flag[activity] === 1;
  }

  add(activity: number, earlyStart: number, chainVariance: number): void {
    this.flag[activity] = 1;
    this.activities.push(activity);
    this.earlyStart[activity] = earlyStart;
    this.chainVariance[activity] = chainVariance;
  }

  /** Puts everything back to where it was. */
  undo(): void {
    for (const activity of this.activities) {
      this.flag[activity] = 0;
      this.working.earlyStart[activity] = this.earlyStart[activity]!;
      this.working.chainVariance[activity] = this.chainVariance[activity]!;
    }
    this.activities.length = 0;
  }
}
