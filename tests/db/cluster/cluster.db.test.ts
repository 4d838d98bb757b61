import { randomBytes } from 'node:crypto';
import { chmod, mkdir, readFile, realpath, rm, stat, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import {
  type Cluster,
  ensureDatabase,
  ensureServerRole,
  findPrograms,
  openCluster,
  Refusal,
  removeCluster,
} from '@/db/cluster';
import { migrate } from '@/db/migrate';
import { query } from '@/tests/support/query';

const passwords = { owner: 'the owner of a test', server: 'the server of a test' };
let parent = '';
let home = '';
let running: Cluster | null = null;
let said: string[] = [];

const open = async (): Promise<Cluster> => {
  said = [];
  const programs = await findPrograms();
  running = await openCluster({ home, passwords, programs, log: (line) => said.push(line), throwAway: true });
  return running;
};
const stop = async (): Promise<void> => {
  await running?.stop();
  running = null;
};

beforeEach(async () => {
  parent = join(tmpdir(), `plumbrow-cluster-${randomBytes(6).toString('hex')}`);
  await mkdir(parent, { mode: 0o755 });
  home = join(parent, 'home');
});
afterEach(async () => {
  await stop();
  await removeCluster(home);
  await rm(parent, { recursive: true });
});

describe('openCluster', () => {
  it('makes a cluster, and finds it again with what was in it', async () => {
    const first = await open();
    expect(first.isNew).toBe(true);
    await ensureDatabase(first, 'kept');
    await first.finished();
    await stop();

    const second = await open();
    expect(second.isNew).toBe(false);
    await ensureDatabase(second, 'kept');
    expect(await query(second.ownerUrl('kept'), 'select 1 as one')).toEqual([{ one: 1 }]);
  });

  it('lets nobody in without the password, and over loopback only', async () => {
    const cluster = await open();
    const url = new URL(cluster.ownerUrl('postgres'));
    url.password = 'a guess';
    await expect(query(url.toString(), 'select 1')).rejects.toMatchObject({ code: '28P01' });
    const settings = await query(
      cluster.ownerUrl('postgres'),
      `select current_setting('listen_addresses') as addresses, current_setting('unix_socket_directories') as sockets`,
    );
    expect(settings).toEqual([{ addresses: '127.0.0.1', sockets: '' }]);
    expect((await stat(join(home, 'postgres'))).mode & 0o077).toBe(0);
  });

  it('connects the application as somebody who owns nothing and may only take on the roles', async () => {
    const cluster = await open();
    await ensureDatabase(cluster, 'app');
    await migrate(cluster.ownerUrl('app'));
    await ensureServerRole(cluster, passwords);
    await ensureServerRole(cluster, passwords);
    const url = cluster.serverUrl('app');
    await expect(query(url, 'select * from offices')).rejects.toMatchObject({ code: '42501' });
    await expect(query(url, 'create table mine (x int)')).rejects.toMatchObject({ code: '42501' });
    await expect(query(url, 'set role plumbrow')).rejects.toMatchObject({ code: '42501' });
    await query(url, 'set role plumbrow_app');
  });

  it('begins anew after a first start that was broken off', async () => {
    const first = await open();
    await ensureDatabase(first, 'half_made');
    await stop();
    const second = await open();
    expect(second.isNew).toBe(true);
    await expect(query(second.ownerUrl('half_made'), 'select 1')).rejects.toMatchObject({ code: '3D000' });
  });

  it('stops a server that a killed start left running', async () => {
    const first = await open();
    await first.finished();
    const second = await open();
    expect(said.join()).toMatch(/left over from an earlier start \(process \d+\) is stopped first/);
    await first.ended;
    expect(await query(second.ownerUrl('postgres'), 'select 1 as one')).toEqual([{ one: 1 }]);
  });

  it.each([
    ['of a server that is gone', '4000000\n'],
    ['that names a process which is no server', `${process.pid}\n`],
    ['that is damaged', 'nonsense'],
  ])('takes a lock file away %s', async (_, content) => {
    const first = await open();
    await first.finished();
    await stop();
    await writeFile(join(home, 'postgres', 'data', 'postmaster.pid'), content);
    await open();
    expect(said.join()).toMatch(/A lock file left over/);
  });

  it('refuses a cluster of a version that is not installed, and leaves it alone', async () => {
    const first = await open();
    await first.finished();
    await stop();
    const file = join(home, 'postgres', 'data', 'PG_VERSION');
    const version = await readFile(file, 'utf8');
    await writeFile(file, '9.6\n');
    await expect(open()).rejects.toThrow(/was made by PostgreSQL 9/);
    await writeFile(file, version);
    expect((await open()).isNew).toBe(false);
  });

  it('says why a server does not start', async () => {
    const first = await open();
    await first.finished();
    await stop();
    await writeFile(join(home, 'postgres', 'data', 'postgresql.auto.conf'), 'nonsense = 1\n');
    const attempt = open();
    await expect(attempt).rejects.toBeInstanceOf(Refusal);
    await expect(attempt).rejects.toThrow(/nonsense/);
  });

  it('keeps it elsewhere where its user cannot get into the folder, as when root has closed it', async () => {
    await chmod(parent, 0o700);
    const cluster = await open();
    const elsewhere = process.getuid?.() === 0 ? '/var/lib/plumbrow/' : home;
    expect((await realpath(join(home, 'postgres'))).startsWith(elsewhere)).toBe(true);
    expect(said.some((line) => line.includes(`is kept in ${elsewhere}`))).toBe(process.getuid?.() === 0);
    await cluster.finished();
    await stop();
    expect((await open()).isNew).toBe(false);
  });
});
