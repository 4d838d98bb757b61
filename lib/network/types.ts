/**
 * A compiled network: index arrays only. Activity i is the list's activity i; link k is the list's link k
 * through `linkIndex`. Links with an unknown end and self-links are left out.
 */
export interface Network {
  readonly count: number;
  readonly linkCount: number;
  /** Expected duration and variance by activity, working days and working days². */
  readonly expected: Float64Array;
  readonly variance: Float64Array;
  /** Predecessor links of activity i: positions predecessorStart[i] … predecessorStart[i + 1] − 1. */
  readonly predecessorStart: Int32Array;
  readonly predecessor: Int32Array;
  /** Index into the list's links, by position. */
  readonly linkIndex: Int32Array;
  /** 0 FS, 1 SS, 2 FF, 3 SF, by position. */
  readonly relation: Uint8Array;
  /** Working days, by position. */
  readonly lag: Float64Array;
  /** Successors of activity i as positions into the arrays above. */
  readonly successorStart: Int32Array;
  readonly successorPosition: Int32Array;
  readonly successor: Int32Array;
}

/** Activities that wait for one another in a ring (a strongly connected component of two or more). */
export interface Tangle {
  /** Ascending. */
  readonly activities: readonly number[];
  /** A shortest loop: each activity waits for the one before it, the first for the last. */
  readonly loop: readonly number[];
  /** Indices into the list's links: cutting these leaves no loop in the tangle. */
  readonly cut: readonly number[];
  /** True where no smaller set of links would do. */
  readonly cutIsSmallest: boolean;
}

/** The four times and floats, working days from time 0; by activity. */
export interface Times {
  readonly earlyStart: Float64Array;
  readonly earlyFinish: Float64Array;
  readonly lateStart: Float64Array;
  readonly lateFinish: Float64Array;
  readonly totalFloat: Float64Array;
  readonly freeFloat: Float64Array;
  readonly critical: Uint8Array;
}

export type Analysis =
  | {
      readonly computable: true;
      readonly expectedDuration: number;
      /** Of the critical path with the largest, found without listing paths. */
      readonly variance: number;
      readonly standardDeviation: number;
      /** The path whose variance is reported stands first; up to 50 are listed. */
      readonly criticalPaths: readonly (readonly number[])[];
      /** Exact up to 2^53, beyond that to sixteen digits; the largest double where it holds no more. */
      readonly criticalPathCount: number;
      readonly times: Times;
    }
  | { readonly computable: false; readonly tangles: readonly Tangle[] };
