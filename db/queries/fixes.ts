import { and, asc, eq, sql } from 'drizzle-orm';
import type { CellEdit } from '@/lib/schedule/edit';
import type { FixState } from '@/lib/schedule/weight';
import type { Tx } from '../client';
import { findings, fixes } from '../schema';
import { among, inBatches } from './bulk';

/** As a statement takes it: all that can change of a fix, and what it hangs from. */
export interface FixValues {
  readonly id: string;
  readonly finding_id: string;
  readonly rank: number;
  readonly reason: string;
  readonly edits: readonly CellEdit[];
  readonly effect_expected: number | null;
  readonly effect_variance: number | null;
  readonly state: FixState;
}

export type FixRow = Awaited<ReturnType<typeof listFixes>>[number];

const record = sql.raw(
  'r(id uuid, finding_id uuid, rank int, reason text, edits jsonb, effect_expected float8, effect_variance float8, state text)',
);

export async function insertFixes(
  tx: Tx,
  officeId: string,
  submissionId: string,
  rows: readonly FixValues[],
): Promise<void> {
  await inBatches(
    tx,
    rows,
    (json) => sql`
      insert into fixes (id, office_id, submission_id, finding_id, rank, reason, edits, effect_expected, effect_variance, state)
      select r.id, ${officeId}, ${submissionId}, r.finding_id, r.rank, r.reason, r.edits, r.effect_expected,
             r.effect_variance, r.state
      from json_to_recordset(${json}) as ${record}`,
  );
}

/** Joined by the id alone, as the findings are. */
export async function updateFixes(tx: Tx, rows: readonly FixValues[]): Promise<void> {
  await inBatches(
    tx,
    rows,
    (json) => sql`
      update fixes f
      set reason = r.reason, edits = r.edits, effect_expected = r.effect_expected,
          effect_variance = r.effect_variance, state = r.state
      from json_to_recordset(${json}) as ${record}
      where f.id = r.id`,
  );
}

/** All of a submission, or of these findings, by finding and rank. */
export async function listFixes(tx: Tx, submissionId: string, ofFindings?: Iterable<string>) {
  return tx
    .select({
      id: fixes.id,
      finding: fixes.findingId,
      rank: fixes.rank,
      reason: fixes.reason,
      edits: fixes.edits,
      effectExpected: fixes.effectExpected,
      effectVariance: fixes.effectVariance,
      state: fixes.state,
    })
    .from(fixes)
    .where(and(eq(fixes.submissionId, submissionId), ofFindings && among(fixes.findingId, ofFindings)))
    .orderBy(asc(fixes.findingId), asc(fixes.rank));
}

export async function deleteFixes(tx: Tx, submissionId: string, ids: readonly string[]): Promise<void> {
  if (ids.length === 0) return;
  await tx.delete(fixes).where(and(eq(fixes.submissionId, submissionId), among(fixes.id, ids)));
}

/** Keys of the findings whose proposed fix was declined. */
export async function listDeclined(tx: Tx, submissionId: string): Promise<Set<string>> {
  const rows = await tx
    .select({ key: findings.key })
    .from(fixes)
    .innerJoin(findings, eq(findings.id, fixes.findingId))
    .where(and(eq(fixes.submissionId, submissionId), eq(fixes.rank, 0), eq(fixes.state, 'declined')));
  return new Set(rows.map((row) => row.key));
}
