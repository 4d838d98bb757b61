import type { Activity, Estimate } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { cellAddress } from '@/lib/schedule/cell';
import type { Fix } from '@/lib/schedule/edit';
import type { Defect } from '../rule';
import { aboutActivity, at } from './about';
import {
  durationName,
  type EstimateCell,
  estimateFix,
  inOrder,
  threeOf,
  type Wanted,
} from './estimate-cells';
import { amount, called } from './words';

const wantedFor = ({ parts }: EstimateCell, days: number): Wanted =>
  Object.fromEntries(parts.map((part) => [part, days]));

function reasonFor({ text, readings }: Estimate, days: number, fits: boolean, only: boolean): string {
  if (readings.length === 1) return `“${text}” can only mean ${amount(days)}.`;
  if (!fits) return `“${text}” read as ${amount(days)}; a ≤ m ≤ b does not hold with it.`;
  return only
    ? `Read as ${amount(days)}: no other reading keeps a ≤ m ≤ b.`
    : `“${text}” read as ${amount(days)}; it can be read otherwise too.`;
}

export interface Doubt {
  /** The finding but for its message. */
  readonly defect: Omit<Defect, 'message'>;
  /** Every way in which the cell can be read. */
  readonly readings: readonly string[];
  /** Those of them that are likely: that fit beside the other estimates, where any does. */
  readonly likely: readonly string[];
}

/**
 * A cell that can be read in no way or in several. The only reading, or the only one that fits beside the
 * other estimates, is the fix; where several do, none is preferred. Each of the others is offered.
 */
export function doubtOf(list: ActivityList, activity: Activity, cell: EstimateCell): Doubt {
  const possible = [...new Set(cell.estimate.readings)].filter((days) => days >= 0);
  const fits = (days: number) => inOrder({ ...threeOf(activity), ...wantedFor(cell, days) });
  const fitting = possible.filter(fits);
  const likely = fitting.length > 0 ? fitting : possible;
  const only = likely.length === 1;
  const inTurn = [...likely, ...possible.filter((days) => !likely.includes(days))];
  const fixes = inTurn.flatMap((days): Fix[] => {
    const reason = reasonFor(cell.estimate, days, fits(days), only);
    const fix = estimateFix(list, activity, wantedFor(cell, days), reason);
    return fix ? [fix] : [];
  });
  const [first, ...others] = fixes;
  const inWords = (readings: readonly number[]) => readings.map((days) => amount(days));
  const defect = {
    about: `${aboutActivity(list, activity)}|${cell.key}`,
    data: {
      id: called(activity),
      name: durationName(cell.name),
      text: cell.estimate.text.trim(),
      cell: cell.estimate.cell ? cellAddress(cell.estimate.cell) : null,
      likely: inWords(likely),
      readings: inWords(possible),
    },
    ...at(activity, cell.estimate.cell),
    ...(only && first ? { fix: first, alternatives: others } : { alternatives: fixes }),
  };
  return { defect, readings: inWords(possible), likely: inWords(likely) };
}
