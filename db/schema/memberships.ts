import { sql } from 'drizzle-orm';
import { check, foreignKey, index, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import { ROLES } from '../../lib/contract/shared';
import { id, moment, oneOf } from './columns';
import { contractors } from './contractors';
import { offices } from './offices';
import { contractorPolicy, identityPolicy, isContractor, staffPolicy } from './policy';
import { users } from './users';

export const memberships = pgTable(
  'memberships',
  {
    id: id(),
    officeId: uuid('office_id')
      .notNull()
      .references(() => offices.id, { onDelete: 'cascade' }),
    userId: uuid('user_id')
      .notNull()
      .references(() => users.id),
    role: text('role', { enum: ROLES }).notNull(),
    contractorId: uuid('contractor_id'),
    createdAt: moment('created_at').notNull().defaultNow(),
    disabledAt: moment('disabled_at'),
  },
  (table) => [
    unique('memberships_office_user').on(table.officeId, table.userId),
    unique('memberships_office_id').on(table.officeId, table.id),
    foreignKey({
      name: 'memberships_contractor',
      columns: [table.officeId, table.contractorId],
      foreignColumns: [contractors.officeId, contractors.id],
    }),
    index('memberships_user').on(table.userId),
    index('memberships_office_contractor').on(table.officeId, table.contractorId),
    oneOf('memberships_role', table.role, ROLES),
    check(
      'memberships_scheduler_has_contractor',
      sql`(${table.role} = 'scheduler') = (${table.contractorId} is not null)`,
    ),
    staffPolicy('memberships', table.officeId),
    // A scheduler sees the people of the office and those of its own contractor.
    contractorPolicy(
      'memberships',
      table.officeId,
      sql`(${table.contractorId} is null or ${isContractor(table.contractorId)})`,
    ),
    identityPolicy('memberships'),
  ],
);
