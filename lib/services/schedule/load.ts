import { listCorrections, type CorrectionRow } from '@/db/queries/corrections';
import { listDeclined } from '@/db/queries/fixes';
import { findFile, type SubmissionRow } from '@/db/queries/submissions';
import type { Tx } from '@/db/scope';
import { replay } from '@/lib/corrections';
import type { ScheduleState } from '@/lib/schedule/weight';
import type { Sheet } from '@/lib/schedule/sheet';
import { found } from '@/lib/services/in-office';
import { readSheets } from '@/parsers';
import { recalculate } from '@/parsers/workbook';
import { Lru } from './lru';
import { proposeState } from './propose';
import { computed, readState, type Reading, type ReadState } from './state';

const cellsOf = (sheets: readonly Sheet[]): number =>
  sheets.reduce((sum, { rows, columnCount }) => sum + rows.length * columnCount, 1000);

/** What was parsed and computed last, in this process; a cache and nothing else. */
const parsed = new Lru<readonly Sheet[]>(4_000_000, cellsOf);
const states = new Lru<ReadState>(600_000, ({ list }) => 1000 + list.activities.length + list.links.length);

type Submission = SubmissionRow['submission'];

/** The sheets as received. */
export async function receivedSheets(tx: Tx, submission: Submission): Promise<readonly Sheet[]> {
  const known = parsed.get(submission.fileSha256);
  if (known) return known;
  const bytes = found(await findFile(tx, submission.id), 'file');
  const sheets = readSheets(bytes, submission.fileName);
  parsed.set(submission.fileSha256, sheets);
  return sheets;
}

export function rememberSheets(sha256: string, sheets: readonly Sheet[]): void {
  parsed.set(sha256, sheets);
}

/** The submission's list in a state, as of the version that the row was read at. */
export async function loadState(tx: Tx, submission: Submission, state: ScheduleState): Promise<ReadState> {
  const key = keyOf(submission, state);
  const known = states.get(key);
  if (known) return known;
  const made = await makeState(tx, submission, state);
  states.set(key, made);
  return made;
}

/** Keeps what a change has just computed for the version it leads to. */
export function rememberState(
  submission: { id: string; version: number },
  state: ScheduleState,
  made: ReadState,
): void {
  states.set(keyOf(submission, state), made);
}

/** What was received never changes, whatever the version. */
function keyOf({ id, version }: { id: string; version: number }, state: ScheduleState): string {
  return state === 'received' ? `${id} received` : `${id} ${state} ${version}`;
}

async function makeState(tx: Tx, submission: Submission, state: ScheduleState): Promise<ReadState> {
  const how: Reading = submission;
  if (state === 'received') return readState(await receivedSheets(tx, submission), how);
  if (state === 'corrected') {
    const corrections = await listCorrections(tx, submission.id);
    if (corrections.length === 0) return loadState(tx, submission, 'received');
    const received = await receivedSheets(tx, submission);
    const { sheets } = replay(received, toEvents(corrections));
    return readState(recalculate(received, sheets).sheets, how);
  }
  const corrected = await loadState(tx, submission, 'corrected');
  if (computed(corrected)) return corrected;
  return proposeState(corrected, how, await listDeclined(tx, submission.id));
}

export function toEvents(rows: readonly Pick<CorrectionRow, 'id' | 'edits'>[]) {
  return rows.map(({ id, edits }) => ({ id, edits }));
}
