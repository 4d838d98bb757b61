import { randomBytes } from 'node:crypto';
import type { QueryResultRow } from 'pg';
import { afterAll, beforeAll } from 'vitest';
import { closeDatabase } from '@/db/client';
import { TEMPLATE } from './cluster-setup';
import { query } from './query';

export { query } from './query';

export interface TestDatabase {
  /** Valid from `beforeAll` on. */
  readonly ownerUrl: string;
  readonly serverUrl: string;
  /** A statement as the owner of the tables, whom no policy holds. */
  asOwner<Row extends QueryResultRow>(text: string, values?: readonly unknown[]): Promise<Row[]>;
}

/**
 * Gives a test file a migrated database of its own: call it once at the top. DATABASE_URL is then what the
 * served application has (no rights but the two roles), DATABASE_OWNER_URL what `withOwner` uses.
 */
export function testDatabase(): TestDatabase {
  const name = `test_${randomBytes(6).toString('hex')}`;
  const state = { ownerUrl: '', serverUrl: '' };
  beforeAll(async () => {
    await administer(`create database ${name} template ${TEMPLATE}`);
    state.ownerUrl = within(name, process.env.PLUMBROW_TEST_OWNER_URL);
    state.serverUrl = within(name, process.env.PLUMBROW_TEST_SERVER_URL);
    process.env.DATABASE_URL = state.serverUrl;
    process.env.DATABASE_OWNER_URL = state.ownerUrl;
  });
  afterAll(async () => {
    await closeDatabase();
    await administer(`drop database ${name} with (force)`);
  });
  return {
    get ownerUrl() {
      return state.ownerUrl;
    },
    get serverUrl() {
      return state.serverUrl;
    },
    asOwner: (text, values) => query(state.ownerUrl, text, values),
  };
}

/** Another database of the same cluster, empty; for tests of the migrations themselves. */
export async function emptyDatabase(): Promise<{ url: string; drop: () => Promise<void> }> {
  const name = `empty_${randomBytes(6).toString('hex')}`;
  await administer(`create database ${name}`);
  return {
    url: within(name, process.env.PLUMBROW_TEST_OWNER_URL),
    drop: () => administer(`drop database ${name} with (force)`),
  };
}

async function administer(text: string): Promise<void> {
  await query(within('postgres', process.env.PLUMBROW_TEST_OWNER_URL), text);
}

function within(database: string, url: string | undefined): string {
  if (!url) throw new Error('No test cluster: run this file in the vitest project `db`.');
  const changed = new URL(url);
  changed.pathname = `/${database}`;
  return changed.toString();
}
