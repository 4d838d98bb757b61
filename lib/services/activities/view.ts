import type { ActivityData } from '@/db/schema/activities';
import type { Activity, LinkCell } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { cellAddress, type CellRef } from '@/lib/schedule/cell';

export interface ListedActivity {
  readonly id: string;
  readonly name: string;
  readonly sheet: string;
  readonly row: number;
  readonly data: ActivityData;
}

/** The activities of a list, each with its predecessors as written and the cells it was read from. */
export function listedActivities(list: ActivityList): ListedActivity[] {
  const predecessors: ActivityData['predecessors'][number][][] = list.activities.map(() => []);
  for (const { toIndex, from: id, type, lag } of list.links) predecessors[toIndex]?.push({ id, type, lag });
  const linkCells: LinkCell[][] = list.activities.map(() => []);
  for (const cell of list.linkCells) linkCells[cell.owner]?.push(cell);
  return list.activities.map((activity, index) => ({
    id: activity.id,
    name: activity.name,
    sheet: activity.sheet,
    row: activity.row,
    data: {
      optimistic: activity.optimistic.days,
      likely: activity.likely.days,
      pessimistic: activity.pessimistic.days,
      predecessors: predecessors[index] ?? [],
      cells: cellsOf(activity, linkCells[index] ?? []),
    },
  }));
}

function cellsOf(activity: Activity, linkCells: readonly LinkCell[]): Record<string, string> {
  const cells: Record<string, string> = {};
  const put = (field: string, cell: CellRef | null): void => {
    if (cell) cells[field] = cells[field] ? `${cells[field]}, ${cellAddress(cell)}` : cellAddress(cell);
  };
  put('id', activity.idCell);
  put('name', activity.nameCell);
  put('optimistic', activity.optimistic.cell);
  put('likely', activity.likely.cell);
  put('pessimistic', activity.pessimistic.cell);
  for (const { gives, cell } of linkCells) put(gives, cell);
  return cells;
}
