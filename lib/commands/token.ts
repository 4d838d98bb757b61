import { parseArgs } from 'node:util';
import { Refusal } from '@/db/cluster';
import { NotFound } from '@/lib/contract/errors';
import { createToken } from '@/lib/services/tokens/create';
import { onDatabase } from './any-database';
import { untilEnded } from './ending';
import { exitCode } from './explain';
import { say } from './steps';

const USAGE = 'npm run token -- --email <person> [--office <slug>] [--name <what it is for>] [--read-only]';

/** `npm run token`: prints a new API token. */
export const main = (args: readonly string[]): Promise<number> =>
  exitCode(() =>
    untilEnded(async (ending) => {
      const request = readRequest(args);
      const made = await onDatabase(ending, () => createToken(request)).catch((error: unknown) => {
        throw error instanceof NotFound ? new Refusal(error.message) : error;
      });
      say(
        `A token for ${request.email} (${made.role}) in the office ${made.office}. It is shown this once:\n`,
      );
      say(made.token);
      return 0;
    }, false),
  );

function readRequest(args: readonly string[]) {
  try {
    const { values } = parseArgs({
      args: [...args],
      options: {
        email: { type: 'string' },
        office: { type: 'string' },
        name: { type: 'string', default: 'made on the command line' },
        'read-only': { type: 'boolean', default: false },
      },
    });
    if (!values.email) throw new Error('Whose token is it to be?');
    return { email: values.email, office: values.office, name: values.name, readOnly: values['read-only'] };
  } catch (error) {
    throw new Refusal(`${error instanceof Error ? error.message : String(error)}\n${USAGE}`);
  }
}
