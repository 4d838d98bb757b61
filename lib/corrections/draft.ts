import { cellAddress, parseAddress } from '@/lib/schedule/cell';
import type { CellContent, CellValue, Sheet, SheetFormula, SheetRow } from '@/lib/schedule/sheet';
import { type ColumnHabit, habitOf } from './content';
import { coveredBy } from './merges';

export interface Place {
  readonly row: number;
  readonly column: number;
}

/** Position of a row number among ascending rows; where it is missing, −1 − the position it would have. */
function findRow(rows: readonly SheetRow[], number: number): number {
  let [low, high] = [0, rows.length - 1];
  while (low <= high) {
    const middle = (low + high) >> 1;
    const found = rows[middle]?.number ?? 0;
    if (found === number) return middle;
    if (found < number) low = middle + 1;
    else high = middle - 1;
  }
  return -1 - low;
}

/** A sheet being corrected: rows are copied when first written to, the received sheet never changes. */
export class SheetDraft {
  private readonly written = new Map<number, CellValue[]>();
  private readonly habits = new Map<number, ColumnHabit>();
  private anchorOf: ((place: Place) => Place) | null = null;
  private formulas: Map<string, SheetFormula> | null = null;
  private columnCount: number;

  constructor(readonly received: Sheet) {
    this.columnCount = received.columnCount;
  }

  /** Where an address leads: to the top-left cell of a merged range; null where it is no address. */
  place(address: string): Place | null {
    const place = parseAddress(address);
    this.anchorOf ??= coveredBy(this.received.merges);
    return place && this.anchorOf(place);
  }

  get({ row, column }: Place): CellValue {
    const cells = this.written.get(row) ?? this.received.rows[findRow(this.received.rows, row)]?.cells;
    return cells?.[column] ?? null;
  }

  set(place: Place, value: CellContent): void {
    const { row, column } = place;
    const received = this.received.rows[findRow(this.received.rows, row)]?.cells;
    const cells = this.written.get(row) ?? [...(received ?? [])];
    this.written.set(row, cells);
    while (cells.length < column) cells.push(null);
    cells[column] = value;
    this.columnCount = Math.max(this.columnCount, column + 1);
    const address = cellAddress(place);
    if (!this.received.formulas.has(address)) return;
    this.formulas ??= new Map(this.received.formulas);
    this.formulas.delete(address);
  }

  /** How the received column writes its numbers. */
  habit(column: number): ColumnHabit {
    const habit = this.habits.get(column) ?? habitOf(this.received, column);
    this.habits.set(column, habit);
    return habit;
  }

  finish(): Sheet {
    if (this.written.size === 0) return this.received;
    const rows = [...this.received.rows];
    const added: SheetRow[] = [];
    for (const [number, cells] of this.written) {
      const at = findRow(this.received.rows, number);
      const row = this.received.rows[at];
      if (row) rows[at] = { ...row, cells };
      else added.push({ number, hidden: false, outline: 0, cells });
    }
    const { columnCount } = this;
    const formulas = this.formulas ?? this.received.formulas;
    return { ...this.received, rows: withRows(rows, added), columnCount, formulas };
  }
}

/** Puts missing rows in at their place. */
function withRows(rows: SheetRow[], added: SheetRow[]): SheetRow[] {
  return added.length === 0 ? rows : [...rows, ...added].sort((a, b) => a.number - b.number);
}

/** The sheets of a workbook being corrected. */
export class WorkbookDraft {
  private readonly drafts: ReadonlyMap<string, SheetDraft>;

  constructor(private readonly received: readonly Sheet[]) {
    this.drafts = new Map(received.map((sheet) => [sheet.name, new SheetDraft(sheet)]));
  }

  sheet(name: string): SheetDraft | undefined {
    return this.drafts.get(name);
  }

  finish(): Sheet[] {
    return this.received.map((sheet) => this.drafts.get(sheet.name)?.finish() ?? sheet);
  }
}
