import { afterEach, describe, expect, it } from 'vitest';
import { Refusal } from '@/db/cluster/refusal';
import { migrate } from '@/db/migrate';
import { emptyDatabase, query } from '@/tests/support/database';

let drop: (() => Promise<void>) | null = null;
const fresh = async (): Promise<string> => {
  const made = await emptyDatabase();
  drop = made.drop;
  return made.url;
};
afterEach(async () => {
  await drop?.();
  drop = null;
});

describe('migrate', () => {
  it('brings an empty database up, and does nothing the second time', async () => {
    const url = await fresh();
    const first = await migrate(url);
    expect(first.applied).toBeGreaterThanOrEqual(2);
    expect(await migrate(url)).toEqual({ applied: 0 });
  });

  it('may be run by two at once', async () => {
    const url = await fresh();
    const applied = await Promise.all([migrate(url), migrate(url)]);
    expect(applied.map((result) => result.applied > 0).sort()).toEqual([false, true]);
  });

  it('refuses a database that a newer version used, in a sentence, and leaves it as it is', async () => {
    const url = await fresh();
    await migrate(url);
    await query(
      url,
      `insert into drizzle.__drizzle_migrations (hash, created_at) values ('x', 99999999999999)`,
    );
    const attempt = migrate(url);
    await expect(attempt).rejects.toBeInstanceOf(Refusal);
    await expect(attempt).rejects.toThrow(/used by a newer one/);
  });

  it('works for a user who is no superuser and has been given the roles', async () => {
    const url = new URL(await fresh());
    const owner = `owner_${url.pathname.slice(1)}`;
    const database = url.pathname.slice(1);
    await query(
      url.toString(),
      `create role ${owner} login password 'x' in role plumbrow_app, plumbrow_identity`,
    );
    await query(url.toString(), `grant create on database ${database} to ${owner}`);
    await query(url.toString(), `grant create, usage on schema public to ${owner}`);
    const own = new URL(url);
    own.username = owner;
    own.password = 'x';
    const result = await migrate(own.toString());
    expect(result.applied).toBeGreaterThanOrEqual(2);
    await query(own.toString(), 'set role plumbrow_app');
    await query(url.toString(), `drop owned by ${owner} cascade`);
    await query(url.toString(), `drop role ${owner}`);
  });

  it('says what a user without the right to take on the roles needs', async () => {
    const url = new URL(await fresh());
    const stranger = `stranger_${url.pathname.slice(1)}`;
    await query(url.toString(), `create role ${stranger} login password 'x'`);
    const own = new URL(url);
    own.username = stranger;
    own.password = 'x';
    await expect(migrate(own.toString())).rejects.toThrow(
      new RegExp(`grant plumbrow_app, plumbrow_identity to ${stranger}`),
    );
    await query(url.toString(), `drop role ${stranger}`);
  });
});
