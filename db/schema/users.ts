import { sql } from 'drizzle-orm';
import { check, integer, pgPolicy, pgTable, text } from 'drizzle-orm/pg-core';
import { id, moment } from './columns';
import { appRole, identityPolicy } from './policy';

/** A person, who may be a member of several offices. The application's role cannot read `password_hash`. */
export const users = pgTable(
  'users',
  {
    id: id(),
    email: text('email').notNull().unique(),
    name: text('name').notNull(),
    /** Null until the person has set a password. */
    passwordHash: text('password_hash'),
    /** Goes up when the password changes: sessions of an earlier epoch are over. */
    sessionEpoch: integer('session_epoch').notNull().default(0),
    createdAt: moment('created_at').notNull().defaultNow(),
  },
  (table) => [
    check('users_email_lower', sql`${table.email} = lower(${table.email})`),
    // The inner select runs under the policies of memberships: the same office, and who is to be seen there.
    pgPolicy('users_fellow', {
      to: appRole,
      for: 'select',
      using: sql`${table.id} in (select user_id from memberships)`,
    }),
    pgPolicy('users_invited', {
      to: appRole,
      for: 'insert',
      withCheck: sql`(select nullif(current_setting('app.office', true), '') is not null) and ${table.passwordHash} is null`,
    }),
    identityPolicy('users'),
  ],
);
