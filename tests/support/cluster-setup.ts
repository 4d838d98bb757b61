import { randomBytes } from 'node:crypto';
import { rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { ensureServerRole, findPrograms, openCluster, removeCluster } from '@/db/cluster';
import { migrate } from '@/db/migrate';
import { query } from './query';

/** The database that every test file's own is copied from. */
export const TEMPLATE = 'template_migrated';

/**
 * A cluster for the tests, with one migrated database to copy: the one that `npm test` has started, else one
 * made for this run and removed at its end.
 */
export default async function setUp(): Promise<(() => Promise<void>) | undefined> {
  if (process.env.PLUMBROW_TEST_OWNER_URL) {
    await makeTemplate(process.env.PLUMBROW_TEST_OWNER_URL);
    return undefined;
  }
  const home = join(tmpdir(), `plumbrow-db-${randomBytes(6).toString('hex')}`);
  const passwords = { owner: 'owner of the tests', server: 'server of the tests' };
  const programs = await findPrograms();
  const cluster = await openCluster({ home, passwords, programs, log: () => undefined, throwAway: true });
  process.env.PLUMBROW_TEST_OWNER_URL = cluster.ownerUrl('postgres');
  process.env.PLUMBROW_TEST_SERVER_URL = cluster.serverUrl('postgres');
  await makeTemplate(cluster.ownerUrl('postgres'));
  await ensureServerRole(cluster, passwords);
  return async () => {
    await cluster.stop();
    await removeCluster(home);
    await rm(home, { recursive: true, force: true });
  };
}

async function makeTemplate(ownerUrl: string): Promise<void> {
  await query(ownerUrl, `create database ${TEMPLATE}`);
  const url = new URL(ownerUrl);
  url.pathname = `/${TEMPLATE}`;
  await migrate(url.toString());
}
