import { sql } from 'drizzle-orm';
import { database, type Tx } from './client';
import { NO_CONTRACTOR } from './schema/policy';

export type { Tx } from './client';

/** In whose name a query runs: ids. `contractor` is null for people of the office itself. */
export interface OfficeScope {
  readonly office: string;
  readonly user: string;
  readonly contractor: string | null;
}

/**
 * One transaction as the application's role, in which row-level security shows what the scope may see.
 * Rolled back where `work` throws.
 */
export function withOffice<T>(scope: OfficeScope, work: (tx: Tx) => Promise<T>): Promise<T> {
  return database().transaction(async (tx) => {
    await enterOffice(tx, scope);
    return work(tx);
  });
}

/** Goes on as the application's role in a transaction that began as another, once it is known for whom. */
export async function enterOffice(tx: Tx, scope: OfficeScope): Promise<void> {
  await tx.execute(
    sql`select set_config('app.office', ${scope.office}, true),
               set_config('app.user', ${scope.user}, true),
               set_config('app.contractor', ${scope.contractor ?? NO_CONTRACTOR}, true),
               set_config('role', 'plumbrow_app', true)`,
  );
}

/** One transaction for what happens before an office is known: sign-in, tokens, invitations, a person's offices. */
export function withIdentity<T>(work: (tx: Tx) => Promise<T>): Promise<T> {
  return database().transaction(async (tx) => {
    await tx.execute(sql`select set_config('role', 'plumbrow_identity', true)`);
    return work(tx);
  });
}

/** The database answers. */
export async function ping(): Promise<void> {
  await database().execute(sql`select 1`);
}
