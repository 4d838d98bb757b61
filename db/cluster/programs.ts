import { execFile } from 'node:child_process';
import { access, constants, readdir } from 'node:fs/promises';
import { delimiter, dirname, join } from 'node:path';
import { promisify } from 'node:util';

const run = promisify(execFile);

/** A folder with PostgreSQL's server programs, and the major version they are of. */
export interface Programs {
  readonly folder: string;
  readonly major: number;
}

export const OLDEST_MAJOR = 15;

/** Folders that hold one folder a version, by the ways they are packaged. */
const VERSIONED: readonly (readonly [parent: string, version: RegExp, bin: string])[] = [
  ['/usr/lib/postgresql', /^\d+$/, 'bin'],
  ['/usr', /^pgsql-\d+$/, 'bin'],
  ['/opt/homebrew/opt', /^postgresql(@\d+)?$/, 'bin'],
  ['/usr/local/opt', /^postgresql(@\d+)?$/, 'bin'],
];

/** Every installation found, the newest first. */
export async function findPrograms(env: NodeJS.ProcessEnv = process.env): Promise<Programs[]> {
  const folders = new Set([
    ...(await versionedFolders()),
    ...(env.PATH ?? '').split(delimiter).filter((folder) => folder !== ''),
    ...(await folderOfConfig()),
  ]);
  const found: Programs[] = [];
  for (const folder of folders) {
    const major = await majorVersion(folder);
    if (major !== null && !found.some((programs) => programs.major === major)) found.push({ folder, major });
  }
  return found.sort((one, other) => other.major - one.major);
}

/** Reads `postgres (PostgreSQL) 15.13 (Debian …)` and `16beta1`; null where it is something else. */
export function parseMajor(versionLine: string): number | null {
  const match = /PostgreSQL\)?\s+(\d+)/.exec(versionLine);
  return match?.[1] ? Number(match[1]) : null;
}

async function majorVersion(folder: string): Promise<number | null> {
  try {
    await access(join(folder, 'initdb'), constants.X_OK);
    const { stdout } = await run(join(folder, 'postgres'), ['--version']);
    return parseMajor(stdout);
  } catch {
    return null; // Not there, or not for this machine: looked for elsewhere.
  }
}

async function versionedFolders(): Promise<string[]> {
  const folders: string[] = [];
  for (const [parent, version, bin] of VERSIONED) {
    const names = await readdir(parent).catch(() => []);
    folders.push(...names.filter((name) => version.test(name)).map((name) => join(parent, name, bin)));
  }
  return folders;
}

async function folderOfConfig(): Promise<string[]> {
  try {
    const { stdout } = await run('pg_config', ['--bindir']);
    return [stdout.trim()].filter((folder) => dirname(folder) !== folder);
  } catch {
    return []; // pg_config is not installed.
  }
}
