import { spawn } from 'node:child_process';
import { access, readFile } from 'node:fs/promises';
import { join } from 'node:path';
import process from 'node:process';

/**
 * Names of the packages that the lock file wants and that are not installed in that version.
 * @param {Record<string, { version?: string, optional?: boolean, link?: boolean }>} wanted `packages` of package-lock.json
 * @param {Record<string, { version?: string }>} installed `packages` of node_modules/.package-lock.json
 * @returns {string[]}
 */
export function missingPackages(wanted, installed) {
  return Object.entries(wanted)
    .filter(([place, entry]) => place !== '' && !entry.optional && !entry.link)
    .filter(([place, entry]) => installed[place]?.version !== entry.version)
    .map(([place]) => place);
}

/** Installs what the lock file says where it is missing or another version; says so and how far it is. */
export async function installPackages(root) {
  const wanted = await packagesOf(join(root, 'package-lock.json'));
  if (!wanted) throw new Error('package-lock.json is missing or damaged: fetch the project anew.');
  const installed = (await packagesOf(join(root, 'node_modules', '.package-lock.json'))) ?? {};
  const places = missingPackages(wanted, {});
  const there = new Set(await present(root, places));
  const missing = new Set([
    ...missingPackages(wanted, installed),
    ...places.filter((place) => !there.has(place)),
  ]);
  if (missing.size === 0) return;

  const began = Date.now();
  console.log(`Installing ${places.length} packages (${missing.size} missing or of another version) …`);
  const progress = setInterval(() => void report(root, places, began), 10_000);
  try {
    await npmCi(root);
  } finally {
    clearInterval(progress);
  }
  console.log(`  ${seconds(began)}`);
}

async function packagesOf(file) {
  try {
    return JSON.parse(await readFile(file, 'utf8')).packages;
  } catch {
    return null; // Not there, or broken off half-way: the same as nothing installed.
  }
}

function npmCi(root) {
  const npm = process.env.npm_execpath;
  const [program, ...before] = npm?.endsWith('.js') ? [process.execPath, npm] : ['npm'];
  // The development packages too, whatever NODE_ENV says: the build checks types.
  const args = [...before, 'ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error'];
  return new Promise((resolve, reject) => {
    const child = spawn(program, args, { cwd: root, stdio: ['ignore', 'pipe', 'pipe'] });
    const stop = (signal) => {
      child.kill(signal);
      process.exit(1);
    };
    const signals = ['SIGINT', 'SIGTERM', 'SIGHUP'];
    for (const signal of signals) process.on(signal, stop);
    let said = '';
    for (const stream of [child.stdout, child.stderr]) stream.on('data', (text) => (said += String(text)));
    child.on('error', reject);
    child.on('close', (code) => {
      for (const signal of signals) process.off(signal, stop);
      if (code === 0) resolve();
      else reject(new Error(reason(said)));
    });
  });
}

function reason(said) {
  if (/ENOSPC/.test(said)) return 'There is no space left on the disk for the packages.';
  if (/EACCES|EROFS/.test(said)) return 'The packages cannot be installed: this folder cannot be written to.';
  if (/ENOTFOUND|EAI_AGAIN|ETIMEDOUT|ECONNREFUSED/.test(said)) {
    return 'The packages cannot be installed: the package registry cannot be reached.';
  }
  return `The packages could not be installed:\n${said.trim().split('\n').slice(-15).join('\n')}`;
}

/** Those of the places that hold a package. */
async function present(root, places) {
  const found = await Promise.all(
    places.map((place) =>
      access(join(root, place, 'package.json')).then(
        () => [place],
        () => [],
      ),
    ),
  );
  return found.flat();
}

async function report(root, places, began) {
  const there = await present(root, places);
  console.log(`  ${there.length} of ${places.length} after ${seconds(began)}`);
}

const seconds = (began) => `${((Date.now() - began) / 1000).toFixed(1)} s`;
