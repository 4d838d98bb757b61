import { access, rm, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { Client } from 'pg';
import { clusterAccount } from './account';
import { createCluster, dataVersion, fittingPrograms } from './create';
import { clusterFolder, makeHome, removeCluster } from './folder';
import { clearLeftover } from './leftover';
import type { Programs } from './programs';
import { type Server, startServer } from './server';
import { type Passwords, SERVER_ROLE, type Urls, urlsOf } from './urls';

export { removeCluster } from './folder';
export { findPrograms, OLDEST_MAJOR, type Programs } from './programs';
export { Refusal } from './refusal';
export { freePort } from './server';
export { type Passwords, SERVER_ROLE, type Urls, urlsOf } from './urls';

export interface Cluster extends Server, Urls {
  /** True until `finished` is called for the first time: there is nothing in it that anybody used. */
  readonly isNew: boolean;
  finished(): Promise<void>;
}

export interface ClusterOptions {
  readonly home: string;
  readonly programs: readonly Programs[];
  readonly passwords: Passwords;
  readonly log: (line: string) => void;
  /** Faster, and lost if the machine stops: for tests. */
  readonly throwAway?: boolean;
}

const HURRY = { fsync: 'off', synchronous_commit: 'off', full_page_writes: 'off' };

/** Makes the cluster under `home` where there is none, and starts it. The caller holds the lock on the home. */
export async function openCluster(options: ClusterOptions): Promise<Cluster> {
  const { home, passwords, log } = options;
  await makeHome(home);
  const account = await clusterAccount();
  const unfinished = join(home, 'unfinished');
  if (await exists(unfinished)) {
    // A first start that was broken off left something half made: begin again.
    await clearLeftover(join(home, 'postgres', 'data'), log);
    await removeCluster(home);
  }
  const folder = await clusterFolder(home, account, log);
  const data = join(folder, 'data');
  const version = await dataVersion(data);
  const programs = fittingPrograms(options.programs, version, data);
  const isNew = version === null;
  if (isNew) {
    await writeFile(unfinished, '');
    await createCluster(programs, folder, account, passwords.owner, options.throwAway === true);
  } else {
    await clearLeftover(data, log);
  }

  const server = await startServer({
    programs,
    account,
    data,
    logFile: join(home, 'postgres.log'),
    password: passwords.owner,
    ...(options.throwAway ? { settings: HURRY } : {}),
  });
  return {
    ...server,
    isNew,
    finished: () => rm(unfinished, { force: true }),
    ...urlsOf(server.port, passwords),
  };
}

/** Makes the database where it is missing. */
export async function ensureDatabase(cluster: Cluster, name: string): Promise<void> {
  await withClient(cluster.ownerUrl('postgres'), async (client) => {
    const { rowCount } = await client.query('select from pg_database where datname = $1', [name]);
    if (rowCount === 0) await client.query(`create database ${client.escapeIdentifier(name)}`);
  });
}

/** Lets the application in; after the migrations, which make the roles it takes on. */
export async function ensureServerRole(cluster: Cluster, passwords: Passwords): Promise<void> {
  await withClient(cluster.ownerUrl('postgres'), async (client) => {
    const { rowCount } = await client.query('select from pg_roles where rolname = $1', [SERVER_ROLE]);
    if (rowCount === 0) await client.query(`create role ${SERVER_ROLE} login noinherit`);
    await client.query(`alter role ${SERVER_ROLE} password ${client.escapeLiteral(passwords.server)}`);
    await client.query(`grant plumbrow_app, plumbrow_identity to ${SERVER_ROLE}`);
  });
}

async function withClient(url: string, work: (client: Client) => Promise<void>): Promise<void> {
  const client = new Client({ connectionString: url });
  await client.connect();
  try {
    await work(client);
  } finally {
    await client.end();
  }
}

const exists = (file: string): Promise<boolean> =>
  access(file).then(
    () => true,
    () => false,
  );
