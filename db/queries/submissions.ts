import { and, asc, count, desc, eq, isNull, ne, sql } from 'drizzle-orm';
import type { Tx } from '../client';
import {
  comments,
  contractors,
  corrections,
  projects,
  recordEntries,
  submissionFiles,
  submissions,
  users,
  type SubmissionSummary,
} from '../schema';

const columns = {
  submission: {
    id: submissions.id,
    revision: submissions.revision,
    status: submissions.status,
    fileName: submissions.fileName,
    fileSha256: submissions.fileSha256,
    fileBytes: submissions.fileBytes,
    matching: submissions.matching,
    reading: submissions.reading,
    rows: submissions.rows,
    summary: submissions.summary,
    version: submissions.version,
    receivedAt: submissions.receivedAt,
  },
  project: {
    id: projects.id,
    code: projects.code,
    name: projects.name,
    start: projects.start,
    targetFinish: projects.targetFinish,
    unit: projects.unit,
    hoursPerDay: projects.hoursPerDay,
    workingDays: projects.workingDays,
    holidays: projects.holidays,
  },
  contractor: { id: contractors.id, name: contractors.name },
  receiver: { name: users.name },
};
export type SubmissionRow = Awaited<ReturnType<typeof listSubmissions>>[number];

const join = (tx: Tx) =>
  tx
    .select(columns)
    .from(submissions)
    .innerJoin(projects, eq(projects.id, submissions.projectId))
    .innerJoin(contractors, eq(contractors.id, submissions.contractorId))
    // Somebody whom a scheduler may not see any more still sent it.
    .leftJoin(users, eq(users.id, submissions.receivedBy));

export async function listSubmissions(tx: Tx, projectId: string) {
  return join(tx).where(eq(submissions.projectId, projectId)).orderBy(asc(submissions.revision));
}

export async function findSubmission(tx: Tx, id: string): Promise<SubmissionRow | null> {
  const [row] = await join(tx).where(eq(submissions.id, id));
  return row ?? null;
}

/** Status and version, with the row locked until the transaction ends; null where it is not to be seen. */
export async function lockSubmission(tx: Tx, id: string) {
  const [row] = await tx
    .select({ status: submissions.status, version: submissions.version })
    .from(submissions)
    .where(eq(submissions.id, id))
    .for('update');
  return row ?? null;
}

/** One after another for each project, whoever asks: a scheduler may not lock the project's row itself. */
export async function lockProject(tx: Tx, projectId: string): Promise<void> {
  await tx.execute(sql`select pg_advisory_xact_lock(hashtextextended(${`project ${projectId}`}, 0))`);
}

export async function findLatest(tx: Tx, projectId: string) {
  const [row] = await tx
    .select({
      id: submissions.id,
      revision: submissions.revision,
      fileSha256: submissions.fileSha256,
      receivedAt: submissions.receivedAt,
    })
    .from(submissions)
    .where(eq(submissions.projectId, projectId))
    .orderBy(desc(submissions.revision))
    .limit(1);
  return row ?? null;
}

type NewSubmission = Omit<typeof submissions.$inferInsert, 'status' | 'version'> & {
  id: string;
};

export async function insertSubmission(tx: Tx, values: NewSubmission, bytes: Uint8Array): Promise<void> {
  await tx.insert(submissions).values(values);
  await tx
    .insert(submissionFiles)
    .values({ submissionId: values.id, officeId: values.officeId, bytes: Buffer.from(bytes) });
}

/** Earlier revisions that nobody decided on; gives those that changed. */
export async function supersedeEarlier(tx: Tx, projectId: string, latest: string) {
  return tx
    .update(submissions)
    .set({ status: 'superseded', version: sql`${submissions.version} + 1` })
    .where(
      and(
        eq(submissions.projectId, projectId),
        ne(submissions.id, latest),
        sql`${submissions.status} in ('received', 'under review', 'returned')`,
      ),
    )
    .returning({ id: submissions.id, version: submissions.version });
}

export async function findFile(tx: Tx, submissionId: string): Promise<Uint8Array | null> {
  const [row] = await tx
    .select({ bytes: submissionFiles.bytes })
    .from(submissionFiles)
    .where(eq(submissionFiles.submissionId, submissionId));
  return row?.bytes ?? null;
}

/** Writes what a change to the submission comes to, and gives its new version. */
export async function updateSubmission(
  tx: Tx,
  id: string,
  change: { summary?: SubmissionSummary; status?: SubmissionRow['submission']['status'] },
): Promise<number> {
  const [row] = await tx
    .update(submissions)
    .set({ ...change, version: sql`${submissions.version} + 1` })
    .where(eq(submissions.id, id))
    .returning({ version: submissions.version });
  return row?.version ?? 0;
}

/** What belongs to a submission, as far as the asker may see it. */
export async function countBelongings(tx: Tx, id: string) {
  const one = async (query: PromiseLike<{ count: number }[]>): Promise<number> =>
    (await query)[0]?.count ?? 0;
  return {
    corrections: await one(
      tx
        .select({ count: count() })
        .from(corrections)
        .where(and(eq(corrections.submissionId, id), isNull(corrections.withdrawnAt))),
    ),
    comments: await one(tx.select({ count: count() }).from(comments).where(eq(comments.submissionId, id))),
    record: await one(
      tx.select({ count: count() }).from(recordEntries).where(eq(recordEntries.submissionId, id)),
    ),
  };
}
