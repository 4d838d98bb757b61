import { describe, expect, it } from 'vitest';
import { missingPackages } from '@/lib/commands/packages.mjs';

describe('missingPackages', () => {
  const wanted = {
    '': { version: '0.1.0' },
    'node_modules/one': { version: '1.0.0' },
    'node_modules/two': { version: '2.0.0' },
    'node_modules/only-on-a-mac': { version: '3.0.0', optional: true },
    'node_modules/linked': { link: true },
  };

  it('finds nothing where everything is there, but for what is optional on this system', () => {
    const installed = { 'node_modules/one': { version: '1.0.0' }, 'node_modules/two': { version: '2.0.0' } };
    expect(missingPackages(wanted, installed)).toEqual([]);
  });

  it('finds what is not there and what is there in another version', () => {
    expect(missingPackages(wanted, { 'node_modules/one': { version: '0.9.0' } })).toEqual([
      'node_modules/one',
      'node_modules/two',
    ]);
  });
});
