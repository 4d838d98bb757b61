import type { Activity } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import type { Fix } from '@/lib/schedule/edit';
import type { Defect, Limit } from '../rule';
import { aboutActivity, at } from './about';
import {
  estimateFix,
  hasOneDuration,
  LETTERS,
  PARTS,
  type Part,
  threeOf,
  type Wanted,
} from './estimate-cells';
import { type Reordering, reorderings } from './reorder';
import { amount, called, joined, shown } from './words';
import { daysIn } from './written';

export const SLIP_LIMIT: Limit = {
  title: 'A ten-fold slip is considered where an estimate is at least so many times its neighbour',
  unit: 'times',
  default: 2,
};

/** Days in the unit of the cell they are for. */
function inUnit(list: ActivityList, activity: Activity, part: Part, days: number): string {
  const unit = activity[part].unit ?? list.unit.value;
  return amount(days / daysIn(unit, list.reading), unit);
}

function reasonFor(list: ActivityList, activity: Activity, { how, parts, three }: Reordering): string {
  const values = PARTS.filter((part) => three[part] !== null).map(
    (part) => `${LETTERS[part]} = ${inUnit(list, activity, part, three[part] ?? 0)}`,
  );
  const result = joined(values);
  const letters = joined(parts.map((part) => LETTERS[part]));
  if (how === 'exchange') return `${letters} exchanged: ${result}.`;
  if (how === 'sort') return `The three sorted: ${result}.`;
  const [part = 'likely'] = parts;
  const larger = (activity[part].days ?? 0) > (three[part] ?? 0);
  return `${letters} is ten times too ${larger ? 'large' : 'small'}: ${result}.`;
}

function toFix(list: ActivityList, activity: Activity, way: Reordering): Fix[] {
  const wanted: Wanted = Object.fromEntries(way.parts.map((part) => [part, way.three[part] ?? 0]));
  const fix = estimateFix(list, activity, wanted, reasonFor(list, activity, way));
  return fix ? [fix] : [];
}

/** True where the order of the three can be spoken of: a sign, a gap or a cell not read is another rule's. */
export function isComparable(list: ActivityList, activity: Activity): boolean {
  return !hasOneDuration(activity, list) && PARTS.every((part) => (threeOf(activity)[part] ?? 0) >= 0);
}

/** A finding about two estimates that stand the wrong way round. */
export function orderDefect(
  list: ActivityList,
  activity: Activity,
  message: string,
  swap: readonly [Part, Part],
  least: number,
): Defect {
  const ways = reorderings(threeOf(activity), swap, least);
  const [fix, ...alternatives] = ways.flatMap((way) => toFix(list, activity, way));
  const pointed = swap[swap.indexOf('likely') === 0 ? 1 : 0];
  return {
    about: aboutActivity(list, activity),
    message,
    data: {
      id: called(activity),
      ...Object.fromEntries(PARTS.map((part) => [LETTERS[part], shown(activity[part], list)])),
    },
    ...at(activity, activity[pointed].cell),
    ...(fix ? { fix, alternatives } : {}),
  };
}
