import type { Activity } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { cellAddress, type CellRef } from '@/lib/schedule/cell';
import type { Defect } from '../rule';

/** True for a row that bears an ID which an earlier row bears already. */
export const isLaterBearer = (list: ActivityList, activity: Activity) =>
  activity.id !== '' && list.indexOf.get(activity.id) !== activity.index;

/** True where a link can name the activity: it bears an ID, and is the first to do so. */
export const canBeNamed = (list: ActivityList, activity: Activity) =>
  activity.id !== '' && !isLaterBearer(list, activity);

/** What a finding about an activity is about, the same from revision to revision while ID and name stay. */
export function aboutActivity(list: ActivityList, activity: Activity): string {
  return canBeNamed(list, activity) ? activity.id : `${activity.id}|${activity.name.trim()}`;
}

export type Place = Pick<Defect, 'activityId' | 'sheet' | 'row' | 'cell'>;

/** Where a finding about an activity points; without a cell, at its row. */
export function at(activity: Activity, cell: CellRef | null): Place {
  return {
    activityId: activity.id === '' ? null : activity.id,
    sheet: cell?.sheet ?? activity.sheet,
    row: cell?.row ?? activity.row,
    cell: cell === null ? null : cellAddress(cell),
  };
}

/** A finding about the list as a whole. */
export const WHOLE_LIST: Place = { activityId: null, sheet: null, row: null, cell: null };
