import { foreignKey, index, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { id, moment } from './columns';
import { memberships } from './memberships';
import { identityPolicy, staffPolicy } from './policy';
import { users } from './users';

/** A one-time link to set a password. The application's role writes `token_hash` and cannot read it. */
export const invitations = pgTable(
  'invitations',
  {
    id: id(),
    officeId: uuid('office_id').notNull(),
    userId: uuid('user_id').notNull(),
    tokenHash: text('token_hash').notNull().unique(),
    expiresAt: moment('expires_at').notNull(),
    usedAt: moment('used_at'),
    createdBy: uuid('created_by')
      .notNull()
      .references(() => users.id),
    createdAt: moment('created_at').notNull().defaultNow(),
  },
  (table) => [
    foreignKey({
      name: 'invitations_membership',
      columns: [table.officeId, table.userId],
      foreignColumns: [memberships.officeId, memberships.userId],
    }).onDelete('cascade'),
    index('invitations_office_user').on(table.officeId, table.userId),
    index('invitations_created_by').on(table.createdBy),
    staffPolicy('invitations', table.officeId),
    identityPolicy('invitations'),
  ],
);
