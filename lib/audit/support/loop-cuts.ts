import type { Tangle } from '@/lib/network';
import type { AuditContext } from '../rule';

/** Tangles up to this size are searched for other single links that would do. */
const SEARCHED = 400;
const LONGEST_LOOP = 12;

/** Links between two activities of the tangle, by index into the list's links. */
function innerLinks({ list, linksOutOf }: AuditContext, { activities }: Tangle): number[] {
  const inside = new Set(activities);
  return activities.flatMap((activity) =>
    (linksOutOf[activity] ?? []).filter((index) => {
      const to = list.links[index]?.toIndex ?? -1;
      return to !== activity && inside.has(to);
    }),
  );
}

/** Whether the tangle has no loop left without one of its links (Kahn 1962: an order exists). */
function breaks({ list }: AuditContext, tangle: Tangle, inner: readonly number[], without: number): boolean {
  const kept = inner.filter((index) => index !== without).flatMap((index) => list.links[index] ?? []);
  const waiting = new Map(tangle.activities.map((activity) => [activity, 0]));
  const after = new Map<number, number[]>();
  for (const { fromIndex, toIndex } of kept) {
    waiting.set(toIndex, (waiting.get(toIndex) ?? 0) + 1);
    after.set(fromIndex, [...(after.get(fromIndex) ?? []), toIndex]);
  }
  const ready = tangle.activities.filter((activity) => waiting.get(activity) === 0);
  let done = 0;
  for (let activity = ready.pop(); activity !== undefined; activity = ready.pop()) {
    done += 1;
    for (const next of after.get(activity) ?? []) {
      const left = (waiting.get(next) ?? 0) - 1;
      waiting.set(next, left);
      if (left === 0) ready.push(next);
    }
  }
  return done === tangle.activities.length;
}

/** Where one link is enough: the other links of the shortest loop that would do as well. */
export function otherCuts(context: AuditContext, tangle: Tangle): number[] {
  const { cut, loop, activities } = tangle;
  if (cut.length !== 1 || activities.length > SEARCHED || loop.length > LONGEST_LOOP) return [];
  const inner = innerLinks(context, tangle);
  const onLoop = inner.filter((index) => {
    const link = context.list.links[index];
    const at = loop.indexOf(link?.fromIndex ?? -1);
    return at >= 0 && loop[(at + 1) % loop.length] === link?.toIndex;
  });
  return onLoop.filter((index) => !cut.includes(index) && breaks(context, tangle, inner, index));
}
