import { execFile } from 'node:child_process';
import { readFile, readlink, realpath, rm } from 'node:fs/promises';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { promisify } from 'node:util';
import { Refusal } from './refusal';

const run = promisify(execFile);
const LONGEST_STOP = 60_000;

/**
 * What a start that was killed left in the data folder: stops a server that still runs there, and removes
 * the lock file of one that does not. The caller holds the lock on the home, so no other start uses it.
 */
export async function clearLeftover(folder: string, log: (line: string) => void): Promise<void> {
  const data = await realpath(folder).catch(() => null);
  if (data === null) return;
  const file = join(data, 'postmaster.pid');
  const text = await readFile(file, 'utf8').catch(() => null);
  if (text === null) return;
  const pid = Number.parseInt(text, 10);
  if (Number.isInteger(pid) && pid > 1 && (await runsIn(pid, data))) {
    log(`A database server left over from an earlier start (process ${pid}) is stopped first.`);
    await stop(pid, data);
  } else {
    log('A lock file left over from an earlier database server is removed.');
  }
  await rm(file, { force: true });
}

async function stop(pid: number, data: string): Promise<void> {
  process.kill(pid, 'SIGINT');
  for (const end = Date.now() + LONGEST_STOP; Date.now() < end; await sleep(100)) {
    if (!(await runsIn(pid, data))) return;
  }
  throw new Refusal(`The database server left over from an earlier start (process ${pid}) does not stop.`);
}

/** Whether the process is a server in this very folder: process ids are used again. */
async function runsIn(pid: number, data: string): Promise<boolean> {
  if (process.platform === 'linux') return (await readlink(`/proc/${pid}/cwd`).catch(() => '')) === data;
  const line = await run('ps', ['-p', String(pid), '-o', 'command=']).catch(() => ({ stdout: '' }));
  return line.stdout.includes(data);
}
