import { sql } from 'drizzle-orm';
import { type AnyPgColumn, check, customType, timestamp, uuid } from 'drizzle-orm/pg-core';

/** Columns and checks that several tables share. */

export const id = () => uuid('id').primaryKey().defaultRandom();

/** To the millisecond, as JavaScript keeps it: what is read back equals what was written. */
export const moment = (name: string) => timestamp(name, { withTimezone: true, precision: 3, mode: 'date' });

export const bytea = customType<{ data: Buffer; driverData: Buffer }>({ dataType: () => 'bytea' });

/** A check that a column holds one of the words of a const table. */
export function oneOf(name: string, column: AnyPgColumn, words: readonly string[]) {
  const list = words.map((word) => `'${word.replaceAll("'", "''")}'`).join(', ');
  return check(name, sql`${column} in (${sql.raw(list)})`);
}
