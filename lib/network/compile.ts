import { threePoint } from '@/lib/estimates';
import type { Activity, Link } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import type { Relation } from '@/lib/schedule/relation';
import type { Network } from './types';

/** Codes of `Network.relation`. */
export const RELATION_CODE: Record<Relation, number> = { FS: 0, SS: 1, FF: 2, SF: 3 };

/**
 * Compiles a list into index arrays, linear in activities and links. Activities are taken as `usedEstimates`
 * says; links with an unknown end and self-links are left out (the audit reports both).
 */
export function compile(list: Pick<ActivityList, 'activities' | 'links'>): Network {
  const { activities, links } = list;
  const count = activities.length;
  const expected = new Float64Array(count);
  const variance = new Float64Array(count);
  for (let i = 0; i < count; i++) {
    const { optimistic, likely, pessimistic } = usedEstimates(activities[i]!);
    const moments = threePoint(optimistic, likely, pessimistic);
    expected[i] = moments.mean;
    variance[i] = moments.variance;
  }
  return { count, expected, variance, ...compileLinks(count, links) };
}

/**
 * The three estimates as the network uses them, in working days: a missing optimistic or pessimistic one is
 * taken as the likely one, and a missing likely one as 0 (such a list is not computable: the audit says so).
 */
export function usedEstimates(activity: Activity): {
  readonly optimistic: number;
  readonly likely: number;
  readonly pessimistic: number;
} {
  const likely = activity.likely.days ?? 0;
  if (activity.likely.days === null) return { optimistic: 0, likely: 0, pessimistic: 0 };
  return {
    optimistic: activity.optimistic.days ?? likely,
    likely,
    pessimistic: activity.pessimistic.days ?? likely,
  };
}

const isKept = (link: Link) => link.fromIndex >= 0 && link.toIndex >= 0 && link.fromIndex !== link.toIndex;

function compileLinks(count: number, links: readonly Link[]) {
  const predecessorStart = new Int32Array(count + 1);
  const successorStart = new Int32Array(count + 1);
  for (const link of links) {
    if (!isKept(link)) continue;
    predecessorStart[link.toIndex + 1]!++;
    successorStart[link.fromIndex + 1]!++;
  }
  for (let i = 0; i < count; i++) {
    predecessorStart[i + 1]! += predecessorStart[i]!;
    successorStart[i + 1]! += successorStart[i]!;
  }
  const linkCount = predecessorStart[count]!;
  const predecessor = new Int32Array(linkCount);
  const linkIndex = new Int32Array(linkCount);
  const relation = new Uint8Array(linkCount);
  const lag = new Float64Array(linkCount);
  const successorPosition = new Int32Array(linkCount);
  const successor = new Int32Array(linkCount);
  const nextInto = predecessorStart.slice();
  const nextOutOf = successorStart.slice();
  for (let k = 0; k < links.length; k++) {
    const link = links[k]!;
    if (!isKept(link)) continue;
    const position = nextInto[link.toIndex]!++;
    predecessor[position] = link.fromIndex;
    linkIndex[position] = k;
    relation[position] = RELATION_CODE[link.type];
    lag[position] = link.lag;
    const outward = nextOutOf[link.fromIndex]!++;
    successorPosition[outward] = position;
    successor[outward] = link.toIndex;
  }
  return {
    linkCount,
    predecessorStart,
    predecessor,
    linkIndex,
    relation,
    lag,
    successorStart,
    successorPosition,
    successor,
  };
}
