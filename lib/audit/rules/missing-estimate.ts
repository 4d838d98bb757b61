import type { Activity } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import type { Fix } from '@/lib/schedule/edit';
import type { Defect, Rule } from '../rule';
import { aboutActivity, at, WHOLE_LIST } from '../support/about';
import {
  type EstimateCell,
  estimateCells,
  estimateFix,
  LETTERS,
  PARTS,
  type Wanted,
} from '../support/estimate-cells';
import { THREE_POINTS } from '../support/sources';
import { called, capital, joined, joinedIn } from '../support/words';

const isLikely = ({ parts }: EstimateCell) => parts.includes('likely');

/** A column that a sheet does not have: one finding, not one a row. */
function missingColumns(list: ActivityList): Defect[] {
  const bySheet = new Map<string, Activity>();
  for (const activity of list.activities) {
    if (!bySheet.has(activity.sheet)) bySheet.set(activity.sheet, activity);
  }
  return [...bySheet].flatMap(([sheet, first]): Defect[] => {
    const absent = estimateCells(first, list).filter(({ estimate }) => estimate.cell === null);
    if (absent.length === 0) return [];
    return [
      {
        about: `${sheet}|${absent.map(({ key }) => key).join(' ')}`,
        message: 'column',
        data: { sheet, names: absent.map(({ name }) => name), count: absent.length },
        weight: absent.some(isLikely) ? 'blocks' : 'distorts',
        ...WHOLE_LIST,
        sheet,
      },
    ];
  });
}

/** a = m = b from what is there: the likely estimate, or the only one. */
function levelFix(list: ActivityList, activity: Activity): Fix | null {
  const given = PARTS.filter((part) => activity[part].problem === null && activity[part].days !== null);
  const values = new Set(given.map((part) => activity[part].days));
  const level =
    activity.likely.problem === null ? activity.likely.days : values.size === 1 ? [...values][0] : null;
  if (level === null || level === undefined) return null;
  const empty = PARTS.filter((part) => activity[part].problem === 'empty');
  const wanted: Wanted = Object.fromEntries(empty.map((part) => [part, level]));
  const letters = joined(empty.map((part) => LETTERS[part]));
  return estimateFix(list, activity, wanted, `The office allows ${letters} to be taken as what is given.`);
}

function messageOf(missing: readonly EstimateCell[]): string {
  if (missing.some(({ name }) => name === '')) return 'duration';
  return missing.length === 1 ? 'one' : missing.length === PARTS.length ? 'all' : 'several';
}

function defectOf(list: ActivityList, activity: Activity, mayLevel: boolean): Defect[] {
  const missing = estimateCells(activity, list).filter(
    ({ estimate }) => estimate.problem === 'empty' && estimate.cell !== null,
  );
  const pointed = missing.find(isLikely) ?? missing[0];
  if (!pointed) return [];
  const fix = mayLevel ? levelFix(list, activity) : null;
  return [
    {
      about: aboutActivity(list, activity),
      message: messageOf(missing),
      data: { id: called(activity), names: missing.map(({ name }) => name) },
      weight: missing.some(isLikely) ? 'blocks' : 'distorts',
      ...at(activity, pointed.estimate.cell),
      ...(fix ? { fix } : {}),
    },
  ];
}

export const rule: Rule = {
  id: 'missing-estimate',
  meta: {
    weight: 'blocks',
    title: 'An estimate is missing',
    about:
      'The expected duration of an activity is made from three estimates. Without the most likely one there is none, and the network cannot be computed. Without the optimistic or the pessimistic one it is computed as if that were the most likely one, which leaves out part of the uncertainty.',
    source: THREE_POINTS,
    messages: {
      one: (data) => `${capital(data.id)} has no ${joinedIn(data, 'names')} estimate.`,
      several: (data) => `${capital(data.id)} has no ${joinedIn(data, 'names')} estimates.`,
      all: (data) => `${capital(data.id)} has links, and none of the three estimates.`,
      duration: (data) => `${capital(data.id)} has no duration.`,
      column: (data) =>
        `Sheet “${data.sheet}” has no column for the ${joinedIn(data, 'names')} ${data.count === 1 ? 'estimate' : 'estimates'}.`,
    },
  },
  limits: {
    levelAllowed: { title: 'Offer to fill a gap so that a = m = b (0 no, 1 yes)', unit: '', default: 0 },
  },
  check({ list }, limits) {
    const mayLevel = (limits.levelAllowed ?? 0) > 0;
    return [
      ...missingColumns(list),
      ...list.activities.flatMap((activity) => defectOf(list, activity, mayLevel)),
    ];
  },
};
