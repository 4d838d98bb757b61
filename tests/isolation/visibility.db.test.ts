import { sql } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { database } from '@/db/client';
import { type OfficeScope, type Tx, withIdentity, withOffice } from '@/db/scope';
import { query, testDatabase } from '@/tests/support/database';
import { type OfficeFixture, twoOffices } from '@/tests/support/two-offices';

const db = testDatabase();
let ours: OfficeFixture;
let theirs: OfficeFixture;
beforeAll(async () => {
  [ours, theirs] = await twoOffices();
});

const TABLES = [
  'offices',
  'users',
  'memberships',
  'contractors',
  'projects',
  'submissions',
  'submission_files',
  'activities',
  'findings',
  'fixes',
  'corrections',
  'comments',
  'record_entries',
  'invitations',
  'api_tokens',
] as const;

const count = async (tx: Tx, table: string): Promise<number> => {
  const { rows } = await tx.execute<{ n: number }>(
    sql`select count(*)::int as n from ${sql.identifier(table)}`,
  );
  return rows[0]?.n ?? -1;
};
const counts = (scope: OfficeScope) =>
  withOffice(scope, async (tx) => {
    const found: Record<string, number> = {};
    for (const table of TABLES) found[table] = await count(tx, table);
    return found;
  });

describe('what the application sees', () => {
  it('is nothing, as the role it connects as', async () => {
    for (const table of TABLES) {
      await expect(query(db.serverUrl, `select * from ${table}`)).rejects.toThrow(/permission denied/);
    }
  });

  it('is nothing without an office', async () => {
    for (const table of TABLES) {
      const seen = await database().transaction(async (tx) => {
        await tx.execute(sql`select set_config('role', 'plumbrow_app', true)`);
        return count(tx, table);
      });
      expect([table, seen]).toEqual([table, 0]);
    }
  });

  it('is nothing of use where the contractor was forgotten', async () => {
    const seen = await database().transaction(async (tx) => {
      await tx.execute(
        sql`select set_config('role', 'plumbrow_app', true), set_config('app.office', ${ours.id}, true)`,
      );
      const found: [string, number][] = [];
      for (const table of TABLES) found.push([table, await count(tx, table)]);
      return found;
    });
    expect(seen.filter(([table, n]) => table !== 'offices' && n !== 0)).toEqual([]);
  });

  it('leaves no setting behind on the connection', async () => {
    await withOffice(ours.analyst, (tx) => count(tx, 'projects'));
    const { rows } = await database().execute(
      sql`select coalesce(current_setting('app.office', true), '') as office, current_user as who`,
    );
    expect(rows).toEqual([{ office: '', who: 'plumbrow_server' }]);
  });

  it('is the whole of one office, for its own people', async () => {
    const seen = await counts(ours.analyst);
    expect(seen).toEqual({
      offices: 1,
      users: 3,
      memberships: 3,
      contractors: 2,
      projects: 2,
      submissions: 2,
      submission_files: 2,
      activities: 2,
      findings: 2,
      fixes: 2,
      corrections: 2,
      comments: 4,
      record_entries: 4,
      invitations: 3,
      api_tokens: 3,
    });
  });

  it('is one contractor’s part of it, for a scheduler, without what was said inside', async () => {
    const seen = await counts(ours.contractors[0].scheduler);
    expect(seen).toEqual({
      offices: 1,
      users: 2,
      memberships: 2,
      contractors: 1,
      projects: 1,
      submissions: 1,
      submission_files: 1,
      activities: 1,
      findings: 1,
      fixes: 1,
      corrections: 1,
      comments: 1,
      record_entries: 1,
      invitations: 0,
      api_tokens: 1,
    });
  });

  it('is nothing where office and contractor do not belong together', async () => {
    const seen = await counts({ ...ours.contractors[0].scheduler, office: theirs.id });
    expect({ ...seen, offices: 0, users: 0, memberships: 0 }).toEqual(
      Object.fromEntries(TABLES.map((table) => [table, 0])),
    );
  });

  it('never holds a row of the other office', async () => {
    await withOffice(ours.analyst, async (tx) => {
      for (const table of TABLES.filter((name) => name !== 'users' && name !== 'offices')) {
        const { rows } = await tx.execute(
          sql`select from ${sql.identifier(table)} where office_id = ${theirs.id}`,
        );
        expect([table, rows.length]).toEqual([table, 0]);
      }
    });
  });
});

describe('before an office is known', () => {
  it('a person is found by e-mail with the password’s hash, in whichever office', async () => {
    const { rows } = await withIdentity((tx) =>
      tx.execute(sql`select password_hash from users where email = ${theirs.analystEmail}`),
    );
    expect(rows).toEqual([{ password_hash: 'secret' }]);
  });

  it('nothing of an office’s work is to be had', async () => {
    for (const table of ['projects', 'submissions', 'comments', 'record_entries', 'contractors']) {
      await expect(withIdentity((tx) => count(tx, table))).rejects.toMatchObject({
        cause: { code: '42501' },
      });
    }
  });
});
