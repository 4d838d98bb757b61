import type { Network } from '@/lib/network';
import type { ActivityList, HeadingRow } from '@/lib/schedule/activity-list';
import type { AuditContext } from '../rule';
import { memo } from './memo';

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

function endsOf(network: Network, { from, to }: Range): Pick<HeadingEnds, 'first' | 'last'> {
  const inside = (activity: number | undefined) =>
    activity !== undefined && activity >= from && activity < to;
  const free = (neighbours: Int32Array, starts: Int32Array, activity: number) =>
    !neighbours.subarray(starts[activity], starts[activity + 1]).some(inside);
  const members = Array.from({ length: Math.max(0, to - from) }, (_, i) => from + i);
  return {
    first: members.filter((activity) => free(network.predecessor, network.predecessorStart, activity)),
    last: members.filter((activity) => free(network.successor, network.successorStart, activity)),
  };
}

/** Headings by ID, where no activity bears it. */
export const headingsById = memo((list: ActivityList) => {
  const byId = new Map<string, number>();
  list.headings.forEach(({ id }, position) => {
    if (id !== '' && !list.indexOf.has(id) && !byId.has(id)) byId.set(id, position);
  });
  return byId;
});

const linkedIds = (list: ActivityList) =>
  new Set(
    list.links.map(({ fromIndex, from, toIndex, to }) => (fromIndex < 0 ? from : toIndex < 0 ? to : '')),
  );

/** For each heading that a link names, by its ID: the activities with which what is under it begins and ends. */
export const linkedHeadings = memo(({ list, network }: AuditContext): ReadonlyMap<string, HeadingEnds> => {
  const ends = new Map<string, HeadingEnds>();
  if (headingsById(list).size === 0) return ends;
  const sheets = sheetRanges(list);
  for (const id of linkedIds(list)) {
    const position = headingsById(list).get(id);
    const heading = position === undefined ? undefined : list.headings[position];
    if (position === undefined || !heading) continue;
    const from = firstBelow(list, sheets, heading.sheet, heading.row);
    const to = firstBelow(list, sheets, heading.sheet, endRow(list, position) - 1);
    ends.set(id, { heading, ...endsOf(network, { from, to }) });
  }
  return ends;
});
