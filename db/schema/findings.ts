import { sql } from 'drizzle-orm';
import { foreignKey, integer, jsonb, pgTable, text, unique, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import type { MessageData } from '../../lib/audit/rule';
import { FINDING_STATES, WEIGHTS, type Weight } from '../../lib/schedule/weight';
import { id, oneOf } from './columns';
import { contractorPolicy, ofVisibleSubmission, staffPolicy } from './policy';
import { submissions } from './submissions';

/** Whether the list had it when it came, or a correction made it. */
export const FINDING_ORIGINS = ['received', 'correction'] as const;
export type FindingOrigin = (typeof FINDING_ORIGINS)[number];

const weights = Object.keys(WEIGHTS) as [Weight, ...Weight[]];

export const findings = pgTable(
  'findings',
  {
    id: id(),
    officeId: uuid('office_id').notNull(),
    submissionId: uuid('submission_id').notNull(),
    /** Rule + what it is about: the same in every revision. */
    key: text('key').notNull(),
    rule: text('rule').notNull(),
    weight: text('weight', { enum: weights }).notNull(),
    messageId: text('message_id').notNull(),
    data: jsonb('data').$type<MessageData>().notNull(),
    activityId: text('activity_id'),
    activityName: text('activity_name'),
    sheet: text('sheet'),
    row: integer('row'),
    cell: text('cell'),
    state: text('state', { enum: FINDING_STATES }).notNull().default('open'),
    origin: text('origin', { enum: FINDING_ORIGINS }).notNull().default('received'),
    /** Where it stands among the submission's findings, from 0. */
    position: integer('position').notNull(),
  },
  (table) => [
    // By its digest: a key that names many activities is longer than an index entry may be.
    uniqueIndex('findings_submission_key').on(table.submissionId, sql`md5(${table.key})`),
    // Serves the listing, in order, and the counts.
    unique('findings_submission_position').on(table.submissionId, table.position, table.id),
    foreignKey({
      name: 'findings_submission',
      columns: [table.officeId, table.submissionId],
      foreignColumns: [submissions.officeId, submissions.id],
    }).onDelete('cascade'),
    oneOf('findings_weight', table.weight, weights),
    oneOf('findings_state', table.state, FINDING_STATES),
    oneOf('findings_origin', table.origin, FINDING_ORIGINS),
    staffPolicy('findings', table.officeId),
    contractorPolicy('findings', table.officeId, ofVisibleSubmission(table.submissionId), 'all'),
  ],
);
