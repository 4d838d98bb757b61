import type { CorrectionRow } from '@/db/queries/corrections';
import type { FindingRow } from '@/db/queries/findings';
import type { FixRow } from '@/db/queries/fixes';
import { replay } from '@/lib/corrections';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { parseAddress } from '@/lib/schedule/cell';
import type { Sheet } from '@/lib/schedule/sheet';
import { SOMEBODY } from '@/lib/services/submissions/view';
import { toEvents } from '@/lib/services/schedule/load';
import type { ListedChange } from '@/parsers/workbook';

interface Sources {
  readonly received: readonly Sheet[];
  /** As corrected: the IDs that the receiver will find in the file. */
  readonly list: ActivityList;
  readonly corrections: readonly CorrectionRow[];
  readonly findings: readonly FindingRow[];
  readonly fixes: readonly FixRow[];
}

/** What changed and why, a line a cell edit, in the order of adoption; what no longer applies is left out. */
export function listedChanges({ received, list, corrections, findings, fixes }: Sources): ListedChange[] {
  const activityAt = activitiesByRow(list);
  const ruleOf = new Map(findings.map(({ id, rule }) => [id, rule]));
  const reasonOf = new Map(fixes.map(({ id, reason }) => [id, reason]));
  const byId = new Map(corrections.map((correction) => [correction.id, correction]));
  return replay(received, toEvents(corrections)).events.flatMap(({ id, edits }) => {
    const correction = byId.get(id);
    if (!correction) return [];
    const rule = (correction.finding && ruleOf.get(correction.finding)) ?? '';
    const reason = (correction.fix && reasonOf.get(correction.fix)) ?? 'Changed by hand.';
    return edits
      .filter(({ from, to }) => from !== to)
      .map(({ sheet, cell, from, to }) => ({
        sheet,
        cell,
        activity: activityAt.get(rowKey(sheet, parseAddress(cell)?.row ?? 0)) ?? '',
        from,
        to,
        rule,
        reason,
        by: correction.by ?? SOMEBODY,
        at: correction.at.toISOString(),
      }));
  });
}

const rowKey = (sheet: string, row: number): string => `${row} ${sheet}`;

/** An activity may go on over several rows, each with a link. */
function activitiesByRow({ activities, linkCells }: ActivityList): Map<string, string> {
  const byRow = new Map<string, string>();
  for (const { sheet, row, id } of activities) byRow.set(rowKey(sheet, row), id);
  for (const { owner, cell } of linkCells) {
    byRow.set(rowKey(cell.sheet, cell.row), activities[owner]?.id ?? '');
  }
  return byRow;
}
