import { usedEstimates } from '@/lib/network';
import type { Activity, Estimate } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { cellAddress } from '@/lib/schedule/cell';
import type { CellEdit, Fix, NetworkChange } from '@/lib/schedule/edit';
import { written } from './written';

export const PARTS = ['optimistic', 'likely', 'pessimistic'] as const;
export type Part = (typeof PARTS)[number];

export const LETTERS: Record<Part, string> = { optimistic: 'a', likely: 'm', pessimistic: 'b' };
const NAMES: Record<Part, string> = {
  optimistic: 'optimistic',
  likely: 'most likely',
  pessimistic: 'pessimistic',
};

/** A cell with what it estimates: one of the three, or all of them in a list with a single duration column. */
export interface EstimateCell {
  readonly parts: readonly Part[];
  /** a, m, b, or `duration`. */
  readonly key: string;
  /** `most likely`, or '' in a list with a single duration column. */
  readonly name: string;
  readonly estimate: Estimate;
}

const isOneCell = ({ optimistic, likely, pessimistic }: Activity) =>
  likely.cell !== null &&
  [optimistic, pessimistic].every(({ cell }) => cell !== null && cell.column === likely.cell?.column);

/** True where one column gives all three: in the whole list, or on the sheet of this activity. */
export const hasOneDuration = (activity: Activity, list: ActivityList) =>
  list.singleDuration || isOneCell(activity);

export function estimateCells(activity: Activity, list: ActivityList): EstimateCell[] {
  if (hasOneDuration(activity, list)) {
    return [{ parts: PARTS, key: 'duration', name: '', estimate: activity.likely }];
  }
  return PARTS.map((part) => ({
    parts: [part],
    key: LETTERS[part],
    name: NAMES[part],
    estimate: activity[part],
  }));
}

/** `most likely duration`, or `duration`. */
export const durationName = (name: string) => (name === '' ? 'duration' : `${name} duration`);

/** The three in working days; null where one gives no number. */
export type Three = Readonly<Record<Part, number | null>>;

export const threeOf = (activity: Activity): Three => ({
  optimistic: readable(activity.optimistic),
  likely: readable(activity.likely),
  pessimistic: readable(activity.pessimistic),
});

/** Working days of an estimate that was read without a doubt. */
export const readable = (estimate: Estimate) => (estimate.problem === null ? estimate.days : null);

/** a ≤ m ≤ b, as far as there are numbers to compare. */
export function inOrder({ optimistic: a, likely: m, pessimistic: b }: Three): boolean {
  const numbers = [a, m, b].filter((value) => value !== null);
  return numbers.every((value, i) => i === 0 || value >= (numbers[i - 1] ?? value));
}

export const takesNoTime = (activity: Activity) =>
  activity.likely.days === 0 && Object.values(usedEstimates(activity)).every((value) => value === 0);

export type Wanted = Readonly<Partial<Record<Part, number>>>;

function changesOf(activity: Activity, wanted: Wanted): NetworkChange[] {
  const likely = wanted.likely ?? activity.likely.days;
  if (likely === null) return [];
  const used = (part: Part) => wanted[part] ?? activity[part].days ?? likely;
  const [optimistic, pessimistic] = [used('optimistic'), used('pessimistic')];
  return [{ kind: 'estimates', activity: activity.index, optimistic, likely, pessimistic }];
}

/** Writes estimates, given in working days, into their cells; null where one has no cell or nothing changes. */
export function estimateFix(
  list: ActivityList,
  activity: Activity,
  wanted: Wanted,
  reason: string,
): Fix | null {
  const edits: CellEdit[] = [];
  for (const { parts, estimate } of estimateCells(activity, list)) {
    const days = parts[0] === undefined ? undefined : wanted[parts[0]];
    if (days === undefined || (days === estimate.days && estimate.problem === null)) continue;
    if (estimate.cell === null) return null;
    const { sheet } = estimate.cell;
    const to = written(days, estimate, activity, list);
    edits.push({ sheet, cell: cellAddress(estimate.cell), from: estimate.content, to });
  }
  return edits.length === 0 ? null : { reason, edits, changes: changesOf(activity, wanted) };
}
