import type { AnalysedActivity } from '@/lib/contract/submission';

/** What hangs from one link of the chain: activities that lead into it and are not on the chain themselves. */
export interface Feeders {
  readonly activities: readonly AnalysedActivity[];
  /** The least total float among them; Infinity where there are none. */
  readonly leastFloat: number;
}

/**
 * For each activity of the chain the activities, off the chain, that reach it without passing another activity
 * of the chain. Each is counted once, at the first place of the chain it leads to. Linear in activities and links.
 */
export function feedersOf(path: readonly string[], byId: ReadonlyMap<string, AnalysedActivity>): Feeders[] {
  const taken = new Set(path);
  return path.map((id) => {
    const activities: AnalysedActivity[] = [];
    const open = [id];
    for (let next = open.pop(); next !== undefined; next = open.pop()) {
      for (const link of byId.get(next)?.predecessors ?? []) {
        const activity = byId.get(link.id);
        if (!activity || taken.has(link.id)) continue;
        taken.add(link.id);
        activities.push(activity);
        open.push(link.id);
      }
    }
    activities.sort((p, q) => p.totalFloat - q.totalFloat || p.earlyStart - q.earlyStart);
    return { activities, leastFloat: activities[0]?.totalFloat ?? Infinity };
  });
}
