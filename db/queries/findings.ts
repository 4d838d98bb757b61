import { and, asc, eq, inArray, sql } from 'drizzle-orm';
import type { MessageData } from '@/lib/audit/rule';
import type { FindingState, Weight } from '@/lib/schedule/weight';
import type { Tx } from '../client';
import { findings, fixes, type FindingOrigin } from '../schema';
import { among, inBatches } from './bulk';

export interface NewFinding {
  readonly id: string;
  readonly key: string;
  readonly rule: string;
  readonly weight: Weight;
  readonly message_id: string;
  readonly data: MessageData;
  readonly activity_id: string | null;
  readonly activity_name: string | null;
  readonly sheet: string | null;
  readonly row: number | null;
  readonly cell: string | null;
  readonly origin: FindingOrigin;
  readonly position: number;
}

export type FindingRow = Awaited<ReturnType<typeof listFindings>>[number];

const columns = {
  id: findings.id,
  key: findings.key,
  rule: findings.rule,
  weight: findings.weight,
  messageId: findings.messageId,
  data: findings.data,
  activityId: findings.activityId,
  activityName: findings.activityName,
  sheet: findings.sheet,
  row: findings.row,
  cell: findings.cell,
  state: findings.state,
  origin: findings.origin,
  position: findings.position,
};

export async function insertFindings(
  tx: Tx,
  officeId: string,
  submissionId: string,
  rows: readonly NewFinding[],
): Promise<void> {
  await inBatches(
    tx,
    rows,
    (json) => sql`
      insert into findings (id, office_id, submission_id, key, rule, weight, message_id, data,
                            activity_id, activity_name, sheet, row, cell, origin, position)
      select r.id, ${officeId}, ${submissionId}, r.key, r.rule, r.weight, r.message_id, r.data,
             r.activity_id, r.activity_name, r.sheet, r.row, r.cell, r.origin, r.position
      from json_to_recordset(${json})
        as r(id uuid, key text, rule text, weight text, message_id text, data jsonb, activity_id text,
             activity_name text, sheet text, row int, cell text, origin text, position int)`,
  );
}

/** All of a submission, or of these ids, in their order. */
export async function listFindings(tx: Tx, submissionId: string, only?: Iterable<string>) {
  return tx
    .select(columns)
    .from(findings)
    .where(and(eq(findings.submissionId, submissionId), only && among(findings.id, only)))
    .orderBy(asc(findings.position), asc(findings.id));
}

export async function findFinding(tx: Tx, submissionId: string, id: string) {
  const [row] = await tx
    .select(columns)
    .from(findings)
    .where(and(eq(findings.submissionId, submissionId), eq(findings.id, id)));
  return row ?? null;
}

export interface FindingChange {
  readonly id: string;
  readonly state: FindingState;
  readonly weight: Weight;
  readonly message_id: string;
  readonly data: MessageData;
  readonly activity_name: string | null;
  readonly row: number | null;
  readonly cell: string | null;
}

/**
 * A finding seen again may say something else: its state, sentence and place are written anew. Joined by the
 * id alone: with the submission named as well, and before any statistics, the server compares each with each.
 */
export async function updateFindings(tx: Tx, rows: readonly FindingChange[]): Promise<void> {
  await inBatches(
    tx,
    rows,
    (json) => sql`
      update findings f
      set state = r.state, weight = r.weight, message_id = r.message_id, data = r.data,
          activity_name = r.activity_name, row = r.row, cell = r.cell
      from json_to_recordset(${json})
        as r(id uuid, state text, weight text, message_id text, data jsonb, activity_name text, row int, cell text)
      where f.id = r.id`,
  );
}

/**
 * Their fixes go first: a withdrawn correction points at both, and letting go of one of the two while the other
 * has just gone in the same statement is refused.
 */
export async function deleteFindings(tx: Tx, submissionId: string, ids: readonly string[]): Promise<void> {
  if (ids.length === 0) return;
  await tx.delete(fixes).where(and(eq(fixes.submissionId, submissionId), among(fixes.findingId, ids)));
  await tx.delete(findings).where(and(eq(findings.submissionId, submissionId), among(findings.id, ids)));
}

/** Ids of the findings with these keys, in their order. */
export async function listFindingIds(
  tx: Tx,
  submissionId: string,
  keys: readonly string[],
): Promise<string[]> {
  if (keys.length === 0) return [];
  const rows = await tx
    .select({ id: findings.id })
    .from(findings)
    .where(and(eq(findings.submissionId, submissionId), inArray(findings.key, [...keys])))
    .orderBy(asc(findings.position), asc(findings.id));
  return rows.map((row) => row.id);
}
