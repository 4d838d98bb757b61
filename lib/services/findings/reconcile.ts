import { isDeepStrictEqual } from 'node:util';
import type { FindingChange, FindingRow, NewFinding } from '@/db/queries/findings';
import type { FixRow, FixValues } from '@/db/queries/fixes';
import type { FindingState } from '@/lib/schedule/weight';
import type { FindingDraft } from './rows';
import { byFinding } from './view';
import { reconcileFixes } from './reconcile-fixes';

export interface Kept {
  readonly findings: readonly FindingRow[];
  readonly fixes: readonly FixRow[];
  /** Fixes of the corrections that hold. */
  readonly adopted: ReadonlySet<string>;
  /** Findings that may not be erased: something was said or done about them. */
  readonly needed: ReadonlySet<string>;
}

/** What has to be written so that the kept findings say what the audit now finds. */
export interface Reconciliation {
  readonly findings: {
    readonly insert: NewFinding[];
    readonly update: FindingChange[];
    readonly erase: string[];
  };
  readonly fixes: { readonly insert: FixValues[]; readonly update: FixValues[]; readonly erase: string[] };
  /** Findings that say something else than before, new ones included, erased ones not. */
  readonly changed: Set<string>;
  /** Keys of the findings whose proposed fix is declined. */
  readonly declined: Set<string>;
}

/**
 * Compares by key: a kept finding that is found no more is corrected, one that is back is open, one that is
 * new was made by a correction, and is erased once it vanishes unless it is needed.
 */
export function reconcile(kept: Kept, drafts: readonly FindingDraft[]): Reconciliation {
  const result: Reconciliation = {
    findings: { insert: [], update: [], erase: [] },
    fixes: { insert: [], update: [], erase: [] },
    changed: new Set(),
    declined: new Set(),
  };
  const draftByKey = new Map(drafts.map((draft) => [draft.key, draft]));
  const fixes = byFinding(kept.fixes);
  for (const finding of kept.findings) {
    const draft = draftByKey.get(finding.key);
    draftByKey.delete(finding.key);
    if (!draft && finding.origin === 'correction' && !kept.needed.has(finding.id)) {
      result.findings.erase.push(finding.id);
      continue;
    }
    reconcileFinding(finding, draft, result);
    reconcileFixes(finding, fixes.get(finding.id) ?? [], draft, kept.adopted, result);
  }
  const last = kept.findings.reduce((highest, { position }) => Math.max(highest, position), -1);
  [...draftByKey.values()].forEach((draft, index) =>
    addFinding(draft, last + 1 + index, 'correction', result),
  );
  return result;
}

/** The first audit: everything found is new. */
export function firstFindings(drafts: readonly FindingDraft[]) {
  const result = { findings: { insert: [] as NewFinding[] }, fixes: { insert: [] as FixValues[] } };
  drafts.forEach((draft, position) => addFinding(draft, position, 'received', result));
  return { findings: result.findings.insert, fixes: result.fixes.insert };
}

function addFinding(
  { fixes, ...draft }: FindingDraft,
  position: number,
  origin: NewFinding['origin'],
  into: { findings: { insert: NewFinding[] }; fixes: { insert: FixValues[] }; changed?: Set<string> },
): void {
  const id = crypto.randomUUID();
  into.findings.insert.push({ ...draft, id, origin, position });
  for (const fix of fixes) {
    into.fixes.insert.push({ ...fix, id: crypto.randomUUID(), finding_id: id, state: 'proposed' });
  }
  into.changed?.add(id);
}

function reconcileFinding(finding: FindingRow, draft: FindingDraft | undefined, into: Reconciliation): void {
  const state = stateOf(finding.state, draft !== undefined);
  const before = toChange(finding);
  const after: FindingChange = draft
    ? {
        id: finding.id,
        state,
        weight: draft.weight,
        message_id: draft.message_id,
        data: draft.data,
        activity_name: draft.activity_name,
        row: draft.row,
        cell: draft.cell,
      }
    : { ...before, state };
  if (isDeepStrictEqual(before, after)) return;
  into.findings.update.push(after);
  into.changed.add(finding.id);
}

function stateOf(state: FindingState, isFound: boolean): FindingState {
  if (!isFound) return 'corrected';
  return state === 'corrected' ? 'open' : state;
}

function toChange({
  id,
  state,
  weight,
  messageId,
  data,
  activityName,
  row,
  cell,
}: FindingRow): FindingChange {
  return { id, state, weight, message_id: messageId, data, activity_name: activityName, row, cell };
}
