import { asc, count, eq } from 'drizzle-orm';
import type { Tx } from '../client';
import { contractors, projects } from '../schema';

export async function listContractors(tx: Tx) {
  return tx
    .select({ id: contractors.id, name: contractors.name, projects: count(projects.id) })
    .from(contractors)
    .leftJoin(projects, eq(projects.contractorId, contractors.id))
    .groupBy(contractors.id, contractors.name)
    .orderBy(asc(contractors.name));
}

export async function findContractor(tx: Tx, id: string) {
  const [row] = await tx
    .select({ id: contractors.id, name: contractors.name })
    .from(contractors)
    .where(eq(contractors.id, id));
  return row ?? null;
}

/** Null where there is one of that name. */
export async function insertContractor(tx: Tx, values: { officeId: string; name: string }) {
  const [row] = await tx
    .insert(contractors)
    .values(values)
    .onConflictDoNothing({ target: [contractors.officeId, contractors.name] })
    .returning({ id: contractors.id, name: contractors.name });
  return row ?? null;
}
