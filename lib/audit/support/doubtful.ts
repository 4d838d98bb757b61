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

function reasonFor({ text, readings }: Estimate, days: number, only: boolean): string {
  if (readings.length === 1) return `“${text}” can only mean ${amount(days)}.`;
  return only
    ? `Read as ${amount(days)}: no other reading keeps a ≤ m ≤ b.`
    : `“${text}” read as ${amount(days)}; it can be read otherwise too.`;
}

/**
 * A cell that can be read in no way or in several: the only reading, or the only one that fits beside the
 * other estimates, is the fix; where several do, each is offered and none is preferred.
 */
export function doubtfulDefect(
  list: ActivityList,
  activity: Activity,
  cell: EstimateCell,
): Omit<Defect, 'message'> & { readonly readings: readonly string[] } {
  const possible = [...new Set(cell.estimate.readings)].filter((days) => days >= 0);
  const fitted = possible.filter((days) => inOrder({ ...threeOf(activity), ...wantedFor(cell, days) }));
  const offered = fitted.length > 0 ? fitted : possible;
  const only = offered.length === 1;
  const fixes = offered.flatMap((days): Fix[] => {
    const reason = reasonFor(cell.estimate, days, only);
    const fix = estimateFix(list, activity, wantedFor(cell, days), reason);
    return fix ? [fix] : [];
  });
  const [first, ...others] = fixes;
  const readings = offered.map((days) => amount(days));
  return {
    about: `${aboutActivity(list, activity)}|${cell.key}`,
    data: {
      id: called(activity),
      name: durationName(cell.name),
      text: cell.estimate.text.trim(),
      cell: cell.estimate.cell ? cellAddress(cell.estimate.cell) : null,
      readings,
    },
    ...at(activity, cell.estimate.cell),
    ...(only && first ? { fix: first, alternatives: others } : { alternatives: fixes }),
    readings,
  };
}
