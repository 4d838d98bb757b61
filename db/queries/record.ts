import { asc, eq, isNull, sql } from 'drizzle-orm';
import type { Tx } from '../client';
import { recordEntries } from '../schema';

/** The end of a chain, locked until the transaction ends; sequence 0 and '' where it has not begun. */
export async function recordHead(tx: Tx, submissionId: string | null) {
  const { rows } = await tx.execute<{ sequence: number; hash: string }>(
    sql`select sequence, hash from record_head(${submissionId}::uuid)`,
  );
  return rows[0] ?? { sequence: 0, hash: '' };
}

export async function insertRecordEntry(tx: Tx, entry: typeof recordEntries.$inferInsert): Promise<void> {
  await tx.insert(recordEntries).values(entry);
}

const ofChain = (submissionId: string | null) =>
  submissionId === null ? isNull(recordEntries.submissionId) : eq(recordEntries.submissionId, submissionId);

export async function listRecord(tx: Tx, submissionId: string) {
  return tx
    .select({
      sequence: recordEntries.sequence,
      at: recordEntries.at,
      by: recordEntries.actorName,
      actor: recordEntries.actorId,
      verb: recordEntries.verb,
      data: recordEntries.data,
      audience: recordEntries.audience,
      previousHash: recordEntries.previousHash,
      hash: recordEntries.hash,
    })
    .from(recordEntries)
    .where(ofChain(submissionId))
    .orderBy(asc(recordEntries.sequence));
}
