import { findSubmission, type SubmissionRow } from '@/db/queries/submissions';
import type { Tx } from '@/db/scope';
import { found } from '@/lib/services/in-office';

/** The submission, as far as the asker may see it; else it is not found. */
export async function requireSubmission(tx: Tx, id: string): Promise<SubmissionRow> {
  return found(await findSubmission(tx, id), 'submission');
}
