import { randomBytes } from 'node:crypto';
import { readdir, rm, stat } from 'node:fs/promises';
import { join, resolve } from 'node:path';
import { removeCluster } from '@/db/cluster';
import { makeHome } from '@/db/cluster/folder';
import { clearLeftover } from '@/db/cluster/leftover';
import type { Ending } from './ending';
import { isAlive, readHolder, takeLock } from './lock';

/** Where what the tests make stands while they run. */
const TEST_HOME = resolve('.plumbrow-test');
/** A run that is just beginning has no lock yet. */
const BEGINNING = 60_000;

/** A folder of this run's own, removed at its end. What runs left behind that were killed is removed first. */
export async function testHome(ending: Ending, what: string): Promise<string> {
  await makeHome(TEST_HOME);
  for (const name of await readdir(TEST_HOME)) {
    const home = join(TEST_HOME, name);
    if (await isAbandoned(home)) await removeHome(home);
  }
  const home = join(TEST_HOME, `run-${randomBytes(4).toString('hex')}`);
  await makeHome(home);
  ending.add(() => removeHome(home));
  await takeLock(home, what);
  return home;
}

async function isAbandoned(home: string): Promise<boolean> {
  const holder = await readHolder(join(home, 'lock.json'));
  if (holder) return !(await isAlive(holder));
  const { mtimeMs } = await stat(home);
  return Date.now() - mtimeMs > BEGINNING;
}

async function removeHome(home: string): Promise<void> {
  await clearLeftover(join(home, 'postgres', 'data'), () => undefined);
  await removeCluster(home);
  await rm(home, { recursive: true, force: true });
}
