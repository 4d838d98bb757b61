import process from 'node:process';
import { fileURLToPath } from 'node:url';
import { installPackages } from './packages.mjs';

/**
 * What runs before a package is there: checks Node.js, installs the packages, and then runs the command,
 * which is TypeScript, in this same process (so that a signal has one place to arrive at).
 */
export async function run(command) {
  const root = fileURLToPath(new URL('../..', import.meta.url));
  process.chdir(root);
  try {
    requireSystem();
    await installPackages(root);
  } catch (error) {
    console.error(error instanceof Error ? error.message : error);
    process.exit(1);
  }
  const { register } = await import('tsx/esm/api');
  register();
  const { main } = await import(`./${command}.ts`);
  process.exit(await main(process.argv.slice(2)));
}

function requireSystem() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number);
  if (major < 20 || (major === 20 && minor < 11)) {
    throw new Error(`Plumbrow needs Node.js 20.11 or later; this is ${process.versions.node}.`);
  }
  if (process.platform === 'win32') {
    throw new Error('Plumbrow runs on Linux and macOS; on Windows use the Subsystem for Linux.');
  }
}
