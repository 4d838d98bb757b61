import { type Area, cellCount, covers, type SheetArea } from './areas';
import type { FormulaCell } from './formulas';
import { type NameBook, referencesOf } from './references';

export interface SheetFormulas {
  readonly sheet: string;
  readonly formulas: readonly FormulaCell[];
}

interface Node {
  readonly sheet: string;
  readonly formula: FormulaCell;
}

/** Ranges up to this many cells are looked up by cell, larger ones one by one. */
const SMALL = 64;
const COLUMNS = 16_384;
const keyOf = (sheet: string, row: number, column: number) =>
  `${sheet.toLowerCase()} ${row * COLUMNS + column}`;

function* cellsIn(area: Area): Generator<[row: number, column: number]> {
  for (let row = area.top; row <= area.bottom; row += 1)
    for (let column = area.left; column <= area.right; column += 1) yield [row, column];
}

/** Which formulas read which cells. */
class Readers {
  private readonly byCell = new Map<string, Node[]>();
  private large: { readonly area: SheetArea; readonly node: Node }[] = [];

  add(area: SheetArea, node: Node): void {
    if (cellCount(area) > SMALL) this.large.push({ area, node });
    else
      for (const [row, column] of cellsIn(area)) {
        const key = keyOf(area.sheet, row, column);
        const there = this.byCell.get(key);
        if (there) there.push(node);
        else this.byCell.set(key, [node]);
      }
  }

  /** The formulas that read a cell; a large range is given once and then forgotten. */
  take(sheet: string, row: number, column: number): Node[] {
    const key = keyOf(sheet, row, column);
    const nodes = this.byCell.get(key) ?? [];
    this.byCell.delete(key);
    const name = sheet.toLowerCase();
    const hit = ({ area }: { area: SheetArea }) =>
      area.sheet.toLowerCase() === name && covers(area, row, column);
    if (!this.large.some(hit)) return nodes;
    const found = this.large.filter(hit).map(({ node }) => node);
    this.large = this.large.filter((each) => !hit(each));
    return [...nodes, ...found];
  }
}

/**
 * The formulas whose stored results no longer hold once some cells change: those that read one of them,
 * those that read the result of such a formula, and so on; also those whose reading their text does not show.
 */
export function staleFormulas(
  sheets: readonly SheetFormulas[],
  changed: readonly { sheet: string; row: number; column: number }[],
  book: NameBook,
): Map<string, Set<FormulaCell>> {
  const readers = new Readers();
  const stale = new Map(sheets.map(({ sheet }) => [sheet, new Set<FormulaCell>()]));
  const waiting = changed.map(({ sheet, row, column }) => ({ sheet, row, column }));
  const spoil = ({ sheet, formula }: Node) => {
    const known = stale.get(sheet);
    if (!known || known.has(formula)) return;
    known.add(formula);
    for (const [row, column] of cellsIn(formula.area)) waiting.push({ sheet, row, column });
  };
  for (const { sheet, formulas } of sheets) {
    for (const formula of formulas) {
      const node = { sheet, formula };
      const { row, column, text } = formula;
      const { areas, unsure } = referencesOf(text, { sheet, row, column }, book);
      for (const area of areas) readers.add(area, node);
      if (unsure || text === '') spoil(node);
    }
  }
  for (let cell = waiting.pop(); cell; cell = waiting.pop()) {
    for (const node of readers.take(cell.sheet, cell.row, cell.column)) spoil(node);
  }
  return stale;
}
