import { isDeepStrictEqual } from 'node:util';
import type { FindingRow } from '@/db/queries/findings';
import type { FixRow, FixValues } from '@/db/queries/fixes';
import type { FixState } from '@/lib/schedule/weight';
import type { Reconciliation } from './reconcile';
import type { FindingDraft } from './rows';

/** Brings the fixes of a kept finding up to what the audit proposes now, rank by rank. */
export function reconcileFixes(
  finding: FindingRow,
  fixes: readonly FixRow[],
  draft: FindingDraft | undefined,
  adopted: ReadonlySet<string>,
  into: Reconciliation,
): void {
  if (!draft) return keepFixes(finding, fixes, adopted, into);
  const byRank = new Map(fixes.map((fix) => [fix.rank, fix]));
  for (const wanted of draft.fixes) {
    const kept = byRank.get(wanted.rank);
    byRank.delete(wanted.rank);
    if (!kept) {
      into.fixes.insert.push({
        ...wanted,
        id: crypto.randomUUID(),
        finding_id: finding.id,
        state: 'proposed',
      });
      into.changed.add(finding.id);
      continue;
    }
    // The defect is there, so whatever was adopted did not mend it, or was undone.
    const state: FixState = kept.state === 'declined' ? 'declined' : 'proposed';
    if (state === 'declined' && wanted.rank === 0) into.declined.add(finding.key);
    update(kept, { ...wanted, id: kept.id, finding_id: finding.id, state }, into);
  }
  for (const surplus of byRank.values()) {
    if (adopted.has(surplus.id)) continue;
    into.fixes.erase.push(surplus.id);
    into.changed.add(finding.id);
  }
}

/** The fixes of a finding that is mended stay as they were, but for whether they are adopted. */
function keepFixes(
  finding: FindingRow,
  fixes: readonly FixRow[],
  adopted: ReadonlySet<string>,
  into: Reconciliation,
): void {
  for (const fix of fixes) {
    const state: FixState = adopted.has(fix.id)
      ? 'adopted'
      : fix.state === 'adopted'
        ? 'proposed'
        : fix.state;
    update(fix, { ...toValues(fix), state }, into);
    if (state === 'declined' && fix.rank === 0) into.declined.add(finding.key);
  }
}

function update(kept: FixRow, wanted: FixValues, into: Reconciliation): void {
  if (isDeepStrictEqual(toValues(kept), wanted)) return;
  into.fixes.update.push(wanted);
  into.changed.add(kept.finding);
}

export function toValues(fix: FixRow): FixValues {
  return {
    rank: fix.rank,
    reason: fix.reason,
    edits: fix.edits,
    effect_expected: fix.effectExpected,
    effect_variance: fix.effectVariance,
    id: fix.id,
    finding_id: fix.finding,
    state: fix.state,
  };
}
