import { cellAddress, parseAddress } from '@/lib/schedule/cell';
import { type CellValue, ErrorValue, type Sheet, type SheetRow } from '@/lib/schedule/sheet';
import { evaluate, type Operands } from './arithmetic';
import type { Operand } from './arithmetic-functions';

/** A formula without a stored result. */
interface Pending {
  readonly sheet: Sheet;
  readonly row: number;
  readonly column: number;
  readonly text: string;
  state: 'waiting' | 'open' | 'done';
}

/** Cells that sums may visit in a workbook. */
const VISITS_MAX = 2_000_000;

/**
 * Fills in the results that a file does not keep, where the formula is plain arithmetic on cells that can
 * be read, or made of the functions given; the others stay empty. Returns the sheets given, rows copied where something was filled in.
 */
export function fillMissingResults(sheets: readonly Sheet[], functions?: ReadonlySet<string>): Sheet[] {
  const pending = sheets.map(pendingOf);
  if (pending.every((ones) => ones.size === 0)) return [...sheets];
  const filler = new Filler(sheets, pending, functions);
  for (const ones of pending) for (const one of ones.values()) filler.settle(one);
  return filler.result();
}

function pendingOf(sheet: Sheet): Map<string, Pending> {
  const pending = new Map<string, Pending>();
  for (const [address, { text, hasResult }] of sheet.formulas) {
    const place = hasResult || text === '' ? null : parseAddress(address);
    if (place) pending.set(address, { sheet, ...place, text, state: 'waiting' });
  }
  return pending;
}

class Filler {
  private readonly rows: Map<number, SheetRow>[];
  private readonly indexOf = new Map<Sheet, number>();
  private readonly byName = new Map<string, number>();
  private visits = 0;

  constructor(
    private readonly sheets: readonly Sheet[],
    private readonly pending: readonly Map<string, Pending>[],
    private readonly functions: ReadonlySet<string> | undefined,
  ) {
    this.rows = sheets.map((sheet) => new Map(sheet.rows.map((row) => [row.number, row])));
    sheets.forEach((sheet, i) => {
      this.indexOf.set(sheet, i);
      this.byName.set(sheet.name.toLowerCase(), i);
    });
  }

  /** Works out a formula after those it rests on; a formula that rests on itself gets no result. */
  settle(first: Pending): void {
    const stack = [first];
    for (let one = stack.at(-1); one; one = stack.at(-1)) {
      if (one.state === 'done') {
        stack.pop();
        continue;
      }
      const needs: Pending[] = [];
      const value = evaluate(one.text, this.operandsFor(one, needs), this.functions);
      const unsettled = one.state === 'waiting' ? needs.filter(({ state }) => state === 'waiting') : [];
      one.state = 'open';
      if (unsettled.length > 0) {
        stack.push(...unsettled);
        continue;
      }
      one.state = 'done';
      stack.pop();
      if (needs.length === 0) this.put(one, value);
    }
  }

  result(): Sheet[] {
    return this.sheets.map((sheet, i) => ({
      ...sheet,
      rows: sheet.rows.map((row) => this.rows[i]?.get(row.number) ?? row),
    }));
  }

  private put({ sheet, row, column }: Pending, value: Operand): void {
    const rows = this.rows[this.indexOf.get(sheet) ?? -1];
    const held = rows?.get(row);
    if (!held || value === null) return;
    const cells = [...held.cells];
    cells[column] = typeof value === 'number' ? value : new ErrorValue(value.error);
    rows?.set(row, { ...held, cells });
  }

  private operandsFor(one: Pending, needs: Pending[]): Operands {
    const own = this.indexOf.get(one.sheet) ?? -1;
    const find = (name: string) => (name === '' ? own : (this.byName.get(name.toLowerCase()) ?? -1));
    const read = (sheet: number, row: number, column: number): CellValue | undefined => {
      const awaited = this.pending[sheet]?.get(cellAddress({ row, column }));
      if (awaited && awaited.state !== 'done') needs.push(awaited);
      const value = this.rows[sheet]?.get(row)?.cells[column] ?? null;
      // A formula that was worked out to nothing cannot be read.
      return awaited?.state === 'done' && value === null ? undefined : value;
    };
    return {
      cell: (name, row, column) => {
        const sheet = find(name);
        return sheet < 0 ? null : toOperand(read(sheet, row, column));
      },
      numbers: (name, top, left, bottom, right) => {
        const sheet = find(name);
        this.visits += (bottom - top + 1) * (right - left + 1);
        if (sheet < 0 || this.visits > VISITS_MAX) return null;
        const numbers: number[] = [];
        for (let row = top; row <= bottom; row++) {
          for (let column = left; column <= right; column++) {
            const value = read(sheet, row, column);
            if (value === undefined) return null;
            if (value instanceof ErrorValue) return { error: value.code };
            if (typeof value === 'number') numbers.push(value);
          }
        }
        return numbers;
      },
    };
  }
}

/** An empty cell counts as 0, as it does in the spreadsheet; a text or a truth value is no operand here. */
function toOperand(value: CellValue | undefined): Operand {
  if (value === null) return 0;
  if (typeof value === 'number') return value;
  return value instanceof ErrorValue ? { error: value.code } : null;
}
