import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Network } from '@/lib/network';

const ROUNDS = 15;
const SOURCE = join(import.meta.dirname, 'pass.c');

/** Median milliseconds of the same pass in plain C; null where there is no C compiler. */
export function passInC(network: Network): number | null {
  const folder = mkdtempSync(join(tmpdir(), 'plumbrow-pass-'));
  try {
    const program = join(folder, 'pass');
    execFileSync('cc', ['-O3', '-march=native', '-o', program, SOURCE], { stdio: 'ignore' });
    const answer = execFileSync(program, [String(ROUNDS)], { input: serialise(network) }).toString();
    return Number(answer.split(' ')[0]);
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'ENOENT') return null;
    throw error;
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

/** As pass.c reads it: counts, then by link from, to and relation, lags, and the durations. */
function serialise(network: Network): Buffer {
  const { count, linkCount, predecessorStart, predecessor, relation, lag, expected } = network;
  const to = new Int32Array(linkCount);
  for (let activity = 0; activity < count; activity++) {
    to.fill(activity, predecessorStart[activity], predecessorStart[activity + 1]);
  }
  const parts = [Int32Array.of(count, linkCount), predecessor, to, Int32Array.from(relation), lag, expected];
  return Buffer.concat(parts.map((part) => Buffer.from(part.buffer, part.byteOffset, part.byteLength)));
}
