import { asc, count, desc, eq, inArray, sql } from 'drizzle-orm';
import type { Tx } from '../client';
import { contractors, findings, projects, submissions } from '../schema';

const columns = {
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
};
export type ProjectRow = Awaited<ReturnType<typeof listProjects>>[number];
export type NewProject = Omit<typeof projects.$inferInsert, 'id' | 'version' | 'createdAt'>;
export type ProjectChange = Partial<Omit<NewProject, 'officeId' | 'contractorId' | 'createdBy'>>;

const join = (tx: Tx) =>
  tx.select(columns).from(projects).innerJoin(contractors, eq(contractors.id, projects.contractorId));

export async function listProjects(tx: Tx) {
  return join(tx).orderBy(asc(projects.code), asc(projects.id));
}

export async function findProject(tx: Tx, id: string): Promise<ProjectRow | null> {
  const [row] = await join(tx).where(eq(projects.id, id));
  return row ?? null;
}

/** Null where the office has one with that code. */
export async function insertProject(tx: Tx, values: NewProject): Promise<string | null> {
  const [row] = await tx
    .insert(projects)
    .values(values)
    .onConflictDoNothing({ target: [projects.officeId, projects.code] })
    .returning({ id: projects.id });
  return row?.id ?? null;
}

export async function updateProject(tx: Tx, id: string, change: ProjectChange): Promise<void> {
  await tx
    .update(projects)
    .set({ ...change, version: sql`${projects.version} + 1` })
    .where(eq(projects.id, id));
}

/** The latest revision of each project. */
export async function listLatest(tx: Tx, projectIds: readonly string[]) {
  if (projectIds.length === 0) return [];
  return tx
    .selectDistinctOn([submissions.projectId], {
      id: submissions.id,
      project: submissions.projectId,
      revision: submissions.revision,
      status: submissions.status,
      receivedAt: submissions.receivedAt,
      summary: submissions.summary,
    })
    .from(submissions)
    .where(inArray(submissions.projectId, [...projectIds]))
    .orderBy(submissions.projectId, desc(submissions.revision));
}

/** Findings of those submissions by weight and state. */
export async function countFindings(tx: Tx, submissionIds: readonly string[]) {
  if (submissionIds.length === 0) return [];
  return tx
    .select({
      submission: findings.submissionId,
      weight: findings.weight,
      all: count(),
      open: sql<number>`(count(*) filter (where ${eq(findings.state, 'open')}))::int`,
    })
    .from(findings)
    .where(inArray(findings.submissionId, [...submissionIds]))
    .groupBy(findings.submissionId, findings.weight);
}
