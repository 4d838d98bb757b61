import { cellAddress, parseAddress } from '@/lib/schedule/cell';
import type { CellEditView, FindingView } from '@/lib/contract/submission';
import type { SheetColumnView, SheetRowsView } from '@/lib/contract/sheet-rows';
import { contentText } from '../edit-text';

/** Which cells of the sheet the bench shows, and what stands in them. */

const ESTIMATES = ['optimistic', 'likely', 'pessimistic', 'duration'];
const LINKS = ['predecessors', 'successors', 'relation', 'lag'];
/** Rows shown; the rest are counted. */
export const MOST_ROWS = 8;

/** Addresses that are outlined: the finding's own cell and those its fix would change, on one sheet. */
export function markedCells(finding: FindingView, edits: readonly CellEditView[]): ReadonlySet<string> {
  const cells = edits.filter(({ sheet }) => sheet === finding.sheet).map(({ cell }) => cell.toUpperCase());
  if (finding.cell) cells.unshift(finding.cell.toUpperCase());
  return new Set(cells);
}

/** Rows to show, ascending: the finding's own and those of its edits. */
export function rowsToShow(finding: FindingView, edits: readonly CellEditView[]): number[] {
  const rows = new Set<number>();
  if (finding.row !== null) rows.add(finding.row);
  for (const { sheet, cell } of edits) {
    const row = sheet === finding.sheet ? parseAddress(cell)?.row : undefined;
    if (row !== undefined) rows.add(row);
  }
  return [...rows].sort((x, y) => x - y);
}

/** The name (else the ID), the columns with a marked cell, and what belongs together with those: all estimates, all of a link. */
export function columnsToShow(
  columns: readonly SheetColumnView[],
  marked: ReadonlySet<string>,
): SheetColumnView[] {
  const indices = new Set([...marked].map((address) => parseAddress(address)?.column));
  const fields = columns.filter(({ index }) => indices.has(index)).map(({ field }) => field);
  const together = [ESTIMATES, LINKS].filter((group) => fields.some((field) => group.includes(field))).flat();
  const naming = columns.some(({ field }) => field === 'name') ? 'name' : 'id';
  return columns.filter(
    ({ index, field }) => field === naming || indices.has(index) || together.includes(field),
  );
}

const SYMBOLS: Readonly<Record<string, string>> = { optimistic: 'a', likely: 'm', pessimistic: 'b' };

/** What a column holds, as short as its heading must be. */
export function columnHeading({ field, title }: SheetColumnView): string {
  return SYMBOLS[field] ?? title;
}

/** What a cell shows: its content, or a change from one to another. */
export type CellShown =
  | { readonly kind: 'same'; readonly text: string }
  | { readonly kind: 'made' | 'proposed'; readonly from: string; readonly to: string };

/** A proposal on top of what is there now; else what corrections have made of what was received. */
export function cellShown(received: string, corrected: string, proposed: string | undefined): CellShown {
  if (proposed !== undefined && proposed !== corrected) {
    return { kind: 'proposed', from: corrected, to: proposed };
  }
  if (corrected !== received) return { kind: 'made', from: received, to: corrected };
  return { kind: 'same', text: corrected };
}

/** By address, what a fix that is not in force yet would write. */
export function proposedTexts(edits: readonly CellEditView[], sheet: string): ReadonlyMap<string, string> {
  return new Map(
    edits.filter((edit) => edit.sheet === sheet).map(({ cell, to }) => [cell.toUpperCase(), contentText(to)]),
  );
}

/** What a cell holds as corrected; undefined where the piece does not show it. */
export function currentText(piece: SheetRowsView, address: string): string | undefined {
  const at = parseAddress(address);
  if (!at) return undefined;
  const position = piece.columns.findIndex(({ index }) => index === at.column);
  return piece.rows.find(({ row }) => row === at.row)?.corrected.cells[position];
}

export function columnTitle(piece: SheetRowsView, address: string): string | undefined {
  const at = parseAddress(address);
  return piece.columns.find(({ index }) => index === at?.column)?.title;
}

export function addressOf(column: SheetColumnView, row: number): string {
  return cellAddress({ row, column: column.index });
}
