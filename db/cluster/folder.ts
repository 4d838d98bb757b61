import { randomBytes } from 'node:crypto';
import { chmod, chown, lstat, mkdir, readlink, realpath, rm, stat, symlink } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import { type Account, canReach } from './account';

/** Where a cluster goes when root's own folders are closed to the account PostgreSQL runs as. */
const ELSEWHERE = '/var/lib/plumbrow';

/** Makes the folder everything local is kept in. Others may pass through it, and read nothing. */
export async function makeHome(home: string): Promise<void> {
  if (await makeFolder(home)) await chmod(home, 0o711);
}

/** With those above it, one by one: the recursive form of `mkdir` never ends where none can be made (under /proc). */
async function makeFolder(folder: string): Promise<boolean> {
  const present = await stat(folder).catch(() => null);
  if (present?.isDirectory()) return false;
  if (!present && dirname(folder) !== folder) await makeFolder(dirname(folder));
  return mkdir(folder).then(
    () => true,
    (error: NodeJS.ErrnoException) => {
      if (error.code === 'EEXIST' && !present) return false; // Another was making it at the same time.
      throw error;
    },
  );
}

/**
 * The folder of the cluster, `<home>/postgres`. Where the account cannot get into the home (a checkout
 * under /root, say), that is a link to a folder under /var/lib.
 */
export async function clusterFolder(
  home: string,
  account: Account | null,
  log: (line: string) => void,
): Promise<string> {
  const folder = join(home, 'postgres');
  const present = await lstat(folder).catch(() => null);
  if (present) {
    if (present.isSymbolicLink()) await mkdir(await readlink(folder), { recursive: true });
    return realpath(folder);
  }
  if (canReach(account, home)) {
    await makeOwned(folder, account);
    return realpath(folder);
  }
  await mkdir(ELSEWHERE, { recursive: true, mode: 0o755 });
  const target = join(ELSEWHERE, randomBytes(8).toString('hex'));
  await makeOwned(target, account);
  await symlink(target, folder);
  log(`The user ${account?.name ?? ''} cannot get into ${home}, so the database is kept in ${target}.`);
  return target;
}

async function makeOwned(folder: string, account: Account | null): Promise<void> {
  await mkdir(folder, { mode: 0o700 });
  if (account) await chown(folder, account.uid, account.gid);
}

/** Removes a cluster's folder, and what a link in its place leads to. */
export async function removeCluster(home: string): Promise<void> {
  const folder = join(home, 'postgres');
  const target = await readlink(folder).catch(() => null);
  if (target && dirname(target) === ELSEWHERE) await rm(target, { recursive: true, force: true });
  await rm(folder, { recursive: true, force: true });
}
