import type { ActivityList } from '@/lib/schedule/activity-list';
import type { AuditContext } from '../rule';
import { linkedHeadings } from './headings';
import { memo } from './memo';
import { spokenOf } from './readings';
import { endsWith, unknownLinks } from './unknown-links';

/**
 * Links that the list means and does not have, because another rule finds fault with the way they are
 * written. Rules about missing links reckon with them, so that one slip is one finding.
 */
export interface Intended {
  /** [from, to] by index. */
  readonly links: readonly (readonly [number, number])[];
  /** Activities with a predecessor (successor) cell that has an entry or an error, whatever it means. */
  readonly waiting: ReadonlySet<number>;
  readonly followed: ReadonlySet<number>;
}

type Pair = readonly [number, number];

function fromUnknown(context: AuditContext): Pair[] {
  return unknownLinks(context).flatMap((unknown) => {
    const meant = unknown.unnamed ?? unknown.near[0];
    return meant ? [endsWith(unknown, meant.index)] : [];
  });
}

function fromHeadings(context: AuditContext): Pair[] {
  const ends = linkedHeadings(context);
  return context.list.links.flatMap(({ from, to, fromIndex, toIndex }): Pair[] => {
    if (fromIndex < 0) return (ends.get(from)?.last ?? []).map((activity) => [activity, toIndex]);
    if (toIndex < 0) return (ends.get(to)?.first ?? []).map((activity) => [fromIndex, activity]);
    return [];
  });
}

function fromUnreadable(list: ActivityList): Pair[] {
  return list.linkCells.flatMap(({ owner, gives, items }) =>
    items.flatMap((item): Pair[] => {
      const other = item.link ? null : spokenOf(item, owner, list);
      if (other === null) return [];
      return [gives === 'predecessors' ? [other, owner] : [owner, other]];
    }),
  );
}

function isUnsettled(list: ActivityList, cell: ActivityList['linkCells'][number]): boolean {
  if (cell.error !== null) return true;
  return cell.items.some(({ link }) => link === null || !list.indexOf.has(link.id));
}

export const intended = memo((context: AuditContext): Intended => {
  const { list } = context;
  const unsettled = list.linkCells.filter((cell) => isUnsettled(list, cell));
  const owners = (gives: 'predecessors' | 'successors') =>
    new Set(unsettled.filter((cell) => cell.gives === gives).map(({ owner }) => owner));
  return {
    links: [...fromUnknown(context), ...fromHeadings(context), ...fromUnreadable(list)],
    waiting: owners('predecessors'),
    followed: owners('successors'),
  };
});
