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
  /** Activities with an entry or a cell of which no one can say what it means. */
  readonly obscure: ReadonlySet<number>;
}

type Pair = readonly [number, number];

/** What was meant by the wrongly written links of one activity; none where no one can say. */
interface Meant {
  readonly owner: number;
  readonly pairs: readonly Pair[];
}

function fromUnknown(context: AuditContext): Meant[] {
  return unknownLinks(context).map((unknown) => {
    const meant = unknown.unnamed ?? unknown.near[0];
    return { owner: unknown.owner.index, pairs: meant ? [endsWith(unknown, meant.index)] : [] };
  });
}

function fromHeadings(context: AuditContext): Meant[] {
  const headings = linkedHeadings(context);
  return context.list.links.flatMap(({ from, to, fromIndex, toIndex }): Meant[] => {
    const ends = headings.get(fromIndex < 0 ? from : toIndex < 0 ? to : '');
    if (!ends) return [];
    return fromIndex < 0
      ? [{ owner: toIndex, pairs: ends.last.map((activity) => [activity, toIndex]) }]
      : [{ owner: fromIndex, pairs: ends.first.map((activity) => [fromIndex, activity]) }];
  });
}

function fromUnreadable(list: ActivityList): Meant[] {
  return list.linkCells.flatMap(({ owner, gives, items }) =>
    items
      .filter(({ link }) => link === null)
      .map((item) => ({
        owner,
        pairs: spokenOf(item, owner, list).map((other): Pair =>
          gives === 'predecessors' ? [other, owner] : [owner, other],
        ),
      })),
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
  const meant = [...fromUnknown(context), ...fromHeadings(context), ...fromUnreadable(list)];
  const unreadable = list.linkCells.filter(({ error }) => error !== null).map(({ owner }) => owner);
  const unclear = meant.filter(({ pairs }) => pairs.length === 0).map(({ owner }) => owner);
  return {
    links: meant.flatMap(({ pairs }) => pairs),
    waiting: owners('predecessors'),
    followed: owners('successors'),
    obscure: new Set([...unreadable, ...unclear]),
  };
});
