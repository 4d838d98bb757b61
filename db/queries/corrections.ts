import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import type { CellEdit } from '@/lib/schedule/edit';
import type { Tx } from '../client';
import { corrections, memberships, users } from '../schema';
import { among, inBatches } from './bulk';

export interface NewCorrection {
  readonly id: string;
  readonly sequence: number;
  readonly batch: string;
  readonly fix_id: string | null;
  readonly finding_id: string | null;
  readonly edits: readonly CellEdit[];
}

export type CorrectionRow = Awaited<ReturnType<typeof listCorrections>>[number];

/** Those that hold, in the order in which they are applied. */
export async function listCorrections(tx: Tx, submissionId: string) {
  return tx
    .select({
      id: corrections.id,
      batch: corrections.batch,
      fix: corrections.fixId,
      finding: corrections.findingId,
      edits: corrections.edits,
      by: users.name,
      byUser: corrections.createdBy,
      contractor: memberships.contractorId,
      at: corrections.createdAt,
    })
    .from(corrections)
    .leftJoin(users, eq(users.id, corrections.createdBy))
    .leftJoin(
      memberships,
      and(eq(memberships.userId, corrections.createdBy), eq(memberships.officeId, corrections.officeId)),
    )
    .where(and(eq(corrections.submissionId, submissionId), isNull(corrections.withdrawnAt)))
    .orderBy(asc(corrections.sequence));
}

/** Withdrawn ones count: a number is never used twice. */
export async function nextSequence(tx: Tx, submissionId: string): Promise<number> {
  const [row] = await tx
    .select({ next: sql<number>`coalesce(max(${corrections.sequence}), 0)::int + 1` })
    .from(corrections)
    .where(eq(corrections.submissionId, submissionId));
  return row?.next ?? 1;
}

export async function insertCorrections(
  tx: Tx,
  of: { officeId: string; submissionId: string; userId: string },
  rows: readonly NewCorrection[],
): Promise<void> {
  await inBatches(
    tx,
    rows,
    (json) => sql`
      insert into corrections (id, office_id, submission_id, sequence, batch, fix_id, finding_id, edits, created_by)
      select r.id, ${of.officeId}, ${of.submissionId}, r.sequence, r.batch, r.fix_id, r.finding_id, r.edits, ${of.userId}
      from json_to_recordset(${json})
        as r(id uuid, sequence int, batch uuid, fix_id uuid, finding_id uuid, edits jsonb)`,
  );
}

export async function withdrawCorrections(
  tx: Tx,
  submissionId: string,
  ids: readonly string[],
  userId: string,
): Promise<void> {
  await tx
    .update(corrections)
    .set({ withdrawnBy: userId, withdrawnAt: sql`now()` })
    .where(
      and(
        eq(corrections.submissionId, submissionId),
        among(corrections.id, ids),
        isNull(corrections.withdrawnAt),
      ),
    );
}
