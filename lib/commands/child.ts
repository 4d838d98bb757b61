import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { join } from 'node:path';
import { type Ending, endGroup } from './ending';

export interface ChildOptions {
  readonly env?: Readonly<Record<string, string | undefined>>;
  /** Called with each line it prints; without it the child prints to where we do. */
  readonly onLine?: (line: string) => void;
}

/** The file that a package's command line starts at. */
export const PROGRAMS = {
  next: 'next/dist/bin/next',
  vitest: 'vitest/vitest.mjs',
  playwright: '@playwright/test/cli.js',
  prettier: 'prettier/bin/prettier.cjs',
  eslint: 'eslint/bin/eslint.js',
  tsc: 'typescript/bin/tsc',
  depcruise: 'dependency-cruiser/bin/dependency-cruise.mjs',
} as const;
export type Program = keyof typeof PROGRAMS;

const PLAIN = { NO_COLOR: '1', FORCE_COLOR: '0' };

/** Runs a package's program to its end in a process group of its own, which `ending` ends; answers its exit code. */
export async function runProgram(
  ending: Ending,
  program: Program,
  args: readonly string[],
  options: ChildOptions = {},
): Promise<number> {
  const child = spawn(process.execPath, [join('node_modules', PROGRAMS[program]), ...args], {
    env: { ...process.env, ...(options.onLine ? PLAIN : {}), ...options.env },
    detached: true,
    stdio: options.onLine ? ['ignore', 'pipe', 'pipe'] : ['ignore', 'inherit', 'inherit'],
  });
  ending.add(() => endGroup(child));
  if (options.onLine) eachLine(child, options.onLine);
  const [code] = (await once(child, 'close')) as [number | null];
  return code ?? 1;
}

export function eachLine(child: ChildProcess, onLine: (line: string) => void): void {
  for (const stream of [child.stdout, child.stderr]) {
    let rest = '';
    stream?.setEncoding('utf8');
    stream?.on('data', (text: string) => {
      const lines = (rest + text).split('\n');
      rest = lines.pop() ?? '';
      lines.forEach(onLine);
    });
    stream?.on('end', () => {
      if (rest !== '') onLine(rest);
    });
  }
}
