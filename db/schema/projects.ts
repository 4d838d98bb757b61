import { sql } from 'drizzle-orm';
import {
  check,
  date,
  doublePrecision,
  foreignKey,
  index,
  integer,
  pgTable,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';
import { UNITS } from '../../lib/schedule/activity';
import { id, moment, oneOf } from './columns';
import { contractors } from './contractors';
import { offices } from './offices';
import { contractorPolicy, isContractor, staffPolicy } from './policy';
import { users } from './users';

export const projects = pgTable(
  'projects',
  {
    id: id(),
    officeId: uuid('office_id')
      .notNull()
      .references(() => offices.id, { onDelete: 'cascade' }),
    contractorId: uuid('contractor_id').notNull(),
    code: text('code').notNull(),
    name: text('name').notNull(),
    start: date('start', { mode: 'string' }).notNull(),
    targetFinish: date('target_finish', { mode: 'string' }),
    /** What a duration without a unit means; null: not settled, working days are assumed. */
    unit: text('unit', { enum: UNITS }),
    hoursPerDay: doublePrecision('hours_per_day').notNull().default(8),
    /** 1 = Monday … 7 = Sunday. */
    workingDays: integer('working_days').array().notNull().default([1, 2, 3, 4, 5]),
    holidays: date('holidays', { mode: 'string' })
      .array()
      .notNull()
      .default(sql`'{}'::date[]`),
    version: integer('version').notNull().default(0),
    createdBy: uuid('created_by')
      .notNull()
      .references(() => users.id),
    createdAt: moment('created_at').notNull().defaultNow(),
  },
  (table) => [
    unique('projects_office_code').on(table.officeId, table.code),
    // Target of the submissions' foreign key: office and contractor come with the project.
    unique('projects_office_contractor_id').on(table.officeId, table.contractorId, table.id),
    foreignKey({
      name: 'projects_contractor',
      columns: [table.officeId, table.contractorId],
      foreignColumns: [contractors.officeId, contractors.id],
    }),
    index('projects_created_by').on(table.createdBy),
    oneOf('projects_unit', table.unit, UNITS),
    check('projects_hours_per_day', sql`${table.hoursPerDay} > 0 and ${table.hoursPerDay} <= 24`),
    check(
      'projects_working_days',
      sql`cardinality(${table.workingDays}) > 0 and ${table.workingDays} <@ array[1, 2, 3, 4, 5, 6, 7]`,
    ),
    staffPolicy('projects', table.officeId),
    contractorPolicy('projects', table.officeId, isContractor(table.contractorId)),
  ],
);
