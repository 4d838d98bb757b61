import fc from 'fast-check';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { RELATIONS } from '@/lib/schedule/relation';
import { list } from '@/tests/support/networks';

interface Shape {
  /** Activities at most. */
  readonly size: number;
  /** Links at most. */
  readonly links: number;
  /** How far apart the ends of a link are at most, in the order in which they are drawn. */
  readonly near?: number;
  /** Whether links may run in a ring. */
  readonly loops?: boolean;
  /** Multiples of this many days (1: whole days, so that ties are common). */
  readonly step?: number;
}

/**
 * Random lists in the short notation: any relation, lags and leads, several links of a pair, activities in an
 * order that has nothing to do with the links.
 */
export function randomLists({
  size,
  links,
  near = Infinity,
  loops = false,
  step = 1,
}: Shape): fc.Arbitrary<ActivityList> {
  const days = (most: number) => fc.integer({ min: 0, max: most / step }).map((n) => n * step);
  const estimates = fc.tuple(days(8), days(8), days(8)).map((three) => three.sort((x, y) => x - y));
  return fc.integer({ min: 1, max: size }).chain((count) =>
    fc
      .record({
        estimates: fc.array(estimates, { minLength: count, maxLength: count }),
        place: fc.shuffledSubarray(
          Array.from({ length: count }, (_, i) => i),
          { minLength: count },
        ),
        links: fc.array(
          fc.record({
            from: fc.nat(count - 1),
            to: fc.nat(count - 1),
            type: fc.constantFrom(...RELATIONS),
            lag: fc.integer({ min: -4 / step, max: 4 / step }).map((n) => n * step),
          }),
          { maxLength: links },
        ),
      })
      .map((drawn) => {
        const kept = drawn.links
          .map((link) => ({ ...link, to: link.from + ((link.to - link.from) % near) }))
          .filter(({ from, to }) => from !== to)
          .map((link) => (loops || link.from < link.to ? link : { ...link, from: link.to, to: link.from }));
        const rows = drawn.estimates.map(([a, m, b], drawnAs) => {
          const into = kept
            .filter(({ to }) => to === drawnAs)
            .map(
              ({ from, type, lag }) => `N${drawn.place[from]} ${type}${lag < 0 ? '' : '+'}${lag.toFixed(6)}`,
            );
          const row = `N${drawn.place[drawnAs]} ${a} ${m} ${b}`;
          return into.length > 0 ? `${row} <- ${into.join(', ')}` : row;
        });
        return list(...drawn.place.map((_, i) => rows[drawn.place.indexOf(i)] ?? ''));
      }),
  );
}
