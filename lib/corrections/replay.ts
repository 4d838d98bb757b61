import type { CellEdit } from '@/lib/schedule/edit';
import { cellAddress } from '@/lib/schedule/cell';
import type { Sheet } from '@/lib/schedule/sheet';
import { workOut } from './apply';
import type { Adoptable, Adopted, Skipped } from './compose';
import { contentOf } from './content';
import { WorkbookDraft } from './draft';

export interface Replay {
  /** Every event, in order, with `from` and `to` as they are now. */
  readonly events: readonly Adopted[];
  /** Events with an edit that finds nothing to change any more, and why. */
  readonly inapplicable: readonly Skipped[];
  /** The sheets with all that still applies. */
  readonly sheets: Sheet[];
}

/**
 * Applies events to the received sheets afresh. An edit that no longer applies keeps its event in the
 * list, with `to` equal to `from`.
 */
export function replay(received: readonly Sheet[], events: readonly Adoptable[]): Replay {
  const workbook = new WorkbookDraft(received);
  const inapplicable: Skipped[] = [];
  const replayed = events.map(({ id, edits }) => {
    let reason: string | null = null;
    const now = edits.map((edit): CellEdit => {
      const draft = workbook.sheet(edit.sheet);
      const place = draft?.place(edit.cell);
      if (!draft || !place) {
        reason ??= `There is no cell ${edit.cell} on a sheet “${edit.sheet}”.`;
        return { ...edit, to: edit.from };
      }
      const { from, to, failure } = workOut(edit, place, contentOf(draft.get(place)), draft);
      reason ??= failure;
      if (to !== from) draft.set(place, to);
      return { ...edit, cell: cellAddress(place), from, to };
    });
    if (reason !== null) inapplicable.push({ id, reason });
    return { id, edits: now };
  });
  return { events: replayed, inapplicable, sheets: workbook.finish() };
}

/** What remains when one event is taken back: the others, replayed without it. */
export function withdraw(received: readonly Sheet[], events: readonly Adoptable[], id: string): Replay {
  return replay(
    received,
    events.filter((event) => event.id !== id),
  );
}
