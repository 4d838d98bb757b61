/** One measured line; every bench gives these. */
export interface BenchRow {
  readonly name: string;
  /** Rows or activities of the list. */
  readonly size: number;
  /** Median of the repeats. */
  readonly ms: number;
  /** Most memory in use after a run, beyond what was in use before; MB. */
  readonly peakMb: number;
  /** How many times faster than what it is compared with. */
  readonly ratio?: { readonly to: string; readonly times: number };
}

export const REPEATS = 3;

/** Runs it a few times and gives the median; `prepare` runs before each, untimed. */
export async function measure(
  name: string,
  size: number,
  run: () => unknown,
  repeats = REPEATS,
  prepare?: () => void,
): Promise<BenchRow> {
  const times: number[] = [];
  let peak = 0;
  for (let repeat = 0; repeat < repeats; repeat += 1) {
    globalThis.gc?.();
    prepare?.();
    const before = process.memoryUsage().rss;
    const started = performance.now();
    await run();
    times.push(performance.now() - started);
    peak = Math.max(peak, process.memoryUsage().rss - before);
  }
  const ms = times.sort((one, other) => one - other)[Math.floor(repeats / 2)] ?? 0;
  return { name, size, ms, peakMb: peak / 1e6 };
}
