import type { AuditContext } from '../rule';
import { intended } from './intended';
import { memo } from './memo';

function find(parent: Int32Array, activity: number): number {
  let root = activity;
  while (parent[root] !== root) {
    const above = parent[parent[root] ?? root] ?? root;
    parent[root] = above;
    root = above;
  }
  return root;
}

/** Activities joined by links in whatever direction, links that are meant but wrongly written included. */
function groupsOf(context: AuditContext): number[][] {
  const { list } = context;
  const parent = Int32Array.from(list.activities, (_, index) => index);
  const join = (one: number, other: number) => {
    if (one >= 0 && other >= 0) parent[find(parent, one)] = find(parent, other);
  };
  for (const { fromIndex, toIndex } of list.links) join(fromIndex, toIndex);
  for (const [from, to] of intended(context).links) join(from, to);
  const groups = new Map<number, number[]>();
  list.activities.forEach((_, index) => {
    const root = find(parent, index);
    const group = groups.get(root);
    if (group) group.push(index);
    else groups.set(root, [index]);
  });
  return [...groups.values()];
}

/**
 * Groups of two or more beside the largest (of two as large, the one that begins first). An activity alone is
 * no group: it is an open start and an open finish. Nor is one detached whose links are there and cannot be
 * read: another rule has those.
 */
export const detachedGroups = memo((context: AuditContext): number[][] => {
  const { obscure } = intended(context);
  const groups = groupsOf(context).filter(({ length }) => length > 1);
  const largest = groups.reduce(
    (best, group) => (group.length > best.length ? group : best),
    groups[0] ?? [],
  );
  return groups.filter((group) => group !== largest && !group.some((one) => obscure.has(one)));
});
