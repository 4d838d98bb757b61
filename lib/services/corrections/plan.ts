import {
  checkHandEdits,
  applyCorrections,
  composeAdoption,
  type HandEdit,
  type Skipped,
} from '@/lib/corrections';
import { Conflict, Invalid } from '@/lib/contract/errors';
import type { CellEdit } from '@/lib/schedule/edit';
import type { FindingState } from '@/lib/schedule/weight';
import type { Sheet } from '@/lib/schedule/sheet';
import type { Standing } from './standing';

export interface PlannedCorrection {
  readonly fix: string | null;
  readonly finding: string | null;
  readonly edits: readonly CellEdit[];
}

export interface Plan {
  readonly corrections: readonly PlannedCorrection[];
  readonly skipped: readonly Skipped[];
  /** With all of it. */
  readonly sheets: readonly Sheet[];
}

/** Adopts fixes: what cannot be adopted any more is skipped, and refused where nothing is left. */
export function planAdoption({ findings, fixes, corrected }: Standing, wanted: readonly string[]): Plan {
  const byId = new Map(fixes.map((fix) => [fix.id, fix]));
  const stateOf = new Map(findings.map(({ id, state }) => [id, state]));
  const skipped: Skipped[] = [];
  const chosen = new Map<string, string>();
  const adoptable: { id: string; edits: readonly CellEdit[] }[] = [];
  [...new Set(wanted)].forEach((id, index) => {
    const fix = byId.get(id);
    if (!fix) throw Invalid.field(`fixes.${index}`, 'There is no such fix in this submission.');
    const reason = unadoptable(stateOf.get(fix.finding), chosen.has(fix.finding));
    if (reason) return skipped.push({ id, reason });
    chosen.set(fix.finding, id);
    return adoptable.push({ id, edits: fix.edits });
  });
  const adoption = composeAdoption(corrected.sheets, adoptable);
  skipped.push(...adoption.skipped);
  if (adoption.adopted.length === 0) {
    throw new Conflict(skipped[0]?.reason ?? 'None of these fixes can be adopted.', {
      members: { skipped: skipped.map(({ id, reason }) => ({ fix: id, reason })) },
    });
  }
  const corrections = adoption.adopted.map(({ id, edits }) => {
    return { fix: id, finding: byId.get(id)?.finding ?? null, edits };
  });
  return { corrections, skipped, sheets: adoption.sheets };
}

function unadoptable(finding: FindingState | undefined, chosen: boolean): string | null {
  if (finding === 'corrected') return 'This finding is corrected already.';
  return chosen ? 'Another fix of the same finding is adopted with it.' : null;
}

/** Edits by hand: all of them or none. */
export function planEdits(
  { findings, corrected }: Standing,
  wanted: readonly HandEdit[],
  finding: string | undefined,
): Plan {
  if (finding && !findings.some(({ id }) => id === finding)) {
    throw Invalid.field('finding', 'There is no such finding in this submission.');
  }
  const { edits, problems } = checkHandEdits(corrected.sheets, wanted);
  const [first] = problems;
  if (first) throw new Invalid(first.message, { errors: problems });
  return {
    corrections: [{ fix: null, finding: finding ?? null, edits }],
    skipped: [],
    sheets: applyCorrections(corrected.sheets, edits),
  };
}
