import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { type Cluster, freePort } from '@/db/cluster';
import { chromium } from './apt';
import { ensureBuilt } from './build';
import { runProgram } from './child';
import { type Ending, Interrupted, throwIfStopping, untilEnded } from './ending';
import { exitCode, explain } from './explain';
import { connectedTo, DATABASE, openLocalDatabase, seed } from './local-database';
import { serve } from './serve';
import { authSecret, clusterPasswords } from './settings';
import { say, step } from './steps';
import { add, type Counts, lastLine, ofStage, playwrightCounts, readReport, vitestCounts } from './tally';
import { testHome } from './test-home';

/** What a user has set for the served application must not reach the tests, least of all their database. */
const NOT_FOR_TESTS = [
  'DATABASE_URL',
  'DATABASE_OWNER_URL',
  'AUTH_SECRET',
  'NEXTAUTH_SECRET',
  'NEXTAUTH_URL',
  'PORT',
];

/** `npm test`: everything, counted in one last line. */
export const main = (args: readonly string[]): Promise<number> =>
  exitCode(() => untilEnded((ending) => test(ending, args), false));

async function test(ending: Ending, args: readonly string[]): Promise<number> {
  for (const name of NOT_FOR_TESTS) delete process.env[name];
  const home = await testHome(ending, 'test');
  const cluster = await attempt(async () => {
    const passwords = await clusterPasswords(home);
    return openLocalDatabase(ending, { home, passwords, throwAway: true });
  });
  const vitest = await stage('The tests without a browser', () =>
    runVitest(ending, home, cluster.value, args),
  );
  const journeys = await stage('The journeys in a browser', () => runJourneys(ending, home, cluster.value));
  const total = add(add(cluster.counts, vitest), journeys);
  await ending.close();
  say(`\n${lastLine(total)}`);
  return total.failed === 0 ? 0 : 1;
}

/** Work that is no test and has to succeed: a failure is said, and counted. */
async function attempt<T>(work: () => Promise<T>): Promise<{ value: T | null; counts: Counts }> {
  try {
    return { value: await work(), counts: { passed: 0, failed: 0, skipped: 0 } };
  } catch (error) {
    if (error instanceof Interrupted) throw error;
    say(`\n${explain(error)}\n`);
    return { value: null, counts: { passed: 0, failed: 1, skipped: 0 } };
  }
}

async function stage(name: string, work: () => Promise<Counts>): Promise<Counts> {
  throwIfStopping();
  say(`\n${name}`);
  const { value, counts } = await attempt(work);
  return value ?? counts;
}

async function runVitest(
  ending: Ending,
  home: string,
  cluster: Cluster | null,
  args: readonly string[],
): Promise<Counts> {
  const report = join(home, 'vitest.json');
  const urls = cluster && {
    PLUMBROW_TEST_OWNER_URL: cluster.ownerUrl('postgres'),
    PLUMBROW_TEST_SERVER_URL: cluster.serverUrl('postgres'),
  };
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
  const projects = cluster ? [] : ['--project=pure'];
  const code = await runProgram(ending, 'vitest', ['run', ...reporters, ...projects, ...args], {
    env: { ...urls, NODE_ENV: 'test' },
  });
  return ofStage(await readReport(report, vitestCounts), code);
}

async function runJourneys(ending: Ending, home: string, cluster: Cluster | null): Promise<Counts> {
  if (!cluster) throw new Error('Without a database there is nothing to go through.');
  await step('Building the application', (log) => ensureBuilt(ending, log));
  const browser = await step('Finding Chromium', chromium);
  const demo = await connectedTo(cluster, DATABASE, seed);
  const port = await freePort();
  const address = `http://localhost:${port}`;
  const secret = await authSecret(home, {});
  const logFile = join(home, 'server.log');
  await step('Starting the application', () =>
    serve(ending, {
      port,
      host: '127.0.0.1',
      logFile,
      env: {
        DATABASE_URL: cluster.serverUrl(DATABASE),
        AUTH_SECRET: secret,
        NEXTAUTH_SECRET: secret,
        NEXTAUTH_URL: address,
      },
    }),
  );

  const report = join(home, 'playwright.json');
  const code = await runProgram(ending, 'playwright', ['test', '--reporter=list,json'], {
    env: {
      PLUMBROW_TEST_URL: address,
      PLUMBROW_TEST_PASSWORD: demo.password,
      PLUMBROW_CHROMIUM: browser,
      PLAYWRIGHT_JSON_OUTPUT_FILE: report,
    },
  });
  const counts = ofStage(await readReport(report, playwrightCounts), code);
  if (counts.failed > 0) say(`\nThe end of what the application logged:\n${await tail(logFile, 30)}`);
  return counts;
}

async function tail(file: string, lines: number): Promise<string> {
  const text = await readFile(file, 'utf8').catch(() => '');
  return text.trimEnd().split('\n').slice(-lines).join('\n');
}
