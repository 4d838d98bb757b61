import { execFile } from 'node:child_process';
import { chown, readFile, rm, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { type Account, as, bareEnvironment } from './account';
import { OLDEST_MAJOR, type Programs } from './programs';
import { Refusal } from './refusal';

const run = promisify(execFile);

/** The owner of everything in a local cluster. */
export const OWNER = 'plumbrow';

/** Everybody on this machine can reach a port on loopback, so everybody needs the password. No socket is opened. */
const WHO_MAY_CONNECT = 'host all all 127.0.0.1/32 scram-sha-256\n';

/** The major version a data folder was made by; null where there is none yet. */
export async function dataVersion(data: string): Promise<number | null> {
  const text = await readFile(join(data, 'PG_VERSION'), 'utf8').catch(() => null);
  return text === null ? null : Number.parseInt(text, 10);
}

/** The programs that fit the data: the newest for a new cluster, else the version that made it. */
export function fittingPrograms(found: readonly Programs[], version: number | null, data: string): Programs {
  const usable = found.filter(({ major }) => (version === null ? major >= OLDEST_MAJOR : major === version));
  if (usable[0]) return usable[0];
  const have = found.map(({ major }) => String(major)).join(', ');
  if (version === null) {
    throw new Refusal(
      `PostgreSQL ${OLDEST_MAJOR} or later is needed; what was found is version ${have || 'none'}.`,
    );
  }
  throw new Refusal(
    `The database in ${data} was made by PostgreSQL ${version}, and ${have ? `only version ${have} is` : 'no version is'} ` +
      `installed: install PostgreSQL ${version}, or move that folder away to begin with a new database.`,
  );
}

/** Makes a cluster in `folder/data`; it accepts the owner, with the password, over loopback only. `throwAway`: not written to the disk for sure. */
export async function createCluster(
  programs: Programs,
  folder: string,
  account: Account | null,
  password: string,
  throwAway: boolean,
): Promise<void> {
  const passwordFile = join(folder, 'password');
  const data = join(folder, 'data');
  await writeFile(passwordFile, `${password}\n`, { mode: 0o600 });
  if (account) await chown(passwordFile, account.uid, account.gid);
  try {
    const args = [
      '-D',
      data,
      '-U',
      OWNER,
      `--pwfile=${passwordFile}`,
      '--auth=scram-sha-256',
      '--encoding=UTF8',
      ...(throwAway ? ['--no-sync'] : []),
    ];
    const init = (locale: string) =>
      run(join(programs.folder, 'initdb'), [...args, `--locale=${locale}`, '--lc-messages=C'], {
        ...as(account),
        cwd: folder,
        env: bareEnvironment(),
      });
    await init('C.UTF-8')
      .catch(async (error: Error) => {
        if (!/invalid locale/i.test(error.message)) throw error;
        await rm(data, { recursive: true, force: true });
        return init('C');
      })
      .catch((error: Error) => {
        if (/No space left on device/.test(error.message)) {
          throw new Refusal('There is no space left on the disk for the database.');
        }
        const said = error.message.trim().split('\n').slice(-6).join('\n');
        throw new Refusal(`The database could not be made in ${folder}:\n${said}`);
      });
    await writeFile(join(data, 'pg_hba.conf'), WHO_MAY_CONNECT);
  } finally {
    await rm(passwordFile, { force: true });
  }
}
