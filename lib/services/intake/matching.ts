import { Invalid } from '@/lib/contract/errors';
import type { MatchingForm } from '@/lib/contract/intake';
import type { Matching } from '@/lib/schedule/field';
import type { Sheet } from '@/lib/schedule/sheet';
import { matchingFrom, UnmatchedColumns } from '@/parsers';
import { refusing } from './upload';
import { intakeViewOf } from './view';

/** How the list is read: as told by the sender, else as detected; refused, with what was detected, where neither does. */
export function settleMatching(sheets: readonly Sheet[], wanted: MatchingForm): Matching {
  try {
    return matchingFrom(wanted, sheets);
  } catch (error) {
    if (!(error instanceof UnmatchedColumns)) throw error;
    // A list of too many rows cannot be shown as it will be read, and is refused for that.
    const members = refusing(() => ({ ...intakeViewOf(sheets, error.detection) }));
    throw new Invalid(error.message, { errors: error.errors, members });
  }
}
