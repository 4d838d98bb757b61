import process from 'node:process';
import { run } from './bootstrap.mjs';

/** The smaller commands: `node lib/commands/run.mjs token --email …`. */
const COMMANDS = ['token', 'demo'];

const [command] = process.argv.splice(2, 1);
if (!COMMANDS.includes(command)) {
  console.error(`There is no command ${command ?? 'without a name'}; there are ${COMMANDS.join(' and ')}.`);
  process.exit(1);
}
await run(command);
