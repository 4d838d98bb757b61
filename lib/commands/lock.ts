import { execFile } from 'node:child_process';
import { randomUUID } from 'node:crypto';
import { link, readFile, rename, rm, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { promisify } from 'node:util';
import { z } from 'zod';

const run = promisify(execFile);

const holder = z.object({
  /** Of this taking; a process may take several locks, or one again. */
  id: z.string(),
  pid: z.int().positive(),
  /** What tells this process from a later one with the same id. */
  mark: z.string(),
  what: z.string(),
  /** Null until it serves. */
  address: z.string().nullable(),
});
export type Holder = z.infer<typeof holder>;

export type Lock =
  | {
      readonly held: true;
      /** Whether another's, who is gone without giving it back, was in the way. */
      readonly leftOver: boolean;
      /** Lets a second start say where the first one is. */
      announce(address: string): Promise<void>;
      release(): Promise<void>;
    }
  | { readonly held: false; readonly by: Holder };

/** Takes the lock on a home: one process at a time starts its cluster. A lock whose process is gone is taken over. */
export async function takeLock(home: string, what: string): Promise<Lock> {
  const file = join(home, 'lock.json');
  const own: Holder = {
    id: randomUUID(),
    pid: process.pid,
    mark: (await markOf(process.pid)) ?? '',
    what,
    address: null,
  };
  const draft = join(home, `lock.${own.id}`);
  await writeFile(draft, JSON.stringify(own), { mode: 0o600 });
  try {
    if (await linked(draft, file)) return handle(file, own, false);
    const other = await readHolder(file);
    if (other && (await isAlive(other))) return { held: false, by: other };
    await rename(draft, file);
    // Had another found the same left-over lock, the later of the two has it now.
    await sleep(100);
    const now = await readHolder(file);
    if (now && now.id !== own.id) return { held: false, by: now };
    return handle(file, own, true);
  } finally {
    await rm(draft, { force: true });
  }
}

function handle(file: string, own: Holder, leftOver: boolean): Lock {
  return {
    held: true,
    leftOver,
    announce: async (address) => {
      // In one step: half a lock would read as a damaged one.
      await writeFile(`${file}.new`, JSON.stringify({ ...own, address }), { mode: 0o600 });
      await rename(`${file}.new`, file);
    },
    release: async () => {
      const now = await readHolder(file);
      if (now?.id === own.id) await rm(file, { force: true });
    },
  };
}

/** Whoever holds the lock; null where nobody does, or what is written there cannot be read. */
export async function readHolder(file: string): Promise<Holder | null> {
  try {
    return holder.parse(JSON.parse(await readFile(file, 'utf8')));
  } catch {
    return null; // Not there, or damaged: it names no process that could be asked.
  }
}

export async function isAlive(other: Holder): Promise<boolean> {
  return other.mark !== '' && (await markOf(other.pid)) === other.mark;
}

/** When the process began, as the system tells it; null where there is none with that id. */
async function markOf(pid: number): Promise<string | null> {
  try {
    if (process.platform !== 'linux')
      return (await run('ps', ['-p', String(pid), '-o', 'lstart='])).stdout.trim();
    const [stat, boot] = await Promise.all([
      readFile(`/proc/${pid}/stat`, 'utf8'),
      readFile('/proc/sys/kernel/random/boot_id', 'utf8'),
    ]);
    // The 22nd field; the second, the program's name, may hold blanks and brackets.
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    if (fields[0] === 'Z') return null;
    return `${boot.trim()} ${fields[19] ?? ''}`;
  } catch {
    return null; // No such process.
  }
}

async function linked(draft: string, file: string): Promise<boolean> {
  try {
    await link(draft, file);
    return true;
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'EEXIST') return false;
    throw error;
  }
}
