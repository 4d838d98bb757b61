import { insertRecordEntry, recordHead } from '@/db/queries/record';
import type { Tx } from '@/db/scope';
import type { OfficeContext } from '@/lib/access/context';
import { storable } from '@/db/storable';
import { entryHash } from './hash';
import type { RecordEvent } from './sentence';

interface Actor {
  readonly office: { readonly id: string };
  readonly user: OfficeContext['user'];
}

interface Place {
  /** Null: what belongs to the office as a whole. */
  readonly submission: string | null;
  /** `inside`: not for the contractor. */
  readonly audience?: 'inside' | 'shared';
}

/** Adds an entry to its chain, within the transaction of what it tells of; the chain is locked from here on. */
export async function appendRecord(
  tx: Tx,
  { office, user }: Actor,
  event: RecordEvent,
  place: Place,
): Promise<void> {
  const { submission, audience = 'shared' } = place;
  const head = await recordHead(tx, submission);
  const at = new Date();
  const data: Readonly<Record<string, unknown>> = storable({ ...event.data });
  const entry = {
    sequence: head.sequence + 1,
    verb: event.verb,
    audience,
    data,
    actorName: user.name,
  };
  const hash = entryHash(head.hash, {
    ...entry,
    office: office.id,
    submission,
    at: at.toISOString(),
    actor: user.id,
  });
  await insertRecordEntry(tx, {
    ...entry,
    officeId: office.id,
    submissionId: submission,
    at,
    actorId: user.id,
    previousHash: head.hash,
    hash,
  });
}
