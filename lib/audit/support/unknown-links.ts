import type { Activity, Link } from '@/lib/schedule/activity';
import type { AuditContext } from '../rule';
import { freeIds } from './free-ids';
import { wouldLoop } from './graph';
import { headingsById } from './heading-ids';
import { memo } from './memo';
import { type Nearness, nearestTo } from './nearest';

/** A link that names an ID which is not in the list (and is no heading's). */
export interface UnknownLink {
  readonly index: number;
  readonly link: Link;
  /** The activity in whose row it is written. */
  readonly owner: Activity;
  readonly gives: 'predecessors' | 'successors';
  /** The ID as written. */
  readonly wanted: string;
  /** Activities whose IDs are equally near, the likeliest first; one that would close a loop is left out. */
  readonly near: readonly Activity[];
  readonly how: Nearness | null;
  /** Why the nearest will not do: it is the activity itself, linked already, or would close a loop. */
  readonly unfit: { readonly id: string; readonly why: 'itself' | 'linked' | 'loop' } | null;
  /** A row without an ID which seems to be meant. */
  readonly unnamed: Activity | null;
}

/** The two ends of a link, were the unknown one this activity. */
export function endsWith(unknown: Pick<UnknownLink, 'gives' | 'owner'>, other: number): [number, number] {
  const own = unknown.owner.index;
  return unknown.gives === 'predecessors' ? [other, own] : [own, other];
}

type Fitness = 'fit' | 'itself' | 'linked' | 'loop';

function fitness(
  context: AuditContext,
  unknown: Pick<UnknownLink, 'gives' | 'owner' | 'link'>,
  other: number,
): Fitness {
  const { list, network, linksInto } = context;
  const [from, to] = endsWith(unknown, other);
  if (from === to) return 'itself';
  const linked = linksInto[to]?.some((index) => {
    const link = list.links[index];
    return link?.fromIndex === from && link.type === unknown.link.type;
  });
  if (linked) return 'linked';
  return wouldLoop(network, from, to) ? 'loop' : 'fit';
}

/**
 * Those above the activity first, the nearest of them first: work waits for what is listed before it, and
 * fixes that all point upwards close no loop together.
 */
const byPlace = (owner: number) => (one: Activity, other: Activity) =>
  Number(one.index > owner) - Number(other.index > owner) ||
  Math.abs(one.index - owner) - Math.abs(other.index - owner);

function unnamedRows({ list }: AuditContext): ReadonlyMap<number, Activity> {
  const rows = new Map<number, Activity>();
  for (const [index, { awaitedBy }] of freeIds(list)) {
    const activity = list.activities[index];
    if (activity) for (const link of awaitedBy) rows.set(link, activity);
  }
  return rows;
}

function resolve(context: AuditContext, index: number, unnamed: Activity | null): UnknownLink | null {
  const { list } = context;
  const link = list.links[index];
  const cell = link && list.linkCells[link.linkCell];
  const owner = cell && list.activities[cell.owner];
  if (!link || !cell || !owner || (link.fromIndex >= 0 && link.toIndex >= 0)) return null;
  const { gives } = cell;
  const wanted = gives === 'predecessors' ? link.from : link.to;
  if (headingsById(list).has(wanted)) return null;
  const nearest = nearestTo(list, wanted);
  const judged = (nearest?.activities ?? []).flatMap((at) => {
    const activity = list.activities[at];
    return activity ? [{ activity, fitness: fitness(context, { gives, owner, link }, at) }] : [];
  });
  const near = judged.filter((one) => one.fitness === 'fit').map((one) => one.activity);
  const [first] = judged;
  const unfit =
    near.length === 0 && first && first.fitness !== 'fit'
      ? { id: first.activity.id, why: first.fitness }
      : null;
  const how = nearest?.how ?? null;
  near.sort(byPlace(owner.index));
  return { index, link, owner, gives, wanted, near, how, unfit, unnamed };
}

/** Every link to an ID that is not in the list, with what may be meant. */
export const unknownLinks = memo((context: AuditContext): readonly UnknownLink[] => {
  const unnamed = unnamedRows(context);
  return context.list.links.flatMap((link, index) => {
    if (link.fromIndex >= 0 && link.toIndex >= 0) return [];
    return resolve(context, index, unnamed.get(index) ?? null) ?? [];
  });
});
