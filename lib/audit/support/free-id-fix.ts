import type { Activity } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { cellAddress } from '@/lib/schedule/cell';
import type { Fix, NetworkChange } from '@/lib/schedule/edit';
import type { CellContent } from '@/lib/schedule/sheet';
import { type FreeId, freeIds } from './free-ids';
import { called, joined } from './words';

/** Links that name the ID come to lead from or to the row. */
function linksGained(list: ActivityList, activity: Activity, { awaitedBy }: FreeId): NetworkChange[] {
  return awaitedBy.flatMap((index): NetworkChange[] => {
    const link = list.links[index];
    if (!link) return [];
    const from = link.fromIndex < 0 ? activity.index : link.fromIndex;
    const to = link.toIndex < 0 ? activity.index : link.toIndex;
    if (from < 0 || to < 0) return [];
    return [{ kind: 'add-link', from, to, type: link.type, lag: link.lag }];
  });
}

/** A number where the cell keeps one (its format fills it up with zeros), or the cells around an empty one do. */
function contentOf(list: ActivityList, activity: Activity, id: string): CellContent {
  if (typeof activity.idContent === 'number' && /^\d+$/.test(id)) return Number(id);
  const beside = [list.activities[activity.index - 1], list.activities[activity.index + 1]];
  const known = beside.find((neighbour) => neighbour !== undefined && neighbour.idContent !== null);
  const numeric = activity.idContent === null && typeof known?.idContent === 'number';
  return numeric && String(Number(id)) === id ? Number(id) : id;
}

function placeOf({ id, after, before }: FreeId): string {
  if (after === null && before === null) return `${id} is free.`;
  if (after === null) return `${id} is free, and comes before ${before} in the list's pattern.`;
  if (before !== null) return `${id} is free, and lies between ${after} and ${before}.`;
  return `${id} is free, and follows ${after} in the list's pattern.`;
}

function reasonFor(list: ActivityList, free: FreeId): string {
  const owners = free.awaitedBy.flatMap((index) => {
    const cell = list.linkCells[list.links[index]?.linkCell ?? -1];
    const owner = cell && list.activities[cell.owner];
    return owner ? [called(owner)] : [];
  });
  if (owners.length === 0) return placeOf(free);
  return `${placeOf(free)} The links of ${joined([...new Set(owners)])} name it already.`;
}

/** Gives a row a free ID; nothing where it has no cell for one. */
export function freeIdFix(list: ActivityList, activity: Activity): { fix?: Fix } {
  const free = freeIds(list).get(activity.index);
  if (!free || !activity.idCell) return {};
  const { sheet } = activity.idCell;
  const to = contentOf(list, activity, free.id);
  return {
    fix: {
      reason: reasonFor(list, free),
      edits: [{ sheet, cell: cellAddress(activity.idCell), from: activity.idContent, to }],
      changes: linksGained(list, activity, free),
    },
  };
}
