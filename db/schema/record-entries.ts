import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, jsonb, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import { id, moment, oneOf } from './columns';
import { AUDIENCES } from './comments';
import { offices } from './offices';
import { contractorPolicy, ofVisibleSubmission, staffPolicy } from './policy';
import { submissions } from './submissions';
import { users } from './users';

/** Plain JSON. */
export type RecordData = Readonly<Record<string, unknown>>;

/**
 * The append-only trail, one chain a submission and one for what belongs to the office as a whole
 * (no submission). Each entry carries the hash of the one before.
 */
export const recordEntries = pgTable(
  'record_entries',
  {
    id: id(),
    officeId: uuid('office_id')
      .notNull()
      .references(() => offices.id, { onDelete: 'cascade' }),
    submissionId: uuid('submission_id'),
    /** From 1. */
    sequence: integer('sequence').notNull(),
    at: moment('at').notNull(),
    actorId: uuid('actor_id')
      .notNull()
      .references(() => users.id),
    /** As it was then. */
    actorName: text('actor_name').notNull(),
    verb: text('verb').notNull(),
    data: jsonb('data').$type<RecordData>().notNull(),
    /** An entry about a comment inside the office is itself inside. */
    audience: text('audience', { enum: AUDIENCES }).notNull().default('shared'),
    /** '' for the first. */
    previousHash: text('previous_hash').notNull(),
    hash: text('hash').notNull(),
  },
  (table) => [
    // Nulls not distinct: the office's own chain has one entry a sequence too.
    unique('record_entries_sequence')
      .on(table.officeId, table.submissionId, table.sequence)
      .nullsNotDistinct(),
    foreignKey({
      name: 'record_entries_submission',
      columns: [table.officeId, table.submissionId],
      foreignColumns: [submissions.officeId, submissions.id],
    }).onDelete('cascade'),
    index('record_entries_submission_sequence').on(table.submissionId, table.sequence),
    index('record_entries_actor').on(table.actorId),
    oneOf('record_entries_audience', table.audience, AUDIENCES),
    check('record_entries_first', sql`(${table.sequence} = 1) = (${table.previousHash} = '')`),
    staffPolicy('record_entries', table.officeId),
    contractorPolicy(
      'record_entries',
      table.officeId,
      sql`${table.audience} = 'shared' and ${ofVisibleSubmission(table.submissionId)}`,
      'all',
    ),
  ],
);
