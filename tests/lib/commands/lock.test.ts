import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { isAlive, readHolder, takeLock } from '@/lib/commands/lock';

let home = '';
let file = '';
beforeEach(async () => {
  home = await mkdtemp(join(tmpdir(), 'plumbrow-lock-'));
  file = join(home, 'lock.json');
});
afterEach(() => rm(home, { recursive: true }));

describe('takeLock', () => {
  it('is had by one at a time, who can say where it serves', async () => {
    const first = await takeLock(home, 'start');
    if (!first.held) throw new Error('The first was refused.');
    await first.announce('http://localhost:3000');
    const second = await takeLock(home, 'start');
    expect(second).toMatchObject({ held: false, by: { pid: process.pid, address: 'http://localhost:3000' } });
    await first.release();
    expect((await takeLock(home, 'start')).held).toBe(true);
  });

  it('is had by one of many who ask at once', async () => {
    const locks = await Promise.all(Array.from({ length: 8 }, () => takeLock(home, 'start')));
    expect(locks.filter((lock) => lock.held)).toHaveLength(1);
  });

  it.each([
    [
      'a process that is gone',
      JSON.stringify({ id: 'x', pid: 4_000_000, mark: 'x', what: 'start', address: null }),
    ],
    [
      'another process with the same id',
      JSON.stringify({ id: 'x', pid: process.pid, mark: 'x', what: 'start', address: null }),
    ],
    ['nobody: it is damaged', '{"pid": 12'],
    ['nobody: it is empty', ''],
  ])('is taken over from %s', async (_, content) => {
    await writeFile(file, content);
    const lock = await takeLock(home, 'start');
    expect(lock).toMatchObject({ held: true, leftOver: true });
    const holder = await readHolder(file);
    expect(holder && (await isAlive(holder))).toBe(true);
  });

  it('is taken over by one of many who find it left over', async () => {
    await writeFile(file, '');
    const locks = await Promise.all(Array.from({ length: 8 }, () => takeLock(home, 'start')));
    expect(locks.filter((lock) => lock.held)).toHaveLength(1);
  });

  it('does not give back what another has taken over', async () => {
    const lock = await takeLock(home, 'start');
    if (!lock.held) throw new Error('Refused.');
    const other = JSON.stringify({ id: 'x', pid: 1, mark: 'x', what: 'start', address: null });
    await writeFile(file, other);
    await lock.release();
    expect(await readFile(file, 'utf8')).toBe(other);
  });
});
