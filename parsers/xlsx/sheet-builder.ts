import { damaged, UnreadableFile } from '@/parsers/errors';
import { LIMITS } from '@/parsers/limits';
import { columnLetters } from '@/lib/schedule/cell';
import { type CellValue, ErrorValue, type SheetFormula, type SheetRow } from '@/lib/schedule/sheet';
import { shiftFormula } from './formula';
import type { NumberFormats } from './number-formats';
import { isoToSerial } from '@/parsers/cells/serial-date';

/** What the sheets of a workbook share. */
export interface WorkbookContext {
  readonly sharedStrings: readonly string[];
  readonly formats: NumberFormats;
  readonly date1904: boolean;
  /** Counted over all sheets. */
  readonly used: { rows: number; cells: number };
}

/** A cell's formula as the file has it. */
export interface RawFormula {
  readonly text: string;
  /** Index of the group that shares it; '' where it is its own. */
  readonly shared: string;
}

const ROWS_OF_A_SHEET = 1_048_576;

/** Collects the rows of a sheet; whoever reads the XML calls it in document order. */
export class SheetBuilder {
  readonly rows: SheetRow[] = [];
  readonly formulas = new Map<string, SheetFormula>();
  columnCount = 0;
  private number = 0;
  private hidden = false;
  private outline = 0;
  private cells: CellValue[] = [];
  private formatsOfRow: (number | undefined)[] | null = null;
  private nextColumn = 0;
  private ascending = true;
  private readonly masters = new Map<string, { text: string; row: number; column: number }>();

  constructor(private readonly workbook: WorkbookContext) {}

  /** `number` 0 where the row does not tell it: the one after the last. */
  startRow(number: number, hidden: boolean, outline: number): void {
    const next = number === 0 ? this.number + 1 : number;
    if (!(next >= 1 && next <= ROWS_OF_A_SHEET))
      throw damaged('A sheet of this workbook has a row that cannot be.');
    if (next <= this.number) this.ascending = false;
    this.number = next;
    this.hidden = hidden;
    this.outline = outline;
    this.nextColumn = 0;
  }

  /** Column of the next cell; −1 where the cell does not tell it. */
  place(column: number): number {
    const at = column < 0 ? this.nextColumn : column;
    if (at >= LIMITS.columns)
      throw damaged('A sheet of this workbook has more columns than a sheet can have.');
    this.nextColumn = at + 1;
    return at;
  }

  setNumber(column: number, style: number, value: number): void {
    this.set(column, value);
    const format = this.workbook.formats.ofStyle(style);
    if (format !== 0) this.setFormat(column, format);
  }

  setShared(column: number, index: number): void {
    const text = this.workbook.sharedStrings[index];
    if (text === undefined) throw damaged('A cell of this workbook refers to a text that is not in it.');
    this.setText(column, text);
  }

  setText(column: number, text: string): void {
    if (text.length > LIMITS.textLength)
      throw damaged('A cell of this workbook holds a text longer than a cell can hold.');
    if (text !== '') this.set(column, text);
  }

  setValue(column: number, value: boolean | ErrorValue): void {
    this.set(column, value);
  }

  /** A cell whose value stands as text, by its type (ECMA-376 part 1, 18.18.11). */
  setTyped(column: number, style: number, type: string, text: string): void {
    const value = text.trim();
    if (type === 'b') return value === '' ? undefined : this.set(column, value === '1' || value === 'true');
    if (type === 'e') return this.set(column, new ErrorValue(value));
    if (type === 's') return value === '' ? undefined : this.setShared(column, Number(value));
    if (type === 'd') return this.setDate(column, style, value);
    if (type !== 'n' && type !== '') return this.setText(column, text);
    const number = value === '' ? Number.NaN : Number(value);
    return Number.isFinite(number) ? this.setNumber(column, style, number) : this.setText(column, text);
  }

  setFormula(column: number, style: number, formula: RawFormula, hasResult: boolean): void {
    const text = this.ownText(column, formula);
    this.formulas.set(columnLetters(column) + String(this.number), { text, hasResult });
    if (hasResult) return;
    this.reach(column);
    const format = this.workbook.formats.ofStyle(style);
    if (format !== 0) this.setFormat(column, format);
  }

  endRow(): void {
    if (this.cells.length === 0) return;
    const { number, hidden, outline, cells } = this;
    this.rows.push(
      this.formatsOfRow
        ? { number, hidden, outline, cells, formats: this.formatsOfRow }
        : { number, hidden, outline, cells },
    );
    if (cells.length > this.columnCount) this.columnCount = cells.length;
    this.cells = [];
    this.formatsOfRow = null;
    if (++this.workbook.used.rows > LIMITS.rows + LIMITS.rowsAround)
      throw new UnreadableFile('too-many-rows');
  }

  /** Rows in ascending order; throws where two bear the same number. */
  finish(): SheetRow[] {
    if (this.ascending) return this.rows;
    const rows = this.rows.sort((a, b) => a.number - b.number);
    if (rows.some((row, i) => row.number === rows[i - 1]?.number))
      throw damaged('A sheet of this workbook has the same row twice.');
    return rows;
  }

  private set(column: number, value: CellValue): void {
    this.reach(column);
    this.cells[column] = value;
  }

  private reach(column: number): void {
    const { cells, workbook } = this;
    if (column < cells.length) return;
    workbook.used.cells += column + 1 - cells.length;
    if (workbook.used.cells > LIMITS.cells) throw new UnreadableFile('too-many-cells');
    while (cells.length <= column) cells.push(null);
  }

  private setFormat(column: number, format: number): void {
    const formats = (this.formatsOfRow ??= []);
    while (formats.length <= column) formats.push(undefined);
    formats[column] = format;
  }

  private setDate(column: number, style: number, text: string): void {
    const serial = isoToSerial(text, this.workbook.date1904);
    if (serial === null) return this.setText(column, text);
    this.set(column, serial);
    this.setFormat(column, this.workbook.formats.ofStyle(style) || this.workbook.formats.isoDate);
  }

  private ownText(column: number, { text, shared }: RawFormula): string {
    if (shared === '') return text;
    const master = this.masters.get(shared);
    if (text !== '' || !master) {
      this.masters.set(shared, { text, row: this.number, column });
      return text;
    }
    return shiftFormula(master.text, this.number - master.row, column - master.column);
  }
}
