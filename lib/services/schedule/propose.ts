import { composeAdoption } from '@/lib/corrections';
import { recalculate } from '@/parsers/workbook';
import { blockingOf, readState, type Reading, type ReadState } from './state';

/** Fixing one defect can bring another to light; beyond this many rounds it is left at that. */
const ROUNDS = 5;

/**
 * The state with the proposed fixes of its blocking findings adopted as well, in so many rounds as it takes.
 * Blocking findings are left where they have no fix, or one that was `declined` (by the finding's key).
 */
export async function proposeState(
  corrected: ReadState,
  how: Reading,
  declined: ReadonlySet<string> = new Set(),
): Promise<ReadState> {
  let state = corrected;
  for (let round = 0; round < ROUNDS; round += 1) {
    const fixes = blockingOf(state).flatMap(({ key, fix }) =>
      fix && !declined.has(key) ? [{ id: key, edits: fix.edits }] : [],
    );
    const { adopted, sheets } = composeAdoption(state.sheets, fixes);
    if (adopted.length === 0) break;
    state = await readState(recalculate(state.sheets, sheets).sheets, how);
  }
  return state;
}
