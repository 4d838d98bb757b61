import { describe, expect, it } from 'vitest';
import { testDatabase } from '@/tests/support/database';

const db = testDatabase();
const OURS = `n.nspname = 'public' and c.relkind in ('r', 'p')`;

describe('the tables', () => {
  it('all have row-level security on and at least one policy for the application', async () => {
    const rows = await db.asOwner<{ table: string; on: boolean; policies: number }>(`
      select c.relname as table, c.relrowsecurity as on,
             (select count(*)::int from pg_policies p
               where p.schemaname = 'public' and p.tablename = c.relname and 'plumbrow_app' = any(p.roles)) as policies
        from pg_class c join pg_namespace n on n.oid = c.relnamespace where ${OURS}`);
    expect(rows.length).toBeGreaterThanOrEqual(15);
    expect(rows.filter((row) => !row.on || row.policies === 0)).toEqual([]);
  });

  it('have no policy without a condition but those of the identity role', async () => {
    const rows = await db.asOwner(`
      select tablename, policyname from pg_policies
       where schemaname = 'public' and not ('plumbrow_identity' = any(roles))
         and (coalesce(qual, 'true') = 'true' and coalesce(with_check, 'true') = 'true' or 'public' = any(roles))`);
    expect(rows).toEqual([]);
  });

  it('belong neither to the roles nor to what the application connects as', async () => {
    const rows = await db.asOwner(`
      select c.relname from pg_class c join pg_namespace n on n.oid = c.relnamespace
        join pg_roles r on r.oid = c.relowner
       where n.nspname in ('public', 'drizzle') and r.rolname like 'plumbrow\\__%'`);
    expect(rows).toEqual([]);
  });

  it('have an index that begins with a column of each foreign key', async () => {
    const rows = await db.asOwner(`
      select k.conrelid::regclass::text as table, k.conname from pg_constraint k
        join pg_namespace n on n.oid = k.connamespace
       where k.contype = 'f' and n.nspname = 'public' and not exists (
         select from pg_index i where i.indrelid = k.conrelid and i.indkey[0] = any(k.conkey))`);
    expect(rows).toEqual([]);
  });
});

describe('the roles', () => {
  it('can log in nowhere, own no rights, and bypass nothing', async () => {
    const rows = await db.asOwner(`
      select rolname, rolcanlogin, rolsuper, rolbypassrls, rolcreaterole, rolcreatedb from pg_roles
       where rolname in ('plumbrow_app', 'plumbrow_identity') order by rolname`);
    const nothing = {
      rolcanlogin: false,
      rolsuper: false,
      rolbypassrls: false,
      rolcreaterole: false,
      rolcreatedb: false,
    };
    expect(rows).toEqual([
      { rolname: 'plumbrow_app', ...nothing },
      { rolname: 'plumbrow_identity', ...nothing },
    ]);
  });

  it.each([
    ['plumbrow_app', 'record_entries', 'update'],
    ['plumbrow_app', 'record_entries', 'delete'],
    ['plumbrow_app', 'activities', 'update'],
    ['plumbrow_app', 'activities', 'delete'],
    ['plumbrow_app', 'submission_files', 'update'],
    ['plumbrow_app', 'submissions', 'delete'],
    ['plumbrow_app', 'corrections', 'delete'],
    ['plumbrow_app', 'comments', 'delete'],
    ['plumbrow_identity', 'projects', 'select'],
    ['plumbrow_identity', 'submissions', 'select'],
    ['plumbrow_identity', 'record_entries', 'select'],
    ['plumbrow_identity', 'users', 'insert'],
    ['plumbrow_identity', 'memberships', 'update'],
    ['plumbrow_identity', 'memberships', 'insert'],
  ])('%s has no right on %s to %s', async (role, table, right) => {
    const check = right === 'delete' ? 'has_table_privilege' : 'has_any_column_privilege';
    const [row] = await db.asOwner<{ may: boolean }>(`select ${check}($1, $2, $3) as may`, [
      role,
      table,
      right,
    ]);
    expect(row).toEqual({ may: false });
  });

  it.each([
    ['users', 'password_hash', 'select'],
    ['users', 'password_hash', 'update'],
    ['api_tokens', 'token_hash', 'select'],
    ['api_tokens', 'token_hash', 'update'],
    ['invitations', 'token_hash', 'select'],
    ['submissions', 'file_sha256', 'update'],
    ['submissions', 'contractor_id', 'update'],
    ['projects', 'contractor_id', 'update'],
    ['projects', 'office_id', 'update'],
    ['corrections', 'edits', 'update'],
  ])('plumbrow_app cannot, of %s, %s: %s', async (table, column, right) => {
    const [row] = await db.asOwner<{ may: boolean }>(
      `select has_column_privilege('plumbrow_app', $1, $2, $3) as may`,
      [table, column, right],
    );
    expect(row).toEqual({ may: false });
  });
});
