import { createHash } from 'node:crypto';
import { access, mkdir, readdir, readFile, rm, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { Refusal } from '@/db/cluster';
import { runProgram } from './child';
import { type Ending, throwIfStopping } from './ending';
import { takeLock } from './lock';
import type { Log } from './steps';

/** What the built application is made from. */
const FOLDERS = ['app', 'components', 'db', 'lib', 'parsers', 'public'];
const FILES =
  /^(package-lock\.json|tsconfig\.json|(next|tailwind|postcss)\.config\.\w+|(proxy|instrumentation)\.ts|.*\.d\.ts)$/;
/** Run by Node.js as they stand, and no part of the build. */
const APART = /^(db\/(cluster|seed|migrate)|lib\/commands)\b/;

const STAMP = join('.next', 'plumbrow-build');
const MILESTONE = /^\s*(✓|Creating|Running|Collecting|Generating|Finalizing)/;

/** A digest of the sources, the configuration and the packages, and of the Node.js that builds. */
export async function sourceStamp(root = '.'): Promise<string> {
  const files = (await readdir(root)).filter((name) => FILES.test(name) && name !== 'next-env.d.ts');
  for (const folder of FOLDERS) files.push(...(await filesBelow(root, folder)));
  const hash = createHash('sha256').update(process.version);
  for (const file of files.filter((name) => !APART.test(name)).sort()) {
    const content = createHash('sha256').update(await readFile(join(root, file)));
    hash.update(`\n${file} ${content.digest('hex')}`);
  }
  return hash.digest('hex');
}

async function filesBelow(root: string, folder: string): Promise<string[]> {
  const entries = await readdir(join(root, folder), { withFileTypes: true }).catch(() => []);
  const below = entries.map((entry) => {
    const place = `${folder}/${entry.name}`;
    return entry.isDirectory() ? filesBelow(root, place) : Promise.resolve([place]);
  });
  return (await Promise.all(below)).flat();
}

export async function isBuilt(stamp: string): Promise<boolean> {
  const built = await access(join('.next', 'BUILD_ID')).then(
    () => true,
    () => false,
  );
  return built && (await readFile(STAMP, 'utf8').catch(() => '')) === stamp;
}

/** Builds the application where the build is not of these sources; one at a time in this checkout. */
export async function ensureBuilt(ending: Ending, log: Log): Promise<void> {
  const folder = join('node_modules', '.plumbrow');
  await mkdir(folder, { recursive: true });
  for (let told = false; ; told = true) {
    const lock = await takeLock(folder, 'build');
    if (lock.held) {
      ending.add(() => lock.release());
      const stamp = await sourceStamp();
      if (await isBuilt(stamp)) log('It is built already.');
      else await build(ending, stamp, log);
      return lock.release();
    }
    if (!told) log(`Another build is under way (process ${lock.by.pid}); waiting for it.`);
    await sleep(500);
    throwIfStopping();
  }
}

/** The stamp is written last, so that a build that is broken off counts as none. */
async function build(ending: Ending, stamp: string, log: Log): Promise<void> {
  const said: string[] = [];
  await rm(STAMP, { force: true });
  const code = await runProgram(ending, 'next', ['build'], {
    env: { NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' },
    onLine: (line) => {
      said.push(line);
      if (MILESTONE.test(line)) log(line.trim());
    },
  });
  if (code !== 0) {
    const text = said.join('\n').trim();
    if (/ENOSPC/.test(text)) throw new Refusal('There is no space left on the disk for the build.');
    throw new Refusal(`The application could not be built:\n\n${text}`);
  }
  await writeFile(STAMP, stamp);
}
