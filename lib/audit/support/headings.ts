import type { ActivityList, HeadingRow } from '@/lib/schedule/activity-list';
import type { AuditContext } from '../rule';
import { headingsById } from './heading-ids';
import { memo } from './memo';
import { endsWith, unknownLinks } from './unknown-links';

/** The activities under a heading: positions from … to − 1. */
interface Range {
  readonly from: number;
  readonly to: number;
}

export interface HeadingEnds {
  readonly heading: HeadingRow;
  /** Activities under it that wait for no other of them, and those for which no other waits. */
  readonly first: readonly number[];
  readonly last: readonly number[];
}

/** Position of the first activity on the heading's sheet below a row. */
function firstBelow(
  list: ActivityList,
  sheets: ReadonlyMap<string, Range>,
  sheet: string,
  row: number,
): number {
  const range = sheets.get(sheet);
  let [low, high] = [range?.from ?? 0, range?.to ?? 0];
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((list.activities[middle]?.row ?? 0) > row) high = middle;
    else low = middle + 1;
  }
  return low;
}

function sheetRanges(list: ActivityList): Map<string, Range> {
  const ranges = new Map<string, Range>();
  list.activities.forEach(({ sheet }, index) => {
    ranges.set(sheet, { from: ranges.get(sheet)?.from ?? index, to: index + 1 });
  });
  return ranges;
}

/** Where a heading's activities end: at the next heading on its sheet that lies no deeper. */
function endRow(list: ActivityList, position: number): number {
  const heading = list.headings[position];
  for (let next = position + 1; next < list.headings.length; next++) {
    const other = list.headings[next];
    if (!heading || !other || other.sheet !== heading.sheet) break;
    if (other.outline <= heading.outline) return other.row;
  }
  return Infinity;
}

/** Pairs that are linked, or are meant to be and named by a slip. */
function pairsOf(context: AuditContext): Pairs {
  const after = new Map<number, number[]>();
  const before = new Map<number, number[]>();
  const put = (pairs: Map<number, number[]>, one: number, other: number) => {
    const known = pairs.get(one);
    if (known) known.push(other);
    else pairs.set(one, [other]);
  };
  for (const unknown of unknownLinks(context)) {
    const meant = unknown.unnamed ?? unknown.near[0];
    if (!meant) continue;
    const [from, to] = endsWith(unknown, meant.index);
    put(after, from, to);
    put(before, to, from);
  }
  return { after, before };
}

interface Pairs {
  readonly after: ReadonlyMap<number, readonly number[]>;
  readonly before: ReadonlyMap<number, readonly number[]>;
}

function endsOf(
  { network }: AuditContext,
  pairs: Pairs,
  { from, to }: Range,
): Pick<HeadingEnds, 'first' | 'last'> {
  const inside = (activity: number) => activity >= from && activity < to;
  const isFirst = (activity: number) =>
    !network.predecessor
      .subarray(network.predecessorStart[activity], network.predecessorStart[activity + 1])
      .some(inside) && !pairs.before.get(activity)?.some(inside);
  const isLast = (activity: number) =>
    !network.successor
      .subarray(network.successorStart[activity], network.successorStart[activity + 1])
      .some(inside) && !pairs.after.get(activity)?.some(inside);
  const members = Array.from({ length: Math.max(0, to - from) }, (_, i) => from + i);
  return { first: members.filter(isFirst), last: members.filter(isLast) };
}

const linkedIds = (list: ActivityList) =>
  new Set(
    list.links.map(({ fromIndex, from, toIndex, to }) => (fromIndex < 0 ? from : toIndex < 0 ? to : '')),
  );

/** For each heading that a link names, by its ID: the activities with which what is under it begins and ends. */
export const linkedHeadings = memo((context: AuditContext): ReadonlyMap<string, HeadingEnds> => {
  const { list } = context;
  const ends = new Map<string, HeadingEnds>();
  if (headingsById(list).size === 0) return ends;
  const sheets = sheetRanges(list);
  const pairs = pairsOf(context);
  for (const id of linkedIds(list)) {
    const position = headingsById(list).get(id);
    const heading = position === undefined ? undefined : list.headings[position];
    if (position === undefined || !heading) continue;
    const from = firstBelow(list, sheets, heading.sheet, heading.row);
    const to = firstBelow(list, sheets, heading.sheet, endRow(list, position) - 1);
    ends.set(id, { heading, ...endsOf(context, pairs, { from, to }) });
  }
  return ends;
});
