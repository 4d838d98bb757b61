import type { CellEdit } from '@/lib/schedule/edit';
import { cellAddress, parseAddress } from '@/lib/schedule/cell';
import type { CellContent, Sheet } from '@/lib/schedule/sheet';
import { contentOf, isWritable, settle } from './content';
import { WorkbookDraft } from './draft';

/** The bounds of a worksheet and of a cell's text (ECMA-376, as spreadsheet programs keep them). */
export const SHEET_LIMITS = { rows: 1_048_576, columns: 16_384, text: 32_767 } as const;

export interface HandEdit {
  readonly sheet: string;
  readonly cell: string;
  readonly to: CellContent;
}

export interface EditProblem {
  /** Position of the edit in the request, and the field at fault: `edits.0.cell`. */
  readonly path: string;
  /** A plain sentence. */
  readonly message: string;
}

export interface CheckedEdits {
  /** Ready to be applied, with what the cells hold at present; empty where there is a problem. */
  readonly edits: readonly CellEdit[];
  readonly problems: readonly EditProblem[];
}

function contentProblem(to: CellContent): string | null {
  if (typeof to === 'number') return Number.isFinite(to) ? null : 'A number must be finite.';
  if (to === null) return null;
  if (to.length > SHEET_LIMITS.text) return 'A cell holds at most 32 767 characters.';
  return isWritable(to) ? null : 'This text has a character that a workbook cannot hold.';
}

function placeProblem(workbook: WorkbookDraft, { sheet, cell }: HandEdit): [string, string] | null {
  const draft = workbook.sheet(sheet);
  if (!draft) return ['sheet', `There is no sheet “${sheet}” in this file.`];
  const place = parseAddress(cell);
  if (!place) return ['cell', `“${cell}” is no address of a cell, such as G23.`];
  const { rows, columns } = SHEET_LIMITS;
  if (place.row > rows || place.column >= columns) return ['cell', `${cell} lies outside the sheet.`];
  const anchor = cellAddress(draft.place(cell) ?? place);
  if (anchor === cellAddress(place)) return null;
  return ['cell', `${cell} is covered by the merged cell ${anchor}; change that one.`];
}

/**
 * Checks edits made by hand against the sheets as they are at present. All or nothing: with a problem
 * there are no edits.
 */
export function checkHandEdits(sheets: readonly Sheet[], edits: readonly HandEdit[]): CheckedEdits {
  const workbook = new WorkbookDraft(sheets);
  const problems: EditProblem[] = [];
  const checked: CellEdit[] = [];
  const seen = new Set<string>();
  edits.forEach((edit, index) => {
    const say = (field: string, message: string) =>
      problems.push({ path: `edits.${index}.${field}`, message });
    const wrongPlace = placeProblem(workbook, edit);
    const wrongContent = contentProblem(edit.to);
    if (wrongPlace) say(...wrongPlace);
    if (wrongContent) say('to', wrongContent);
    const draft = workbook.sheet(edit.sheet);
    const place = draft?.place(edit.cell);
    if (!draft || !place || wrongPlace || wrongContent) return;
    const cell = cellAddress(place);
    if (seen.has(`${cell} ${edit.sheet}`)) say('cell', `${cell} is changed twice; send it once.`);
    seen.add(`${cell} ${edit.sheet}`);
    const value = draft.get(place);
    const from = contentOf(value);
    const to = settle(value, edit.to, () => draft.habit(place.column));
    if (to === from) say('to', `${cell} holds this already.`);
    checked.push({ sheet: edit.sheet, cell, from, to });
  });
  return { edits: problems.length > 0 ? [] : checked, problems };
}
