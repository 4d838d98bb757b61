import {
  type Cluster,
  ensureDatabase,
  ensureServerRole,
  openCluster,
  type Passwords,
  type Urls,
} from '@/db/cluster';
import { closeDatabase } from '@/db/client';
import { migrate } from '@/db/migrate';
import { serverPrograms } from './apt';
import type { Ending } from './ending';
import type { DemoAccounts } from './settings';
import { step } from './steps';

export const DATABASE = 'plumbrow';

export interface LocalOptions {
  readonly home: string;
  readonly passwords: Passwords;
  readonly throwAway?: boolean;
}

/** Starts the local cluster, made first where there is none, with the database in it brought up to date. */
export async function openLocalDatabase(ending: Ending, options: LocalOptions): Promise<Cluster> {
  const programs = await step("Finding PostgreSQL's server programs", serverPrograms);
  const cluster = await step('Starting the database', async (log) => {
    const opened = await openCluster({ ...options, programs, log });
    ending.add(() => opened.stop());
    if (opened.isNew) log(`It is new, in ${options.home}.`);
    return opened;
  });
  await step('Bringing the database up to date', async (log) => {
    await ensureDatabase(cluster, DATABASE);
    const { applied } = await migrate(cluster.ownerUrl(DATABASE));
    if (applied > 0) log(`${applied} ${applied === 1 ? 'migration' : 'migrations'} applied.`);
    await ensureServerRole(cluster, options.passwords);
  });
  return cluster;
}

/** Runs work that uses `database()` and `withOwner` against one database of a cluster. */
export async function connectedTo<T>(urls: Urls, database: string, work: () => Promise<T>): Promise<T> {
  const before = { url: process.env.DATABASE_URL, owner: process.env.DATABASE_OWNER_URL };
  process.env.DATABASE_URL = urls.serverUrl(database);
  process.env.DATABASE_OWNER_URL = urls.ownerUrl(database);
  try {
    return await work();
  } finally {
    await closeDatabase();
    restore('DATABASE_URL', before.url);
    restore('DATABASE_OWNER_URL', before.owner);
  }
}

function restore(name: string, value: string | undefined): void {
  if (value === undefined) delete process.env[name];
  else process.env[name] = value;
}

/** Seeds the demo office into the database that `connectedTo` set. */
export function seed(): Promise<DemoAccounts> {
  return step('Making the demo office', async (log) => {
    const { seedDemo } = await import('@/db/seed');
    return seedDemo(log);
  });
}
