import { type AnyColumn, sql, type SQL } from 'drizzle-orm';
import type { Tx } from '../client';
import { storable } from '../storable';

/** Rows sent in one statement: few enough that a text of them stays small. */
const BATCH = 5000;

/**
 * Inserts many rows by few statements: each sends its rows as one JSON text, which the server takes apart.
 * `statement` is given that text as a parameter.
 */
export async function inBatches<Row>(
  tx: Tx,
  rows: readonly Row[],
  statement: (json: SQL) => SQL,
): Promise<void> {
  for (let from = 0; from < rows.length; from += BATCH) {
    const json = JSON.stringify(storable(rows.slice(from, from + BATCH)));
    await tx.execute(statement(sql`${json}::json`));
  }
}

/** That an id is among these, however many they are: one parameter in place of one each. */
export function among(column: AnyColumn, ids: Iterable<string>): SQL {
  return sql`${column} = any(${sql.param([...ids])}::uuid[])`;
}
