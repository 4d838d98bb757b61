import { drizzle } from 'drizzle-orm/node-postgres';
import { Client } from 'pg';
import { databaseUrl, type Tx } from './client';
import * as schema from './schema';

/**
 * One transaction as the owner of the tables, whom no policy holds: for making an office from nothing.
 * Only the seed, the commands and the tests may import this file. Where the application itself connects as
 * somebody else (a local cluster), DATABASE_OWNER_URL says how; the served application is not given it.
 */
export async function withOwner<T>(work: (tx: Tx) => Promise<T>): Promise<T> {
  const client = new Client({ connectionString: process.env.DATABASE_OWNER_URL ?? databaseUrl() });
  await client.connect();
  try {
    return await drizzle(client, { schema }).transaction(work);
  } finally {
    await client.end();
  }
}
