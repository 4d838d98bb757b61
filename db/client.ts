import { drizzle, type NodePgDatabase } from 'drizzle-orm/node-postgres';
import { Pool } from 'pg';
import * as schema from './schema';

export type Database = NodePgDatabase<typeof schema>;
/** For a connection, in milliseconds: a database that cannot be reached is said to be so. */
const LONGEST_WAIT = 20_000;

/** What a query function is given: one open transaction. */
export type Tx = Parameters<Parameters<Database['transaction']>[0]>[0];

interface Connection {
  readonly url: string;
  readonly pool: Pool;
  readonly database: Database;
}

// On globalThis, so that the development server's reloads keep the one pool.
const holder = globalThis as typeof globalThis & { plumbrowConnection?: Connection };

export function databaseUrl(): string {
  const url = process.env.DATABASE_URL;
  if (!url) throw new Error('DATABASE_URL is not set: start Plumbrow with `npm start`, or set it.');
  return url;
}

function connection(): Connection {
  const url = databaseUrl();
  if (holder.plumbrowConnection?.url === url) return holder.plumbrowConnection;
  const pool = new Pool({
    connectionString: url,
    max: 10,
    connectionTimeoutMillis: LONGEST_WAIT,
    application_name: 'plumbrow',
  });
  // A connection that fails while idle is replaced by the pool; without a listener it would end the process.
  pool.on('error', (error) => console.warn(`A database connection was lost: ${error.message}`));
  holder.plumbrowConnection = { url, pool, database: drizzle(pool, { schema }) };
  return holder.plumbrowConnection;
}

/** The process's one database; connects when it is first used. */
export const database = (): Database => connection().database;

/** Ends the pool; a later use opens another. */
export async function closeDatabase(): Promise<void> {
  const open = holder.plumbrowConnection;
  delete holder.plumbrowConnection;
  await open?.pool.end();
}
