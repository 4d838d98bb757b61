import { execFile, spawnSync } from 'node:child_process';
import { promisify } from 'node:util';
import { Refusal } from './refusal';

const run = promisify(execFile);

/** Whom PostgreSQL runs as. */
export interface Account {
  readonly name: string;
  readonly uid: number;
  readonly gid: number;
}

/** PostgreSQL refuses to run as root: an unprivileged user in its place; null where we are one ourselves. */
export async function clusterAccount(): Promise<Account | null> {
  if (process.getuid?.() !== 0) return null;
  for (const name of ['postgres', 'nobody']) {
    const ids = await Promise.all([run('id', ['-u', name]), run('id', ['-g', name])]).catch(() => null);
    if (ids) return { name, uid: Number(ids[0].stdout), gid: Number(ids[1].stdout) };
  }
  throw new Refusal(
    'PostgreSQL may not run as root, and there is no user named postgres or nobody to run it as.',
  );
}

/** Spawn options to run as the account. */
export const as = (account: Account | null) => (account ? { uid: account.uid, gid: account.gid } : {});

/** Whether the account gets into a folder: every folder above has to let it pass. */
export function canReach(account: Account | null, folder: string): boolean {
  if (!account) return true;
  const test = spawnSync('/bin/sh', ['-c', 'test -x "$0"', folder], { ...as(account), cwd: '/' });
  return test.status === 0;
}

/**
 * The command line that runs a program as the account and, where the system can (Linux), has it told to
 * stop (SIGINT: PostgreSQL's fast shutdown) should this process be killed without a chance to do it.
 */
export function commandAs(account: Account | null, program: string, args: readonly string[]): string[] {
  const options = account
    ? [`--reuid=${account.uid}`, `--regid=${account.gid}`, '--clear-groups', '--pdeathsig=INT']
    : ['--pdeathsig=INT'];
  const supported =
    spawnSync('setpriv', [...options, '--', 'true'], { cwd: '/', stdio: 'ignore' }).status === 0;
  return supported ? ['setpriv', ...options, '--', program, ...args] : [program, ...args];
}

/** What the server's programs are given of our environment: nothing that would set an option of theirs. */
export function bareEnvironment(): NodeJS.ProcessEnv {
  const { PATH, NODE_ENV } = process.env;
  return { PATH, NODE_ENV, LC_ALL: 'C' };
}
