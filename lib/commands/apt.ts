import { execFile } from 'node:child_process';
import { access, mkdir, rm, writeFile } from 'node:fs/promises';
import { promisify } from 'node:util';
import { findPrograms, OLDEST_MAJOR, type Programs, Refusal } from '@/db/cluster';
import type { Log } from './steps';

const run = promisify(execFile);

/** Whether Debian's packages can be installed here. */
async function canInstall(): Promise<boolean> {
  if (process.platform !== 'linux' || process.getuid?.() !== 0) return false;
  return present('/usr/bin/apt-get');
}

const present = (file: string): Promise<boolean> =>
  access(file).then(
    () => true,
    () => false,
  );

async function install(name: string, log: Log): Promise<void> {
  const apt = (...args: string[]) =>
    run('apt-get', ['-o', 'DPkg::Lock::Timeout=300', ...args], {
      env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
      maxBuffer: 64_000_000,
    });
  log('apt-get update');
  // A source that does not answer is no reason not to try what is known already.
  await apt('update', '-q').catch(() => log('Not every package source answered.'));
  try {
    log(`apt-get install ${name}`);
    await apt('install', '-y', '-q', '--no-install-recommends', name);
  } catch (error) {
    const said = String((error as { stderr?: string }).stderr ?? error).trim();
    throw new Refusal(
      `The package ${name} could not be installed:\n${said.split('\n').slice(-8).join('\n')}`,
    );
  }
}

/** PostgreSQL's server programs, installed first where they are missing and that can be done. */
export async function serverPrograms(log: Log): Promise<Programs[]> {
  const found = await findPrograms();
  if (found.length > 0) return found;
  if (!(await canInstall())) {
    throw new Refusal(
      `PostgreSQL's server programs (version ${OLDEST_MAJOR} or later) were not found: install them ` +
        '(Debian, Ubuntu: apt-get install postgresql; Fedora: dnf install postgresql-server; ' +
        'macOS: brew install postgresql), or set DATABASE_URL to a database elsewhere.',
    );
  }
  await withoutMainCluster(() => install('postgresql', log));
  return findPrograms();
}

/** Debian's package makes and starts a cluster of its own on port 5432, which nobody asked for. */
async function withoutMainCluster(work: () => Promise<void>): Promise<void> {
  const folder = '/etc/postgresql-common/createcluster.d';
  const file = `${folder}/plumbrow.conf`;
  await mkdir(folder, { recursive: true });
  await writeFile(file, 'create_main_cluster = false\n');
  try {
    await work();
  } finally {
    await rm(file, { force: true });
  }
}

const BROWSERS = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/snap/bin/chromium'];

/** Chromium, for the journeys. */
export async function chromium(log: Log): Promise<string> {
  const given = process.env.PLUMBROW_CHROMIUM;
  if (given) return given;
  for (const file of BROWSERS) if (await present(file)) return file;
  if (!(await canInstall())) {
    throw new Refusal(
      'Chromium was not found: install it (Debian: apt-get install chromium), or set PLUMBROW_CHROMIUM to its program.',
    );
  }
  await install('chromium', log);
  return '/usr/bin/chromium';
}
