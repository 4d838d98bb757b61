import { untilEnded } from './ending';
import { exitCode } from './explain';
import { connectedTo, DATABASE, openLocalDatabase } from './local-database';
import { clusterPasswords } from './settings';
import { testHome } from './test-home';

/**
 * `npm run bench`: measures against a database of its own, made as a user's is (nothing is switched off that
 * keeps data safe) and removed at the end.
 */
export const main = (args: readonly string[]): Promise<number> =>
  exitCode(() =>
    untilEnded(async (ending) => {
      const home = await testHome(ending, 'bench');
      const passwords = await clusterPasswords(home);
      const cluster = await openLocalDatabase(ending, { home, passwords });
      await connectedTo(cluster, DATABASE, async () => {
        const { bench } = await import('@/tests/bench/main');
        await bench(args);
      });
      return 0;
    }, false),
  );
