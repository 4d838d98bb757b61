interface Limits {
  readonly failures: number;
  readonly windowMs: number;
}

export interface Throttle {
  /** Milliseconds until another attempt is let through; 0 where one is now. */
  wait(key: string): number;
  failed(key: string): void;
  succeeded(key: string): void;
}

/** Beyond this many keys the longest untouched are forgotten. */
const MOST_KEYS = 50_000;

/** Counts failures by key in this process; so many within the window, and the next has to wait for the first to lapse. */
export function createThrottle({ failures, windowMs }: Limits, now: () => number = Date.now): Throttle {
  const seen = new Map<string, number[]>();

  const recent = (key: string): number[] => (seen.get(key) ?? []).filter((at) => at > now() - windowMs);

  return {
    wait(key) {
      const [first, ...rest] = recent(key);
      return first !== undefined && rest.length + 1 >= failures ? first + windowMs - now() : 0;
    },
    failed(key) {
      const times = [...recent(key), now()].slice(-failures);
      seen.delete(key);
      seen.set(key, times);
      const oldest = seen.size > MOST_KEYS ? seen.keys().next().value : undefined;
      if (oldest !== undefined) seen.delete(oldest);
    },
    succeeded(key) {
      seen.delete(key);
    },
  };
}
