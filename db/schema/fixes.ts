import { sql } from 'drizzle-orm';
import {
  check,
  doublePrecision,
  foreignKey,
  index,
  integer,
  jsonb,
  pgTable,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';
import type { CellEdit } from '../../lib/schedule/edit';
import { FIX_STATES } from '../../lib/schedule/weight';
import { id, oneOf } from './columns';
import { findings } from './findings';
import { contractorPolicy, ofVisibleSubmission, staffPolicy } from './policy';
import { submissions } from './submissions';

export const fixes = pgTable(
  'fixes',
  {
    id: id(),
    officeId: uuid('office_id').notNull(),
    submissionId: uuid('submission_id').notNull(),
    findingId: uuid('finding_id')
      .notNull()
      .references(() => findings.id, { onDelete: 'cascade' }),
    /** 0: the one proposed; the others are alternatives, likeliest first. */
    rank: integer('rank').notNull().default(0),
    reason: text('reason').notNull(),
    edits: jsonb('edits').$type<readonly CellEdit[]>().notNull(),
    /** What adopting it alone does to the expected finish, working days, and to the variance; null where that cannot be computed. */
    effectExpected: doublePrecision('effect_expected'),
    effectVariance: doublePrecision('effect_variance'),
    state: text('state', { enum: FIX_STATES }).notNull().default('proposed'),
  },
  (table) => [
    unique('fixes_finding_rank').on(table.findingId, table.rank),
    index('fixes_submission').on(table.submissionId),
    foreignKey({
      name: 'fixes_submission_fk',
      columns: [table.officeId, table.submissionId],
      foreignColumns: [submissions.officeId, submissions.id],
    }).onDelete('cascade'),
    oneOf('fixes_state', table.state, FIX_STATES),
    check('fixes_rank', sql`${table.rank} >= 0`),
    staffPolicy('fixes', table.officeId),
    contractorPolicy('fixes', table.officeId, ofVisibleSubmission(table.submissionId), 'all'),
  ],
);
