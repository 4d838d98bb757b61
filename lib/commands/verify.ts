import { type Program, runProgram } from './child';
import { type Ending, untilEnded } from './ending';
import { exitCode } from './explain';
import { say, step } from './steps';

interface Check {
  readonly name: string;
  readonly runs: readonly (readonly [Program, ...string[]])[];
}

const CHECKS: readonly Check[] = [
  { name: 'Format', runs: [['prettier', '--check', '--log-level=warn', '.']] },
  { name: 'Lint', runs: [['eslint', '--max-warnings=0', '.']] },
  {
    name: 'Types',
    runs: [
      ['next', 'typegen'],
      ['tsc', '--noEmit'],
    ],
  },
  {
    name: 'Import directions',
    runs: [
      [
        'depcruise',
        '--config',
        '.dependency-cruiser.cjs',
        'app',
        'components',
        'db',
        'lib',
        'parsers',
        'proxy.ts',
      ],
    ],
  },
  { name: 'Pure tests', runs: [['vitest', 'run', '--project=pure', '--reporter=dot']] },
];

/** `npm run verify`: what can be told without a database, each check to its end. */
export const main = (): Promise<number> => exitCode(() => untilEnded(verify, false));

async function verify(ending: Ending): Promise<number> {
  const failed: string[] = [];
  for (const check of CHECKS) {
    const said = await runCheck(ending, check);
    if (said === null) continue;
    failed.push(check.name);
    say(`\n${said}\n`);
  }
  say(failed.length === 0 ? '\nEverything is in order.' : `\nNot in order: ${failed.join(', ')}.`);
  return failed.length === 0 ? 0 : 1;
}

/** What it printed where it failed, else null. */
function runCheck(ending: Ending, { name, runs }: Check): Promise<string | null> {
  return step(name, async (log) => {
    for (const [program, ...args] of runs) {
      const lines: string[] = [];
      const env = { NEXT_TELEMETRY_DISABLED: '1' };
      const code = await runProgram(ending, program, args, { env, onLine: (line) => lines.push(line) });
      if (code === 0) continue;
      log(`not in order (${program})`);
      return lines.join('\n').trim();
    }
    return null;
  });
}
