import { fork } from 'node:child_process';
import { once } from 'node:events';
import { open, readFile } from 'node:fs/promises';
import { createServer } from 'node:net';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { fileURLToPath } from 'node:url';
import { Refusal } from '@/db/cluster';
import { PROGRAMS } from './child';
import { type Ending, endGroup } from './ending';

const LONGEST_START = 60_000;

export interface ServeOptions {
  readonly port: number;
  readonly host: string;
  readonly logFile: string;
  readonly env: Readonly<Record<string, string>>;
}

/** Serves the built application and waits until it is healthy. */
export async function serve(ending: Ending, options: ServeOptions): Promise<{ ended: Promise<void> }> {
  const log = await open(options.logFile, 'w', 0o600);
  const guard = fileURLToPath(new URL('./guard.mjs', import.meta.url));
  const child = fork(
    join('node_modules', PROGRAMS.next),
    ['start', '-p', String(options.port), '-H', options.host],
    {
      execArgv: ['--import', guard],
      detached: true,
      stdio: ['ignore', log.fd, log.fd, 'ipc'],
      env: { ...withoutOwner(), ...options.env, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' },
    },
  );
  ending.add(() => endGroup(child));
  await log.close();
  const ended = once(child, 'exit').then(() => undefined);
  const healthy = await Promise.race([ended.then(() => false), health(options)]);
  if (!healthy) {
    const said = await readFile(options.logFile, 'utf8').catch(() => '');
    const end = lastLines(said);
    if (/EADDRINUSE/.test(said)) throw busy(options.port);
    throw new Refusal(`The application did not start; the end of ${options.logFile} says why:\n${end}`);
  }
  return { ended };
}

/** A few of the last, each cut where a screen's width would be full of one. */
function lastLines(text: string): string {
  const lines = text.trim().split('\n').slice(-4);
  return lines.map((line) => (line.length > 500 ? `${line.slice(0, 500)} …` : line)).join('\n');
}

/** The served application is never given the way to connect as the owner of the tables. */
function withoutOwner(): NodeJS.ProcessEnv {
  const env = { ...process.env };
  delete env.DATABASE_OWNER_URL;
  return env;
}

async function health({ host, port }: ServeOptions): Promise<boolean> {
  const name =
    host === '0.0.0.0' ? '127.0.0.1' : host === '::' ? '[::1]' : host.includes(':') ? `[${host}]` : host;
  for (const end = Date.now() + LONGEST_START; Date.now() < end; await sleep(100)) {
    const answer = await fetch(`http://${name}:${port}/api/health`, {
      signal: AbortSignal.timeout(5000),
    }).catch(
      () => null, // Not listening yet.
    );
    if (answer?.ok) return true;
  }
  return false;
}

const busy = (port: number): Refusal =>
  new Refusal(
    `Port ${port} is taken by another program: stop that one, or choose another port (PORT=${port + 1}).`,
  );

/** Refuses a port that somebody listens on. `patience`: how long whoever has it may take to give it up. */
export async function requirePort(port: number, host: string, patience = 0): Promise<void> {
  for (const end = Date.now() + patience; ; await sleep(200)) {
    // On ::1 as well: a browser that asks for localhost may go there first.
    const codes = [await listenCode(port, host), host === '127.0.0.1' ? await listenCode(port, '::1') : null];
    if (codes.includes('EACCES'))
      throw new Refusal(`Port ${port} may not be used without more rights: choose one from 1024 on.`);
    if (codes[0] === 'EADDRNOTAVAIL' || codes[0] === 'ENOTFOUND') {
      throw new Refusal(`PLUMBROW_HOST is ${host}, and this machine has no such address.`);
    }
    if (!codes.includes('EADDRINUSE')) return;
    if (Date.now() >= end) throw busy(port);
  }
}

async function listenCode(port: number, host: string): Promise<string | null> {
  const server = createServer();
  const outcome = new Promise<string | null>((resolve) => {
    server.once('error', (error: NodeJS.ErrnoException) => resolve(error.code ?? 'unknown'));
    server.once('listening', () => resolve(null));
  });
  server.listen(port, host);
  const code = await outcome;
  if (code === null) {
    server.close();
    await once(server, 'close');
  }
  return code;
}
