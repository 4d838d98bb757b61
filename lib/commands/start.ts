import { join } from 'node:path';
import { Refusal } from '@/db/cluster';
import { makeHome } from '@/db/cluster/folder';
import { migrate } from '@/db/migrate';
import { ensureBuilt } from './build';
import { sayDemo } from './demo';
import { type Ending, untilEnded } from './ending';
import { exitCode } from './explain';
import { connectedTo, DATABASE, openLocalDatabase, seed } from './local-database';
import { type Holder, takeLock } from './lock';
import { requirePort, serve } from './serve';
import {
  authSecret,
  clusterPasswords,
  publicAddress,
  readSettings,
  rememberDemo,
  rememberedDemo,
  requireRoom,
  type Settings,
} from './settings';
import { say, step } from './steps';

/** `npm start`: everything from a bare checkout to a served application. */
export const main = (): Promise<number> => exitCode(() => untilEnded(start, true));

async function start(ending: Ending, interrupted: Promise<never>): Promise<number> {
  const settings = readSettings();
  const { home, port, host } = settings;
  const place = placeOf(settings);
  await makeHome(place);
  await requireRoom(place);
  const lock = await takeLock(place, 'start');
  if (!lock.held) return alreadyRunning(lock.by);
  ending.add(() => lock.release());
  if (lock.leftOver) say('An earlier start ended without tidying up; its lock is taken over.');
  await requirePort(port, host, lock.leftOver ? 10_000 : 0);

  const database = settings.databaseUrl
    ? await openRemote(settings.databaseUrl)
    : await openLocal(ending, settings);
  await step('Building the application', (log) => ensureBuilt(ending, log));
  const address = publicAddress(settings);
  const secret = await authSecret(home);
  const server = await step('Starting the application', () =>
    serve(ending, {
      port,
      host,
      logFile: join(place, 'server.log'),
      env: {
        DATABASE_URL: database.url,
        AUTH_SECRET: secret,
        NEXTAUTH_SECRET: secret,
        NEXTAUTH_URL: address,
      },
    }),
  );
  await lock.announce(address);
  await announce(settings, address);
  const gone = await Promise.race([
    server.ended.then(() => `The application ended by itself; see ${join(place, 'server.log')}.`),
    database.ended.then(() => `The database ended by itself; see ${join(home, 'postgres.log')}.`),
    interrupted,
  ]);
  throw new Refusal(gone);
}

/** Where a start keeps its lock and its log: one start at a time uses the local cluster, one a port a database elsewhere. */
function placeOf({ home, port, databaseUrl }: Settings): string {
  return databaseUrl ? join(home, `port-${port}`) : home;
}

interface Opened {
  readonly url: string;
  readonly ended: Promise<void>;
}

async function openRemote(url: string): Promise<Opened> {
  await step('Bringing the database of DATABASE_URL up to date', async (log) => {
    const { applied } = await migrate(url);
    log(applied > 0 ? `${applied} migrations applied.` : 'Nothing was to be done.');
  });
  return { url, ended: new Promise(() => undefined) };
}

async function openLocal(ending: Ending, { home }: Settings): Promise<Opened> {
  const passwords = await clusterPasswords(home);
  const cluster = await openLocalDatabase(ending, { home, passwords });
  if (cluster.isNew) {
    await rememberDemo(home, await connectedTo(cluster, DATABASE, seed));
    await cluster.finished();
  }
  return { url: cluster.serverUrl(DATABASE), ended: cluster.ended };
}

function alreadyRunning(by: Holder): number {
  if (by.address) say(`Plumbrow is already running at ${by.address} (process ${by.pid}).`);
  else
    say(
      `Plumbrow is already being started (process ${by.pid}, ${by.what}); it prints its address when it is ready.`,
    );
  return 0;
}

async function announce({ databaseUrl, home }: Settings, address: string): Promise<void> {
  say(`\nPlumbrow is at ${address}\n`);
  const demo = databaseUrl ? null : await rememberedDemo(home);
  if (demo) sayDemo(demo);
  say('Ctrl-C stops it.');
}
