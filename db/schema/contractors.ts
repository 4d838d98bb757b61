import { pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import { id, moment } from './columns';
import { offices } from './offices';
import { contractorPolicy, isContractor, staffPolicy } from './policy';

export const contractors = pgTable(
  'contractors',
  {
    id: id(),
    officeId: uuid('office_id')
      .notNull()
      .references(() => offices.id, { onDelete: 'cascade' }),
    name: text('name').notNull(),
    createdAt: moment('created_at').notNull().defaultNow(),
  },
  (table) => [
    unique('contractors_office_name').on(table.officeId, table.name),
    // What a foreign key with the office in it points at: nothing can refer to another office's contractor.
    unique('contractors_office_id').on(table.officeId, table.id),
    staffPolicy('contractors', table.officeId),
    contractorPolicy('contractors', table.officeId, isContractor(table.id)),
  ],
);
