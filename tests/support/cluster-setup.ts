import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Client } from 'pg';
import { ensureServerRole, findPrograms, openCluster, removeCluster } from '@/db/cluster';
import { migrate } from '@/db/migrate';

/** The database that every test file's own is copied from. */
export const TEMPLATE = 'template_migrated';

/**
 * A cluster for the tests of this run, with one migrated database to copy; stopped and removed at the end.
 * `npm test` and a bare `vitest` alike: nothing is shared, so nothing can be left over from another run.
 */
export default async function setUp(): Promise<() => Promise<void>> {
  const home = await mkdtemp(join(process.env.PLUMBROW_TEST_HOME ?? tmpdir(), 'plumbrow-db-'));
  const passwords = { owner: 'owner of the tests', server: 'server of the tests' };
  const cluster = await openCluster({
    home,
    passwords,
    programs: await findPrograms(),
    log: () => undefined,
    throwAway: true,
  });
  const client = new Client({ connectionString: cluster.ownerUrl('postgres') });
  await client.connect();
  await client.query(`create database ${TEMPLATE}`);
  await client.end();
  await migrate(cluster.ownerUrl(TEMPLATE));
  await ensureServerRole(cluster, passwords);

  process.env.PLUMBROW_TEST_OWNER_URL = cluster.ownerUrl('postgres');
  process.env.PLUMBROW_TEST_SERVER_URL = cluster.serverUrl('postgres');
  return async () => {
    await cluster.stop();
    await removeCluster(home);
    await rm(home, { recursive: true, force: true });
  };
}
