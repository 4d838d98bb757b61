import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { open, readFile, stat, truncate } from 'node:fs/promises';
import { createServer } from 'node:net';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { Client } from 'pg';
import { type Account, bareEnvironment, commandAs } from './account';
import { OWNER } from './create';
import type { Programs } from './programs';
import { Refusal } from './refusal';

const LONGEST_START = 120_000;
const LONGEST_STOP = 30_000;
const LARGEST_LOG = 10_000_000;

export interface Server {
  readonly port: number;
  /** Resolves when it has ended, for whatever reason. */
  readonly ended: Promise<void>;
  stop(): Promise<void>;
}

export interface ServerOptions {
  readonly programs: Programs;
  readonly data: string;
  readonly account: Account | null;
  readonly logFile: string;
  readonly password: string;
  /** Settings beside our own, for a cluster that is thrown away. */
  readonly settings?: Readonly<Record<string, string>>;
}

/** Starts PostgreSQL on a free port of loopback and waits until it answers. */
export async function startServer(options: ServerOptions): Promise<Server> {
  for (let attempt = 1; ; attempt += 1) {
    const port = await freePort();
    const child = await launch(options, port);
    const ended = once(child, 'exit').then(() => undefined);
    if (await answers(child, port, options.password)) return { port, ended, stop: () => stop(child, ended) };
    await stop(child, ended);
    const said = await lastWords(options.logFile);
    // Somebody took the port between our looking and our using it.
    if (/Address already in use|could not bind/.test(said) && attempt < 5) continue;
    if (/No space left on device/.test(said))
      throw new Refusal('There is no space left on the disk for the database.');
    throw new Refusal(`The database server did not start; the end of ${options.logFile} says why:\n${said}`);
  }
}

async function launch(options: ServerOptions, port: number): Promise<ChildProcess> {
  const settings = {
    listen_addresses: '127.0.0.1',
    port: String(port),
    unix_socket_directories: '',
    max_connections: '60',
    ...options.settings,
  };
  const args = Object.entries(settings).flatMap(([name, value]) => ['-c', `${name}=${value}`]);
  const postgres = join(options.programs.folder, 'postgres');
  const [program = postgres, ...rest] = commandAs(options.account, postgres, ['-D', options.data, ...args]);
  const size = await stat(options.logFile).catch(() => null);
  if (size && size.size > LARGEST_LOG) await truncate(options.logFile);
  const log = await open(options.logFile, 'a', 0o600);
  try {
    // A group of its own: Ctrl-C reaches us alone, and we stop things in their order.
    return spawn(program, rest, {
      cwd: options.data,
      detached: true,
      stdio: ['ignore', log.fd, log.fd],
      env: bareEnvironment(),
      ...(program === postgres && options.account
        ? { uid: options.account.uid, gid: options.account.gid }
        : {}),
    });
  } finally {
    await log.close();
  }
}

async function answers(child: ChildProcess, port: number, password: string): Promise<boolean> {
  for (const end = Date.now() + LONGEST_START; Date.now() < end; await sleep(50)) {
    if (child.exitCode !== null || child.signalCode !== null) return false;
    const client = new Client({ host: '127.0.0.1', port, user: OWNER, password, database: 'postgres' });
    client.on('error', () => undefined); // The failed query below tells.
    try {
      await client.connect();
      return true;
    } catch {
      continue; // Not yet up, or still recovering.
    } finally {
      await client.end().catch(() => undefined);
    }
  }
  return false;
}

/** Fast shutdown: connections are ended, what is committed is written. Immediate if that takes too long. */
async function stop(child: ChildProcess, ended: Promise<void>): Promise<void> {
  if (child.exitCode !== null || child.signalCode !== null) return;
  child.kill('SIGINT');
  const inTime = await Promise.race([ended.then(() => true), sleep(LONGEST_STOP, false, { ref: false })]);
  if (!inTime) child.kill('SIGQUIT');
  await ended;
}

async function lastWords(logFile: string): Promise<string> {
  const text = await readFile(logFile, 'utf8').catch(() => '');
  return text.trimEnd().split('\n').slice(-6).join('\n');
}

/** A port that nobody listens on at this moment. */
export async function freePort(host = '127.0.0.1'): Promise<number> {
  const server = createServer();
  server.listen(0, host);
  await once(server, 'listening');
  const address = server.address();
  server.close();
  await once(server, 'close');
  if (address === null || typeof address === 'string') throw new Error('A server on loopback has no port.');
  return address.port;
}
