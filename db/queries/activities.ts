import { asc, eq, sql } from 'drizzle-orm';
import type { Tx } from '../client';
import { activities, type ActivityData } from '../schema';
import { inBatches } from './bulk';

export interface NewActivity {
  readonly position: number;
  readonly activity_id: string;
  readonly name: string;
  readonly sheet: string;
  readonly row: number;
  readonly data: ActivityData;
}

export async function insertActivities(
  tx: Tx,
  officeId: string,
  submissionId: string,
  rows: readonly NewActivity[],
): Promise<void> {
  await inBatches(
    tx,
    rows,
    (json) => sql`
      insert into activities (office_id, submission_id, position, activity_id, name, sheet, row, data)
      select ${officeId}, ${submissionId}, r.position, r.activity_id, r.name, r.sheet, r.row, r.data
      from json_to_recordset(${json})
        as r(position int, activity_id text, name text, sheet text, row int, data jsonb)`,
  );
}

/** As received, in the list's order. */
export async function listActivities(tx: Tx, submissionId: string) {
  return tx
    .select({
      id: activities.activityId,
      name: activities.name,
      sheet: activities.sheet,
      row: activities.row,
      data: activities.data,
    })
    .from(activities)
    .where(eq(activities.submissionId, submissionId))
    .orderBy(asc(activities.position));
}
