import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate as applyMigrations } from 'drizzle-orm/node-postgres/migrator';
import { Client, DatabaseError } from 'pg';
import { Refusal } from './cluster/refusal';

const FOLDER = fileURLToPath(new URL('../drizzle', import.meta.url));
const OLDEST_VERSION = 150_000;
/** Of no meaning but that every migration takes the same one. */
const LOCK = 7_586_279_012;
const ROLES = ['plumbrow_app', 'plumbrow_identity'] as const;

/** Makes the roles where they are missing and brings the database to this program's state. Safe to run twice at once. */
export async function migrate(url: string): Promise<{ applied: number }> {
  const client = new Client({ connectionString: url, application_name: 'plumbrow migrate' });
  await client.connect();
  try {
    await client.query('select pg_advisory_lock($1)', [LOCK]);
    const version = await serverVersion(client);
    for (const role of ROLES) await ensureRole(client, role, version);
    const before = await appliedMigrations(client);
    await refuseNewer(before);
    await applyMigrations(drizzle(client), { migrationsFolder: FOLDER });
    return { applied: (await appliedMigrations(client)).length - before.length };
  } finally {
    await client.end();
  }
}

async function serverVersion(client: Client): Promise<number> {
  const { rows } = await client.query<{ number: number; name: string }>(
    `select current_setting('server_version_num')::int as number, current_setting('server_version') as name`,
  );
  const version = rows[0];
  if (!version || version.number < OLDEST_VERSION) {
    throw new Refusal(
      `The database server is PostgreSQL ${version?.name ?? 'of an unknown version'}; Plumbrow needs 15 or later.`,
    );
  }
  return version.number;
}

/** Roles belong to the cluster: another database may have made them, or be making them now. */
async function ensureRole(client: Client, role: string, version: number): Promise<void> {
  const kind = version >= 160_000 ? 'SET' : 'MEMBER';
  try {
    await client.query(`
      do $$ begin
        if not exists (select from pg_roles where rolname = '${role}') then create role ${role} nologin; end if;
      exception when duplicate_object or unique_violation then null;
      end $$`);
    const { rows } = await client.query<{ may: boolean }>('select pg_has_role(current_user, $1, $2) as may', [
      role,
      kind,
    ]);
    if (!rows[0]?.may) await client.query(`grant ${role} to current_user`);
  } catch (error) {
    if (!(error instanceof DatabaseError) || error.code !== '42501') throw error;
    throw new Refusal(
      `The database's user may not make or take on the role ${role}. Have its administrator run: ` +
        `create role plumbrow_app nologin; create role plumbrow_identity nologin; ` +
        `grant plumbrow_app, plumbrow_identity to ${client.user ?? 'that user'};`,
    );
  }
}

async function appliedMigrations(client: Client): Promise<number[]> {
  const { rows } = await client.query<{ there: boolean }>(
    `select to_regclass('drizzle.__drizzle_migrations') is not null as there`,
  );
  if (!rows[0]?.there) return [];
  const applied = await client.query<{ created_at: string }>(
    'select created_at from drizzle.__drizzle_migrations order by created_at',
  );
  return applied.rows.map((row) => Number(row.created_at));
}

async function refuseNewer(applied: readonly number[]): Promise<void> {
  const journal = JSON.parse(await readFile(join(FOLDER, 'meta', '_journal.json'), 'utf8')) as {
    entries: { when: number }[];
  };
  const known = new Set(journal.entries.map((entry) => entry.when));
  const unknown = applied.filter((when) => !known.has(when)).length;
  if (unknown === 0) return;
  throw new Refusal(
    `The database has ${unknown === 1 ? 'a migration' : `${unknown} migrations`} that this version of Plumbrow does not know: ` +
      'it was used by a newer one. Use that version, or another database.',
  );
}
