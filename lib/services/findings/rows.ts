import type { NewFinding } from '@/db/queries/findings';
import type { FixValues } from '@/db/queries/fixes';
import { storable } from '@/db/storable';
import type { Finding } from '@/lib/audit';
import { prepareEffects, type Effect } from '@/lib/network';
import type { Fix } from '@/lib/schedule/edit';
import { computed, type ReadState } from '@/lib/services/schedule/state';

export type FixDraft = Pick<FixValues, 'rank' | 'reason' | 'edits' | 'effect_expected' | 'effect_variance'>;

/** A finding as the audit has it, in the columns that say what it is. */
export type FindingDraft = Omit<NewFinding, 'id' | 'origin' | 'position'> & {
  readonly fixes: readonly FixDraft[];
};

/** What the audit of a state found, with the finish effect of each fix; null effects where it is not computable. */
export function draftFindings(state: ReadState): FindingDraft[] {
  const namesByRow = new Map(state.list.activities.map((each) => [`${each.row} ${each.sheet}`, each.name]));
  const effects = computed(state) ? prepareEffects(state.network) : null;
  const drafts = state.findings.map((finding) => ({
    key: finding.key,
    rule: finding.rule,
    weight: finding.weight,
    message_id: finding.message,
    data: finding.data,
    activity_id: finding.activityId,
    activity_name: nameOf(finding, state, namesByRow),
    sheet: finding.sheet,
    row: finding.row,
    cell: finding.cell,
    fixes: fixesOf(finding).map(([rank, fix]) => draftFix(fix, rank, effects?.effect(fix.changes) ?? null)),
  }));
  return asStored(drafts);
}

/** As it will come back from the database, so that the two can be compared. */
function asStored<T>(value: T): T {
  return storable(JSON.parse(JSON.stringify(value)) as T);
}

/** With their ranks: 0 is the one proposed; where none is preferred, the alternatives begin at 1. */
function fixesOf({ fix, alternatives = [] }: Finding): readonly (readonly [number, Fix])[] {
  const others = alternatives.map((other, i) => [i + 1, other] as const);
  return fix ? [[0, fix], ...others] : others;
}

function draftFix({ reason, edits }: Fix, rank: number, effect: Effect | null): FixDraft {
  return {
    rank,
    reason,
    edits,
    effect_expected: effect && effect.expectedDuration,
    effect_variance: effect && effect.variance,
  };
}

/** By its own row first: where two rows bear one ID, each has the name beside it. */
function nameOf(
  { activityId, sheet, row }: Finding,
  { list }: ReadState,
  namesByRow: ReadonlyMap<string, string>,
): string | null {
  const beside = namesByRow.get(`${row} ${sheet}`);
  if (beside !== undefined) return beside === '' ? null : beside;
  if (activityId === null) return null;
  const index = list.indexOf.get(activityId);
  return index === undefined ? null : (list.activities[index]?.name ?? null);
}
