import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, jsonb, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import type { Figures } from '../../lib/contract/submission';
import type { ReadingOptions, RefusedRow, RowCounts } from '../../lib/schedule/activity-list';
import type { Matching } from '../../lib/schedule/field';
import { SUBMISSION_STATES } from '../../lib/schedule/weight';
import { bytea, id, moment, oneOf } from './columns';
import { offices } from './offices';
import { contractorPolicy, isContractor, ofVisibleSubmission, staffPolicy } from './policy';
import { projects } from './projects';
import { users } from './users';

export interface SubmissionRows {
  readonly counts: RowCounts;
  readonly refused: readonly RefusedRow[];
}

/** The figures as they were last computed; a cache. */
export interface SubmissionSummary {
  readonly received: Figures;
  readonly corrected: Figures;
  readonly proposed: Figures | null;
}

/** One revision of a contractor's activity list. */
export const submissions = pgTable(
  'submissions',
  {
    id: id(),
    officeId: uuid('office_id')
      .notNull()
      .references(() => offices.id, { onDelete: 'cascade' }),
    projectId: uuid('project_id').notNull(),
    /** The project's, kept here for the policy and checked by the foreign key. */
    contractorId: uuid('contractor_id').notNull(),
    revision: integer('revision').notNull(),
    status: text('status', { enum: SUBMISSION_STATES }).notNull().default('received'),
    fileName: text('file_name').notNull(),
    fileSha256: text('file_sha256').notNull(),
    fileBytes: integer('file_bytes').notNull(),
    matching: jsonb('matching').$type<Matching>().notNull(),
    reading: jsonb('reading').$type<ReadingOptions>().notNull(),
    rows: jsonb('rows').$type<SubmissionRows>().notNull(),
    summary: jsonb('summary').$type<SubmissionSummary>().notNull(),
    version: integer('version').notNull().default(0),
    receivedBy: uuid('received_by')
      .notNull()
      .references(() => users.id),
    receivedAt: moment('received_at').notNull().defaultNow(),
  },
  (table) => [
    unique('submissions_project_revision').on(table.projectId, table.revision),
    unique('submissions_office_id').on(table.officeId, table.id),
    foreignKey({
      name: 'submissions_project',
      columns: [table.officeId, table.contractorId, table.projectId],
      foreignColumns: [projects.officeId, projects.contractorId, projects.id],
    }),
    index('submissions_office_contractor_project').on(table.officeId, table.contractorId, table.projectId),
    index('submissions_received_by').on(table.receivedBy),
    oneOf('submissions_status', table.status, SUBMISSION_STATES),
    check('submissions_revision', sql`${table.revision} >= 0`),
    check('submissions_sha256', sql`${table.fileSha256} ~ '^[0-9a-f]{64}$'`),
    staffPolicy('submissions', table.officeId),
    contractorPolicy('submissions', table.officeId, isContractor(table.contractorId), 'all'),
  ],
);

/** The bytes as they came. */
export const submissionFiles = pgTable(
  'submission_files',
  {
    submissionId: uuid('submission_id').primaryKey(),
    officeId: uuid('office_id').notNull(),
    bytes: bytea('bytes').notNull(),
  },
  (table) => [
    foreignKey({
      name: 'submission_files_submission',
      columns: [table.officeId, table.submissionId],
      foreignColumns: [submissions.officeId, submissions.id],
    }).onDelete('cascade'),
    staffPolicy('submission_files', table.officeId),
    contractorPolicy('submission_files', table.officeId, ofVisibleSubmission(table.submissionId), 'all'),
  ],
);
