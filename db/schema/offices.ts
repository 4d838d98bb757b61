import { pgPolicy, pgTable, text } from 'drizzle-orm/pg-core';
import { id, moment } from './columns';
import { appRole, identityPolicy, isOffice } from './policy';

export const offices = pgTable(
  'offices',
  {
    id: id(),
    slug: text('slug').notNull().unique(),
    name: text('name').notNull(),
    locale: text('locale').notNull().default('en-GB'),
    createdAt: moment('created_at').notNull().defaultNow(),
  },
  (table) => [
    pgPolicy('offices_own', { to: appRole, for: 'select', using: isOffice(table.id) }),
    identityPolicy('offices'),
  ],
);
