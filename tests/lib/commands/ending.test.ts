import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { describe, expect, it, vi } from 'vitest';
import { Ending, endGroup } from '@/lib/commands/ending';

describe('Ending', () => {
  it('ends what was started in the reverse order, once, whatever fails', async () => {
    const ended: string[] = [];
    const complaints = vi.spyOn(process.stderr, 'write').mockReturnValue(true);
    const ending = new Ending();
    ending.add(() => Promise.resolve(void ended.push('database')));
    ending.add(() => Promise.reject(new Error('no')));
    ending.add(() => Promise.resolve(void ended.push('application')));
    await ending.close();
    await ending.close();
    expect(ended).toEqual(['application', 'database']);
    expect(complaints).toHaveBeenCalledExactlyOnceWith('While stopping: Error: no\n');
    complaints.mockRestore();
  });
});

describe('endGroup', () => {
  it.each([
    ['that ends when it is asked', 'sleep 60 & echo begun; wait'],
    ['that does not heed being asked', 'trap "" TERM; sleep 60 & echo begun; while true; do sleep 1; done'],
  ])('ends a child %s, and the child’s own', async (_, script) => {
    const child = spawn('/bin/sh', ['-c', script], { detached: true, stdio: ['ignore', 'pipe', 'ignore'] });
    // The pipe closes when the last that holds it, the child's child, is gone.
    const closed = once(child, 'close');
    await once(child.stdout, 'data');
    await endGroup(child, 300);
    await closed;
    expect(child.exitCode ?? child.signalCode).not.toBeNull();
  });
});
