import { type SQL, sql } from 'drizzle-orm';
import { type AnyPgColumn, pgPolicy, pgRole } from 'drizzle-orm/pg-core';

/** What every query of an office runs as; owns nothing. */
export const appRole = pgRole('plumbrow_app').existing();
/** What happens before an office is known: sign-in, tokens and invitations by their hash. */
export const identityRole = pgRole('plumbrow_identity').existing();

/** The value of app.contractor for people of the office itself. Not empty: an unset setting shows nothing. */
export const NO_CONTRACTOR = 'none';

// Each stands in a sub-select, so that it is computed once a query and not once a row.
const office = sql.raw(`(select nullif(current_setting('app.office', true), '')::uuid)`);
const user = sql.raw(`(select nullif(current_setting('app.user', true), '')::uuid)`);
const isStaff = sql.raw(`(select current_setting('app.contractor', true) = '${NO_CONTRACTOR}')`);
const contractor = sql.raw(
  `(select nullif(nullif(current_setting('app.contractor', true), ''), '${NO_CONTRACTOR}')::uuid)`,
);

export const isOffice = (column: AnyPgColumn) => sql`${column} = ${office}`;
export const isUser = (column: AnyPgColumn) => sql`${column} = ${user}`;
export const isContractor = (column: AnyPgColumn) => sql`${column} = ${contractor}`;
/** The inner select runs under the policies of submissions itself. */
export const ofVisibleSubmission = (column: AnyPgColumn) => sql`${column} in (select id from submissions)`;

/** People of the office see and write all that is the office's. */
export function staffPolicy(table: string, officeColumn: AnyPgColumn) {
  const rule = sql`${isOffice(officeColumn)} and ${isStaff}`;
  return pgPolicy(`${table}_staff`, { to: appRole, using: rule, withCheck: rule });
}

/** What a contractor's scheduler may see, within the office; `for: 'all'` lets it write there too. */
export function contractorPolicy(
  table: string,
  officeColumn: AnyPgColumn,
  condition: SQL,
  command: 'select' | 'all' = 'select',
) {
  const rule = sql`${isOffice(officeColumn)} and ${contractor} is not null and ${condition}`;
  return pgPolicy(`${table}_contractor`, {
    to: appRole,
    for: command,
    using: rule,
    ...(command === 'all' ? { withCheck: rule } : {}),
  });
}

/** The identity role sees every row; its grants say which columns, and what it may change. */
export function identityPolicy(table: string) {
  return pgPolicy(`${table}_identity`, { to: identityRole, using: sql`true`, withCheck: sql`true` });
}
