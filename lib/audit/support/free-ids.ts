import type { Activity } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { canBeNamed } from './about';
import { type Member, memberOf, type Series, seriesOf } from './id-pattern';
import { memo } from './memo';

/** A free ID for a row that has none of its own. */
export interface FreeId {
  readonly id: string;
  /** The ID it follows in the list's pattern; null where it begins one. */
  readonly after: string | null;
  /** The ID of the row below, where it lies between the two. */
  readonly before: string | null;
  /** Links that name this ID already, by index into the list's links: they mean this row, it seems. */
  readonly awaitedBy: readonly number[];
}

interface State {
  readonly list: ActivityList;
  readonly series: Map<string, Series>;
  /** IDs in use, of activities and headings, and those proposed so far. */
  readonly taken: Set<string>;
  /** Links by the ID that they name and that is not in the list. */
  readonly awaited: ReadonlyMap<string, readonly number[]>;
  readonly proposed: Map<number, FreeId>;
  /** The last suffix given to a word. */
  readonly suffixes: Map<string, number>;
}

function awaitedIds(list: ActivityList): Map<string, number[]> {
  const awaited = new Map<string, number[]>();
  list.links.forEach((link, index) => {
    const id = link.fromIndex < 0 ? link.from : link.toIndex < 0 ? link.to : null;
    if (id === null) return;
    const known = awaited.get(id);
    if (known) known.push(index);
    else awaited.set(id, [index]);
  });
  return awaited;
}

/** The ID of the row above (or below) on the same sheet, or the one proposed for it. */
function neighbour({ list, proposed }: State, activity: Activity, direction: 1 | -1): string | null {
  const next = list.activities[activity.index + direction];
  if (!next || next.sheet !== activity.sheet) return null;
  return proposed.get(next.index)?.id ?? (next.id === '' ? null : next.id);
}

/** Numbers between two neighbours that are looked at one by one. */
const SEARCHED = 50;

/** One that a link names already; else a step further; else halfway to the row below. */
function numbersBetween(
  above: Member,
  below: Member | null,
  step: number,
  isAwaited: (n: number) => boolean,
) {
  const next = above.number + step;
  if (!below || below.series !== above.series) return [next];
  const end = Math.min(below.number, above.number + SEARCHED);
  const awaited: number[] = [];
  for (let n = above.number + 1; n < end; n++) if (isAwaited(n)) awaited.push(n);
  const halfway = Math.floor((above.number + below.number) / 2);
  return [...awaited, next, halfway].filter((n) => n > above.number && n < below.number);
}

/** The ID before that of the row below, for the first row of a sheet: –, A2 → A1. */
function firstId(state: State, before: string | null): FreeId | null {
  const below = before === null ? null : memberOf(before);
  const series = below && state.series.get(below.series);
  if (!below || !series || below.number <= series.step) return null;
  const id = series.write(below.number - series.step, series.width);
  if (state.taken.has(id)) return null;
  return { id, after: null, before, awaitedBy: state.awaited.get(id) ?? [] };
}

/** The ID that is missing between the rows above and below: A4, –, A6 → A5. */
function gapId(state: State, activity: Activity): FreeId | null {
  const [after, before] = [neighbour(state, activity, -1), neighbour(state, activity, 1)];
  if (after === null) return firstId(state, before);
  const above = memberOf(after);
  const series = above && state.series.get(above.series);
  if (!above || !series) return null;
  const below = before === null ? null : memberOf(before);
  const write = (number: number) => series.write(number, series.width);
  const numbers = numbersBetween(above, below, series.step, (number) => state.awaited.has(write(number)));
  const id = numbers.map(write).find((candidate) => !state.taken.has(candidate));
  if (id === undefined) return null;
  const between = below?.series === above.series ? before : null;
  return { id, after, before: between, awaitedBy: state.awaited.get(id) ?? [] };
}

/** The ID after the last of a series; one that a link names already is left alone. */
function nextId(state: State, series: Series): FreeId {
  const after = series.write(series.last, series.width);
  let number = series.last;
  let id: string;
  do {
    number += series.step;
    id = series.write(number, series.width);
  } while (state.taken.has(id) || state.awaited.has(id));
  series.last = number;
  return { id, after, before: null, awaitedBy: [] };
}

const NEW_SERIES: Series = { last: 0, step: 1, width: 0, size: 0, write: String };

/** The series of the row above or below, else the one with most members. */
function seriesFor(state: State, activity: Activity): Series {
  for (const direction of [-1, 1] as const) {
    const member = memberOf(neighbour(state, activity, direction) ?? '');
    const series = member && state.series.get(member.series);
    if (series) return series;
  }
  let largest: Series | null = null;
  for (const series of state.series.values()) {
    if (largest === null || series.size > largest.size) largest = series;
  }
  if (largest) return largest;
  const fresh = { ...NEW_SERIES };
  state.series.set('\u0000', fresh);
  return fresh;
}

/** START, START → START-2. */
function suffixed(state: State, id: string): FreeId {
  let number = (state.suffixes.get(id) ?? 1) + 1;
  while (state.taken.has(`${id}-${number}`) || state.awaited.has(`${id}-${number}`)) number += 1;
  state.suffixes.set(id, number);
  return { id: `${id}-${number}`, after: id, before: null, awaitedBy: [] };
}

function propose(state: State, activity: Activity): FreeId {
  const own = memberOf(activity.id);
  if (activity.id !== '' && !own) return suffixed(state, activity.id);
  const gap = gapId(state, activity);
  const sameSeries = !own || (gap !== null && memberOf(gap.id)?.series === own.series);
  if (gap && sameSeries) return gap;
  const series = own ? state.series.get(own.series) : undefined;
  return nextId(state, series ?? seriesFor(state, activity));
}

/**
 * A free ID in the list's pattern for each row that has none, or one that an earlier row bears already, by
 * index of the activity: the one missing between the rows around it, else the next after the last. No two
 * rows are given the same. Linear in the list.
 */
export const freeIds = memo((list: ActivityList): ReadonlyMap<number, FreeId> => {
  const taken = new Set(list.indexOf.keys());
  for (const heading of list.headings) taken.add(heading.id);
  const proposed = new Map<number, FreeId>();
  const series = seriesOf(list.indexOf.keys());
  const state = { list, series, taken, awaited: awaitedIds(list), proposed, suffixes: new Map() };
  for (const activity of list.activities) {
    if (canBeNamed(list, activity) || activity.idError !== null) continue;
    const proposal = propose(state, activity);
    taken.add(proposal.id);
    proposed.set(activity.index, proposal);
  }
  return proposed;
});
