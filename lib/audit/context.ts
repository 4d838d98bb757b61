import { compile, findTangles, type Network } from '@/lib/network';
import type { Link } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import type { AuditContext } from './rule';

function linksBy(list: ActivityList, end: (link: Link) => number): number[][] {
  const groups: number[][] = list.activities.map(() => []);
  list.links.forEach((link, index) => groups[end(link)]?.push(index));
  return groups;
}

/** What every check is given; linear in activities and links. */
export function makeContext(list: ActivityList, network: Network = compile(list)): AuditContext {
  return {
    list,
    network,
    tangles: findTangles(network),
    linksInto: linksBy(list, ({ toIndex }) => toIndex),
    linksOutOf: linksBy(list, ({ fromIndex }) => fromIndex),
  };
}
