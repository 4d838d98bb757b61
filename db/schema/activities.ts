import { foreignKey, integer, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import type { Relation } from '../../lib/schedule/relation';
import { contractorPolicy, ofVisibleSubmission, staffPolicy } from './policy';
import { submissions } from './submissions';

/** Estimates in working days; null where the cell gives none. */
export interface ActivityData {
  readonly optimistic: number | null;
  readonly likely: number | null;
  readonly pessimistic: number | null;
  readonly predecessors: readonly { readonly id: string; readonly type: Relation; readonly lag: number }[];
  /** Addresses of the cells it was read from, by field. */
  readonly cells: Readonly<Record<string, string>>;
}

/** The activities as received; never changed. */
export const activities = pgTable(
  'activities',
  {
    officeId: uuid('office_id').notNull(),
    submissionId: uuid('submission_id').notNull(),
    /** In the list, from 0. */
    position: integer('position').notNull(),
    activityId: text('activity_id').notNull(),
    name: text('name').notNull(),
    sheet: text('sheet').notNull(),
    row: integer('row').notNull(),
    data: jsonb('data').$type<ActivityData>().notNull(),
  },
  (table) => [
    primaryKey({ name: 'activities_pk', columns: [table.submissionId, table.position] }),
    foreignKey({
      name: 'activities_submission',
      columns: [table.officeId, table.submissionId],
      foreignColumns: [submissions.officeId, submissions.id],
    }).onDelete('cascade'),
    staffPolicy('activities', table.officeId),
    contractorPolicy('activities', table.officeId, ofVisibleSubmission(table.submissionId), 'all'),
  ],
);
