import type { ActivityList } from '@/lib/schedule/activity-list';

/**
 * A plain, slow schedule written from the definitions alone, to hold the fast one against. Every link is
 * enforced over and over until nothing moves; paths are walked one by one.
 */
export interface ReferenceSchedule {
  readonly finish: number;
  readonly earlyStart: number[];
  readonly lateStart: number[];
  readonly freeFloat: number[];
  readonly critical: boolean[];
  readonly paths: number[][];
  readonly variance: number;
}

const SAME = 1e-6;

interface Link {
  readonly from: number;
  readonly to: number;
  readonly type: string;
  readonly lag: number;
}

/** Links the network has: both ends known, and two of them. */
export function usedLinks(list: ActivityList): Link[] {
  return list.links
    .filter(({ fromIndex, toIndex }) => fromIndex >= 0 && toIndex >= 0 && fromIndex !== toIndex)
    .map(({ fromIndex, toIndex, type, lag }) => ({ from: fromIndex, to: toIndex, type, lag }));
}

/** How much later the successor's bound end is than the link asks for. */
function slack({ type, lag, from, to }: Link, start: readonly number[], days: readonly number[]): number {
  const at = (values: readonly number[], i: number) => values[i] ?? Number.NaN;
  const predecessor = type[0] === 'F' ? at(start, from) + at(days, from) : at(start, from);
  const successor = type[1] === 'F' ? at(start, to) + at(days, to) : at(start, to);
  return successor - (predecessor + lag);
}

export function reference(list: ActivityList): ReferenceSchedule {
  const links = usedLinks(list);
  const { days, spread } = moments(list);
  const earlyStart = days.map(() => 0);
  enforce(links, earlyStart, days, 'successor');
  const finish = Math.max(...days.map((d, i) => (earlyStart[i] ?? 0) + d));
  const lateStart = days.map((d) => finish - d);
  enforce(links, lateStart, days, 'predecessor');
  const freeFloat = days.map((d, i) =>
    Math.min(
      finish - ((earlyStart[i] ?? 0) + d),
      ...links.filter(({ from }) => from === i).map((link) => slack(link, earlyStart, days)),
    ),
  );
  const critical = days.map((_, i) => (lateStart[i] ?? 0) - (earlyStart[i] ?? 0) <= SAME);
  const tight = links.filter(
    (link) => critical[link.from] && critical[link.to] && slack(link, earlyStart, days) <= SAME,
  );
  const paths = walk(
    days.map((_, i) => i).filter((i) => critical[i]),
    tight,
  );
  const sums = paths.map((path) => path.reduce((sum, i) => sum + (spread[i] ?? 0), 0));
  return { finish, earlyStart, lateStart, freeFloat, critical, paths, variance: Math.max(...sums) };
}

function moments(list: ActivityList): { days: number[]; spread: number[] } {
  const three = list.activities.map(({ optimistic, likely, pessimistic }) => {
    const m = likely.days ?? 0;
    return [optimistic.days ?? m, m, pessimistic.days ?? m] as const;
  });
  return {
    days: three.map(([a, m, b]) => (a + 4 * m + b) / 6),
    spread: three.map(([a, , b]) => ((b - a) / 6) ** 2),
  };
}

/** Moves one end of every link that is not kept, over and over, until all are. */
function enforce(
  links: readonly Link[],
  start: number[],
  days: readonly number[],
  moves: 'predecessor' | 'successor',
): void {
  for (let moved = true; moved;) {
    moved = false;
    for (const link of links) {
      const missing = -slack(link, start, days);
      if (missing <= 1e-12) continue;
      if (moves === 'successor') start[link.to] = (start[link.to] ?? 0) + missing;
      else start[link.from] = (start[link.from] ?? 0) - missing;
      moved = true;
    }
  }
}

function walk(critical: readonly number[], tight: readonly Link[]): number[][] {
  const next = (i: number) => [...new Set(tight.filter(({ from }) => from === i).map(({ to }) => to))];
  const continued = (path: readonly number[]): number[][] => {
    const steps = next(path[path.length - 1] ?? -1);
    return steps.length === 0 ? [[...path]] : steps.flatMap((to) => continued([...path, to]));
  };
  return critical.filter((i) => !tight.some(({ to }) => to === i)).flatMap((i) => continued([i]));
}
