import { sql } from 'drizzle-orm';
import { foreignKey, index, integer, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { id, moment, oneOf } from './columns';
import { findings } from './findings';
import { contractorPolicy, ofVisibleSubmission, staffPolicy } from './policy';
import { submissions } from './submissions';
import { users } from './users';

/** Inside the office, or shared with the contractor. */
export const AUDIENCES = ['inside', 'shared'] as const;
export type Audience = (typeof AUDIENCES)[number];

export const comments = pgTable(
  'comments',
  {
    id: id(),
    officeId: uuid('office_id').notNull(),
    submissionId: uuid('submission_id').notNull(),
    findingId: uuid('finding_id').references(() => findings.id, { onDelete: 'set null' }),
    /** A sheet's row, where it is not about a finding. */
    sheet: text('sheet'),
    row: integer('row'),
    audience: text('audience', { enum: AUDIENCES }).notNull(),
    body: text('body').notNull(),
    authorId: uuid('author_id')
      .notNull()
      .references(() => users.id),
    createdAt: moment('created_at').notNull().defaultNow(),
  },
  (table) => [
    foreignKey({
      name: 'comments_submission',
      columns: [table.officeId, table.submissionId],
      foreignColumns: [submissions.officeId, submissions.id],
    }).onDelete('cascade'),
    index('comments_submission_created').on(table.submissionId, table.createdAt),
    index('comments_finding').on(table.findingId),
    index('comments_author').on(table.authorId),
    oneOf('comments_audience', table.audience, AUDIENCES),
    staffPolicy('comments', table.officeId),
    contractorPolicy(
      'comments',
      table.officeId,
      sql`${table.audience} = 'shared' and ${ofVisibleSubmission(table.submissionId)}`,
      'all',
    ),
  ],
);
