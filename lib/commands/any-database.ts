import { access, readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { closeDatabase } from '@/db/client';
import { type Passwords, Refusal, type Urls, urlsOf } from '@/db/cluster';
import type { Ending } from './ending';
import { connectedTo, DATABASE, openLocalDatabase } from './local-database';
import { takeLock } from './lock';
import { clusterPasswords, readSettings, type Settings } from './settings';

/**
 * Runs work on the database that `npm start` uses: the one of DATABASE_URL, else the local one, which is
 * started for as long as the work takes where it is not running.
 */
export async function onDatabase<T>(ending: Ending, work: (settings: Settings) => Promise<T>): Promise<T> {
  const settings = readSettings();
  if (settings.databaseUrl) {
    ending.add(closeDatabase);
    return work(settings);
  }
  const urls = await localUrls(ending, settings.home);
  return connectedTo(urls, DATABASE, () => work(settings));
}

async function localUrls(ending: Ending, home: string): Promise<Urls> {
  await access(join(home, 'postgres')).catch(() => {
    throw new Refusal(`There is no database in ${home} yet: run npm start once, or set DATABASE_URL.`);
  });
  const passwords = await clusterPasswords(home);
  const lock = await takeLock(home, 'a command');
  if (!lock.held) return runningUrls(home, passwords);
  ending.add(() => lock.release());
  return openLocalDatabase(ending, { home, passwords });
}

/** The port stands in the fourth line of the lock file of a server that runs. */
async function runningUrls(home: string, passwords: Passwords): Promise<Urls> {
  const text = await readFile(join(home, 'postgres', 'data', 'postmaster.pid'), 'utf8').catch(() => '');
  const port = Number(text.split('\n')[3]);
  if (port > 0) return urlsOf(port, passwords);
  throw new Refusal('Plumbrow is just being started: try again when it prints its address.');
}
