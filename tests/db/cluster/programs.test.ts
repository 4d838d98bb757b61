import { describe, expect, it } from 'vitest';
import { fittingPrograms } from '@/db/cluster/create';
import { parseMajor } from '@/db/cluster/programs';

describe('parseMajor', () => {
  it.each([
    ['postgres (PostgreSQL) 15.13 (Debian 15.13-0+deb12u1)', 15],
    ['postgres (PostgreSQL) 17beta1', 17],
    ['postgres (PostgreSQL) 9.6.24', 9],
    ['something else 15', null],
  ])('reads %s', (line, major) => {
    expect(parseMajor(line)).toBe(major);
  });
});

describe('fittingPrograms', () => {
  const found = [17, 15, 13].map((major) => ({ major, folder: `/opt/${major}` }));

  it('takes the newest for a new cluster', () => {
    expect(fittingPrograms(found, null, '/data').major).toBe(17);
  });

  it('takes the version that made the cluster', () => {
    expect(fittingPrograms(found, 15, '/data').major).toBe(15);
  });

  it('says what to do where that version is not installed', () => {
    expect(() => fittingPrograms(found, 16, '/data')).toThrow(
      'The database in /data was made by PostgreSQL 16, and only version 17, 15, 13 is installed: ' +
        'install PostgreSQL 16, or move that folder away to begin with a new database.',
    );
  });

  it('makes no cluster with a version that is too old', () => {
    expect(() => fittingPrograms(found.slice(2), null, '/data')).toThrow(
      /15 or later is needed; .* version 13/,
    );
  });
});
