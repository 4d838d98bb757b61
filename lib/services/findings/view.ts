import { countComments } from '@/db/queries/comments';
import { listFindings, type FindingRow } from '@/db/queries/findings';
import { listFixes, type FixRow } from '@/db/queries/fixes';
import type { Tx } from '@/db/scope';
import { renderMessage, ruleById } from '@/lib/audit';
import type { CellEditView, FindingView, FixView } from '@/lib/contract/submission';
import type { CellEdit } from '@/lib/schedule/edit';

/** All findings of a submission, or those of the given ids, in their order. */
export async function findingViews(
  tx: Tx,
  submission: string,
  only?: ReadonlySet<string>,
): Promise<FindingView[]> {
  const findings = await listFindings(tx, submission, only);
  const fixes = byFinding(await listFixes(tx, submission, only));
  const comments = await countComments(tx, submission);
  return findings.map((finding) =>
    toView(finding, fixes.get(finding.id) ?? [], comments.get(finding.id) ?? 0),
  );
}

function toView(finding: FindingRow, fixes: readonly FixRow[], comments: number): FindingView {
  const { id, rule, weight, activityId, activityName, sheet, row, cell, state, origin } = finding;
  const meta = ruleById(rule)?.meta;
  const [first] = fixes;
  const proposed = first?.rank === 0 ? first : null;
  return {
    id,
    rule,
    title: meta?.title ?? rule,
    weight,
    activityId,
    activityName,
    sheet,
    row,
    cell,
    message: renderMessage(rule, finding.messageId, finding.data),
    source: meta?.source ?? '',
    state,
    origin,
    fix: proposed && fixView(proposed),
    alternatives: fixes.filter((fix) => fix !== proposed).map(fixView),
    comments,
  };
}

function fixView({ id, state, reason, edits, effectExpected, effectVariance }: FixRow): FixView {
  return {
    id,
    state,
    reason,
    edits: edits.map(editView),
    effect:
      effectExpected === null || effectVariance === null
        ? null
        : { expectedDuration: effectExpected, variance: effectVariance },
  };
}

export function editView({ sheet, cell, from, to }: CellEdit): CellEditView {
  return { sheet, cell, from, to };
}

export function byFinding(fixes: readonly FixRow[]): Map<string, FixRow[]> {
  const groups = new Map<string, FixRow[]>();
  for (const fix of fixes) {
    const group = groups.get(fix.finding);
    if (group) group.push(fix);
    else groups.set(fix.finding, [fix]);
  }
  return groups;
}
