import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { sourceStamp } from '@/lib/commands/build';

let root = '';
beforeEach(async () => {
  root = await mkdtemp(join(tmpdir(), 'plumbrow-build-'));
  await mkdir(join(root, 'app', '[office]'), { recursive: true });
  await mkdir(join(root, 'lib', 'commands'), { recursive: true });
  await writeFile(join(root, 'app', '[office]', 'page.tsx'), 'one');
  await writeFile(join(root, 'package-lock.json'), '{}');
});
afterEach(() => rm(root, { recursive: true }));

describe('sourceStamp', () => {
  it.each([
    ['a page', 'app/[office]/page.tsx'],
    ['a new page', 'app/[office]/other.tsx'],
    ['the packages', 'package-lock.json'],
    ['the configuration', 'next.config.ts'],
  ])('changes with %s', async (_, file) => {
    const before = await sourceStamp(root);
    await writeFile(join(root, file), 'two');
    expect(await sourceStamp(root)).not.toBe(before);
  });

  it.each(['README.md', 'lib/commands/start.ts', 'next-env.d.ts'])(
    'does not change with %s',
    async (file) => {
      const before = await sourceStamp(root);
      await writeFile(join(root, file), 'two');
      expect(await sourceStamp(root)).toBe(before);
    },
  );
});
