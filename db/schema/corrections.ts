import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, jsonb, pgTable, unique, uuid } from 'drizzle-orm/pg-core';
import type { CellEdit } from '../../lib/schedule/edit';
import { id, moment } from './columns';
import { findings } from './findings';
import { fixes } from './fixes';
import { contractorPolicy, ofVisibleSubmission, staffPolicy } from './policy';
import { submissions } from './submissions';
import { users } from './users';

/** Events, applied in the order of `sequence`. Undoing withdraws one; nothing is erased. */
export const corrections = pgTable(
  'corrections',
  {
    id: id(),
    officeId: uuid('office_id').notNull(),
    submissionId: uuid('submission_id').notNull(),
    sequence: integer('sequence').notNull(),
    /** What was adopted in one step bears one batch. */
    batch: uuid('batch').notNull(),
    fixId: uuid('fix_id').references(() => fixes.id, { onDelete: 'set null' }),
    findingId: uuid('finding_id').references(() => findings.id, { onDelete: 'set null' }),
    edits: jsonb('edits').$type<readonly CellEdit[]>().notNull(),
    createdBy: uuid('created_by')
      .notNull()
      .references(() => users.id),
    createdAt: moment('created_at').notNull().defaultNow(),
    withdrawnBy: uuid('withdrawn_by').references(() => users.id),
    withdrawnAt: moment('withdrawn_at'),
  },
  (table) => [
    unique('corrections_submission_sequence').on(table.submissionId, table.sequence),
    foreignKey({
      name: 'corrections_submission',
      columns: [table.officeId, table.submissionId],
      foreignColumns: [submissions.officeId, submissions.id],
    }).onDelete('cascade'),
    index('corrections_batch').on(table.submissionId, table.batch),
    index('corrections_fix').on(table.fixId),
    index('corrections_finding').on(table.findingId),
    index('corrections_created_by').on(table.createdBy),
    index('corrections_withdrawn_by').on(table.withdrawnBy),
    check('corrections_withdrawn', sql`(${table.withdrawnBy} is null) = (${table.withdrawnAt} is null)`),
    staffPolicy('corrections', table.officeId),
    contractorPolicy('corrections', table.officeId, ofVisibleSubmission(table.submissionId), 'all'),
  ],
);
