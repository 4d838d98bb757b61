import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { TANGLES } from '@/fixtures/networks/tangles';
import { analyse, compile, findTangles, type Tangle } from '@/lib/network';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { list } from '@/tests/support/networks';
import { randomLists } from './random-lists';
import { usedLinks } from './reference';

const tanglesOf = (activities: ActivityList) => findTangles(compile(activities));
const without = (activities: ActivityList, cut: readonly number[]): ActivityList => ({
  ...activities,
  links: activities.links.filter((_, k) => !cut.includes(k)),
});
const hasLoop = (activities: ActivityList) => !analyse(compile(activities), []).computable;

describe.each(TANGLES)('$name', ({ rows, tangles }) => {
  it('is untangled as by hand', () => {
    const activities = list(...rows);
    const named = (indices: readonly number[]) => indices.map((i) => activities.activities[i]?.id);
    const found = tanglesOf(activities).map((tangle) => ({
      activities: named(tangle.activities),
      loop: named(tangle.loop),
      cut: tangle.cut,
    }));
    expect(found).toEqual(tangles);
    expect(tanglesOf(activities).every(({ cutIsSmallest }) => cutIsSmallest)).toBe(true);
  });
});

describe('any tangle', () => {
  /** Activities that reach one another, by walking from each. */
  function components(activities: ActivityList): string[] {
    const links = usedLinks(activities);
    const reach = (from: number) => {
      const seen = new Set<number>();
      for (let next = [from]; next.length > 0;) {
        next = links.filter((link) => next.includes(link.from) && !seen.has(link.to)).map(({ to }) => to);
        next.forEach((to) => seen.add(to));
      }
      return seen;
    };
    const reached = activities.activities.map((_, i) => reach(i));
    const together = reached.map((seen, i) =>
      [...seen].filter((j) => reached[j]?.has(i)).sort((a, b) => a - b),
    );
    return [...new Set(together.filter((group) => group.length > 1).map(String))].sort();
  }

  /** Length of a shortest loop among these activities, by walking from each. */
  function girth(activities: ActivityList, tangle: Tangle): number {
    const links = usedLinks(activities);
    const lengths = tangle.activities.map((start) => {
      let at = new Set([start]);
      for (let steps = 1; steps <= tangle.activities.length; steps++) {
        at = new Set(links.filter(({ from }) => at.has(from)).map(({ to }) => to));
        if (at.has(start)) return steps;
      }
      return Infinity;
    });
    return Math.min(...lengths);
  }

  /** The fewest links and, among those, the most that contradict the list's order: every choice is tried. */
  function bestCut(activities: ActivityList): { links: number; against: number } {
    const { links } = activities;
    const cost = (cut: readonly number[]) => ({
      links: cut.length,
      against: cut.filter((k) => (links[k]?.fromIndex ?? 0) > (links[k]?.toIndex ?? 0)).length,
    });
    let best = { links: Infinity, against: 0 };
    for (let choice = 0; choice < 2 ** links.length; choice++) {
      const cut = links.map((_, k) => k).filter((k) => choice & (1 << k));
      const price = cost(cut);
      if (price.links > best.links || (price.links === best.links && price.against <= best.against)) continue;
      if (!hasLoop(without(activities, cut))) best = price;
    }
    return best;
  }

  it('is one group of activities that reach one another, with a shortest loop of real links', () => {
    fc.assert(
      fc.property(randomLists({ size: 10, links: 24, loops: true }), (activities) => {
        const tangles = tanglesOf(activities);
        expect(tangles.map((tangle) => tangle.activities.join()).sort()).toEqual(components(activities));
        const pairs = new Set(usedLinks(activities).map(({ from, to }) => `${from} ${to}`));
        for (const tangle of tangles) {
          expect(tangle.loop.length).toBe(girth(activities, tangle));
          tangle.loop.forEach((from, k) => {
            const to = tangle.loop[(k + 1) % tangle.loop.length];
            expect(pairs.has(`${from} ${to}`)).toBe(true);
          });
          expect(Math.min(...tangle.loop)).toBe(tangle.loop[0]);
        }
      }),
      { numRuns: 300 },
    );
  });

  it('is cut by as few links as can be, those against the order of the list first', () => {
    fc.assert(
      fc.property(randomLists({ size: 6, links: 10, loops: true }), (activities) => {
        const tangles = tanglesOf(activities);
        const cut = tangles.flatMap((tangle) => tangle.cut);
        expect(hasLoop(without(activities, cut))).toBe(false);
        const against = cut.filter((k) => {
          const link = activities.links[k];
          return link && link.fromIndex > link.toIndex;
        }).length;
        expect({ links: cut.length, against }).toEqual(bestCut(activities));
        expect(tangles.every(({ cutIsSmallest }) => cutIsSmallest)).toBe(true);
      }),
      { numRuns: 150 },
    );
  });
});

describe('large tangles', () => {
  it('of one long ring with rungs is cut at the link that closes it', () => {
    const count = 20_000;
    const rows = Array.from({ length: count }, (_, i) => {
      const before = [i - 1, i - 7].filter((k) => k >= 0).map((k) => `N${k}`);
      return `N${i} 1 <- ${i === 0 ? `N${count - 1}` : before.join(', ')}`;
    });
    const [tangle, ...others] = tanglesOf(list(...rows));
    expect(others).toEqual([]);
    expect(tangle).toMatchObject({ cut: [0], cutIsSmallest: true });
    expect(tangle?.activities).toHaveLength(count);
    expect(tangle?.loop).toHaveLength(1 + 19_999 / 7);
  });
});
