import { type Area, covers, type SheetArea } from './areas';
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

function* cellsIn(area: Area): Generator<[row: number, column: number]> {
  for (let row = area.top; row <= area.bottom; row += 1)
    for (let column = area.left; column <= area.right; column += 1) yield [row, column];
}

/** Ranges wider than this are kept by row alone. */
const WIDE = 64;
/** As many as a sheet has rows, and a power of two. */
const ROWS = 1 << 20;

interface Reader {
  readonly area: Area;
  readonly node: Node;
}

/**
 * Which formulas read the cells of a column (or, for wide ranges, of a sheet): a segment tree over its rows,
 * so that thousands of running totals cost no more than thousands of single cells (Bentley, 1977).
 */
class RowTree {
  private readonly readers = new Map<number, Reader[]>();

  add(reader: Reader): void {
    let low = reader.area.top - 1 + ROWS;
    let high = Math.min(reader.area.bottom, ROWS) + ROWS;
    for (; low < high; low >>= 1, high >>= 1) {
      if (low & 1) this.put(low++, reader);
      if (high & 1) this.put(--high, reader);
    }
  }

  /** The formulas that read a cell; each is given once and then forgotten. */
  take(row: number, column: number): Node[] {
    const found: Node[] = [];
    for (let at = row - 1 + ROWS; at >= 1; at >>= 1) {
      const here = this.readers.get(at);
      if (!here) continue;
      const left = here.filter(({ area }) => !covers(area, row, column));
      for (const { area, node } of here) if (covers(area, row, column)) found.push(node);
      if (left.length > 0) this.readers.set(at, left);
      else this.readers.delete(at);
    }
    return found;
  }

  private put(at: number, reader: Reader): void {
    const here = this.readers.get(at);
    if (here) here.push(reader);
    else this.readers.set(at, [reader]);
  }
}

/** Which formulas read which cells. */
class Readers {
  private readonly trees = new Map<string, RowTree>();

  add({ sheet, ...area }: SheetArea, node: Node): void {
    if (area.right - area.left >= WIDE) this.tree(sheet, 'wide').add({ area, node });
    else
      for (let column = area.left; column <= area.right; column += 1) {
        this.tree(sheet, column).add({ area, node });
      }
  }

  take(sheet: string, row: number, column: number): Node[] {
    return [...this.tree(sheet, column).take(row, column), ...this.tree(sheet, 'wide').take(row, column)];
  }

  private tree(sheet: string, column: number | 'wide'): RowTree {
    const key = `${column} ${sheet.toLowerCase()}`;
    const tree = this.trees.get(key) ?? new RowTree();
    this.trees.set(key, tree);
    return tree;
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
