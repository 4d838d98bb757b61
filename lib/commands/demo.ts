import { Refusal } from '@/db/cluster';
import { hasOffice } from '@/db/queries/identity';
import { withIdentity } from '@/db/scope';
import { onDatabase } from './any-database';
import { untilEnded } from './ending';
import { exitCode } from './explain';
import { seed } from './local-database';
import { type DemoAccounts, rememberDemo, rememberedDemo } from './settings';
import { say } from './steps';

const SLUG = 'demo';

/** `npm run demo`: makes the demo office in the database in use, where there is none yet. */
export const main = (): Promise<number> =>
  exitCode(() =>
    untilEnded(async (ending) => {
      const demo = await onDatabase(ending, async ({ home, databaseUrl }) => {
        if (await withIdentity((tx) => hasOffice(tx, SLUG))) {
          const kept = databaseUrl ? null : await rememberedDemo(home);
          if (kept) return kept;
          throw new Refusal(`There is an office ${SLUG} already; its password was printed when it was made.`);
        }
        const made = await seed();
        if (!databaseUrl) await rememberDemo(home, made);
        return made;
      });
      sayDemo(demo);
      return 0;
    }, false),
  );

export function sayDemo(demo: DemoAccounts): void {
  say('Accounts of the demo office:');
  for (const account of demo.accounts) say(`  ${account}`);
  say(`Password of each: ${demo.password}\n`);
}
