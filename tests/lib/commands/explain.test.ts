import { describe, expect, it } from 'vitest';
import { Refusal } from '@/db/cluster';
import { exitCode, explain } from '@/lib/commands/explain';

const coded = (code: string, more: object = {}) => Object.assign(new Error('said'), { code, ...more });

describe('explain', () => {
  it('gives a refusal as it stands', () => {
    expect(explain(new Refusal('No.'))).toBe('No.');
  });

  it.each([
    ['ENOSPC', /no space left on the disk \(\/x\)/],
    ['EACCES', /cannot be written to \(\/x\)/],
    ['EROFS', /cannot be written to/],
    ['ENOTDIR', /A file stands where a folder is needed/],
    ['ECONNREFUSED', /does not answer/],
    ['28P01', /refuses the user or the password/],
    ['3D000', /does not exist/],
    ['42501', /must own the database/],
    ['53100', /no space left/],
  ])('says in one sentence what %s means', (code, sentence) => {
    expect(explain(coded(code, { path: '/x' }))).toMatch(sentence);
    expect(explain(coded(code))).not.toContain('\n');
  });

  it('looks into what a failed query wraps', () => {
    expect(explain(new Error('Failed query', { cause: coded('53100') }))).toMatch(/no space left/);
  });

  it('keeps the stack of what is not known', () => {
    expect(explain(new TypeError('odd'))).toMatch(/TypeError: odd\n\s+at /);
  });
});

describe('exitCode', () => {
  it('is what the work answers', async () => {
    expect(await exitCode(() => Promise.resolve(130))).toBe(130);
  });
});
