import { cellAddress, parseAddress } from '@/lib/schedule/cell';
import type { Sheet, SheetFormula, SheetRow } from '@/lib/schedule/sheet';
import { KNOWN_FUNCTIONS } from '@/parsers/xlsx/arithmetic-functions';
import { fillMissingResults } from '@/parsers/xlsx/missing-results';
import { staleFormulas } from './xlsx/dependents';
import type { FormulaCell } from './xlsx/formulas';
import type { NameBook } from './xlsx/references';

interface Cell {
  readonly sheet: string;
  readonly row: number;
  readonly column: number;
}

/** Numbers that formulas come to after a change: by sheet and address. */
export type Results = ReadonlyMap<string, ReadonlyMap<string, number>>;

/** Sheets alone do not tell what a name stands for; a formula with one is not worked out anyway. */
const NO_NAMES: NameBook = { names: new Map(), tables: [] };

/**
 * Works out anew the formulas that rest on changed cells, as a spreadsheet does when it opens the file. What is
 * more than arithmetic keeps the result it had. `before` are the sheets that `after` was made from, row by row:
 * rows that are the same object are taken to be unchanged.
 */
export function recalculate(
  before: readonly Sheet[],
  after: readonly Sheet[],
): { sheets: Sheet[]; results: Results } {
  const results = new Map<string, Map<string, number>>();
  const changed = after.every(({ formulas }) => formulas.size === 0) ? [] : changesBetween(before, after);
  if (changed.length === 0) return { sheets: [...after], results };
  const formulas = after.map((sheet) => ({ sheet: sheet.name, formulas: formulasIn(sheet) }));
  const stale = staleFormulas(formulas, changed, NO_NAMES);
  const waiting = after.map((sheet) => withoutResults(sheet, stale.get(sheet.name) ?? new Set()));
  const worked = fillMissingResults(waiting, KNOWN_FUNCTIONS);
  const sheets = after.map((sheet, i) => {
    const filled = numbersOf(worked[i] ?? sheet, stale.get(sheet.name) ?? new Set());
    results.set(sheet.name, filled);
    return withNumbers(sheet, filled);
  });
  return { sheets, results };
}

function changesBetween(before: readonly Sheet[], after: readonly Sheet[]): Cell[] {
  return after.flatMap((sheet, i) => {
    const old = before[i];
    if (old === sheet) return [];
    const rows = new Map(old?.rows.map((row) => [row.number, row]));
    return sheet.rows.flatMap((row) => {
      const was = rows.get(row.number);
      if (was === row) return [];
      const width = Math.max(row.cells.length, was?.cells.length ?? 0);
      return Array.from({ length: width }, (_, column) => column)
        .filter((column) => (row.cells[column] ?? null) !== (was?.cells[column] ?? null))
        .map((column) => ({ sheet: sheet.name, row: row.number, column }));
    });
  });
}

function formulasIn({ formulas }: Sheet): FormulaCell[] {
  return [...formulas].flatMap(([address, { text }]) => {
    const place = parseAddress(address);
    if (!place || text === '') return [];
    const { row, column } = place;
    const area = { top: row, bottom: row, left: column, right: column };
    return [{ row, column, text, kind: 'own', group: '', leads: false, area }];
  });
}

/** Rows of a sheet with some cells exchanged. */
function withCells(
  sheet: Sheet,
  cells: Iterable<{ row: number; column: number; value: number | null }>,
): SheetRow[] {
  const byRow = new Map<number, { column: number; value: number | null }[]>();
  for (const { row, ...cell } of cells) {
    const there = byRow.get(row);
    if (there) there.push(cell);
    else byRow.set(row, [cell]);
  }
  return sheet.rows.map((row) => {
    const here = byRow.get(row.number);
    if (!here) return row;
    const copy = [...row.cells];
    for (const { column, value } of here) copy[column] = value;
    return { ...row, cells: copy };
  });
}

function withoutResults(sheet: Sheet, stale: ReadonlySet<FormulaCell>): Sheet {
  if (stale.size === 0) return sheet;
  const formulas = new Map<string, SheetFormula>(sheet.formulas);
  const cells = [...stale].map(({ row, column, text }) => {
    formulas.set(cellAddress({ row, column }), { text, hasResult: false });
    return { row, column, value: null };
  });
  return { ...sheet, formulas, rows: withCells(sheet, cells) };
}

function numbersOf({ rows }: Sheet, stale: ReadonlySet<FormulaCell>): Map<string, number> {
  const byNumber =
    stale.size === 0 ? new Map<number, SheetRow>() : new Map(rows.map((row) => [row.number, row]));
  const found = new Map<string, number>();
  for (const { row, column } of stale) {
    const value = byNumber.get(row)?.cells[column];
    if (typeof value === 'number') found.set(cellAddress({ row, column }), value);
  }
  return found;
}

function withNumbers(sheet: Sheet, numbers: ReadonlyMap<string, number>): Sheet {
  if (numbers.size === 0) return sheet;
  const rows = new Map(sheet.rows.map((row) => [row.number, row]));
  const cells = [...numbers].flatMap(([address, value]) => {
    const place = parseAddress(address);
    return place && rows.get(place.row)?.cells[place.column] !== value ? [{ ...place, value }] : [];
  });
  return cells.length === 0 ? sheet : { ...sheet, rows: withCells(sheet, cells) };
}
