import { Client, type QueryResultRow } from 'pg';

/** One statement over a connection of its own. */
export async function query<Row extends QueryResultRow>(
  url: string,
  text: string,
  values: readonly unknown[] = [],
): Promise<Row[]> {
  const client = new Client({ connectionString: url });
  await client.connect();
  try {
    return (await client.query<Row>(text, [...values])).rows;
  } finally {
    await client.end();
  }
}
