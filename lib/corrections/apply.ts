import { cellAddress } from '@/lib/schedule/cell';
import type { CellEdit } from '@/lib/schedule/edit';
import type { CellContent, Sheet } from '@/lib/schedule/sheet';
import { contentOf, settle, textOf } from './content';
import { type Place, type SheetDraft, WorkbookDraft } from './draft';
import { applyItems } from '@/lib/schedule/link-items';

/** What was adopted in one step: a fix's edits, or edits by hand. */
export interface CorrectionEvent {
  readonly edits: readonly CellEdit[];
}

/** Single edits and whole events may be mixed; their order is the order of adoption. */
export type Corrections = readonly (CellEdit | CorrectionEvent)[];

export function editsOf(corrections: Corrections): CellEdit[] {
  return corrections.flatMap((entry) => ('edits' in entry ? entry.edits : [entry]));
}

/** What an edit comes to on the present content of its cell. */
export interface Outcome {
  readonly from: CellContent;
  readonly to: CellContent;
  /** Why it changes nothing; null where it does. */
  readonly failure: string | null;
}

/** Works an edit out on a cell as it stands: entry by entry where it has `items`, else by setting the cell. */
export function workOut(edit: CellEdit, place: Place, present: CellContent, draft: SheetDraft): Outcome {
  const habit = () => draft.habit(place.column);
  if (!edit.items) {
    const to = settle(present, edit.to, habit);
    const failure = to === present ? `${edit.cell} holds ${shown(to)} already.` : null;
    return { from: present, to, failure };
  }
  const { text, unmet } = applyItems(textOf(present), edit.items, edit.separator, textOf(edit.to));
  const [first] = unmet;
  const failure = first
    ? first.op === 'add'
      ? `${edit.cell} names “${first.item}” already.`
      : `${edit.cell} no longer names “${first.item}”.`
    : null;
  return { from: present, to: settle(present, text, habit), failure };
}

export const shown = (content: CellContent) => (content === null ? 'nothing' : `“${content}”`);

/**
 * The sheets as corrected. Sheets and rows without a correction are the received ones; the formula of a
 * cell that is set goes. What no longer applies (an entry that is not there) is left out: `replay` tells.
 */
export function applyCorrections(sheets: readonly Sheet[], corrections: Corrections): Sheet[] {
  const draft = new WorkbookDraft(sheets);
  for (const edit of editsOf(corrections)) {
    const sheet = draft.sheet(edit.sheet);
    const place = sheet?.place(edit.cell);
    if (!sheet || !place) continue;
    const { from, to } = workOut(edit, place, contentOf(sheet.get(place)), sheet);
    if (to !== from) sheet.set(place, to);
  }
  return draft.finish();
}

/** A cell found by its address: where it really is, and what it holds. */
export interface FoundCell extends Place {
  readonly cell: string;
  readonly content: CellContent;
}

/** Looks cells up by sheet and address; null where there is no such cell. */
export function cellReader(sheets: readonly Sheet[]): (sheet: string, address: string) => FoundCell | null {
  const draft = new WorkbookDraft(sheets);
  return (name, address) => {
    const sheet = draft.sheet(name);
    const place = sheet?.place(address);
    return sheet && place
      ? { ...place, cell: cellAddress(place), content: contentOf(sheet.get(place)) }
      : null;
  };
}

/** What a cell of the sheets holds; null where there is no such cell. */
export function contentAt(sheets: readonly Sheet[], sheet: string, address: string): CellContent {
  return cellReader(sheets)(sheet, address)?.content ?? null;
}
