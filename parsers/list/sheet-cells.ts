import { cellAddress, type CellRef } from '@/lib/schedule/cell';
import type { Field, SheetMatching } from '@/lib/schedule/field';
import { type CellValue, ErrorValue, type Sheet, type SheetRow } from '@/lib/schedule/sheet';
import type { DurationCell } from '@/parsers/cells/duration';
import { readId, readText } from '@/parsers/cells/id';
import { clean, isBlank } from '@/parsers/cells/text';
import { headerAt } from '@/parsers/columns/header-row';
import { type HeaderReading, readHeader } from '@/parsers/columns/header';

/** A sheet with its matching: cells by field. */
export class SheetCells {
  readonly headers: readonly HeaderReading[];
  private readonly general: string;

  constructor(
    readonly sheet: Sheet,
    readonly matching: SheetMatching,
  ) {
    this.headers = headerAt(sheet, matching.headerRow).columns;
    this.general = sheet.formatCodes[0] ?? 'General';
  }

  has(field: Field): boolean {
    return this.matching.columns[field] !== undefined;
  }

  header(field: Field): HeaderReading {
    return this.headers[this.matching.columns[field] ?? -1] ?? readHeader('');
  }

  value(row: SheetRow, field: Field): CellValue {
    const column = this.matching.columns[field];
    return column === undefined ? null : (row.cells[column] ?? null);
  }

  ref(row: SheetRow, field: Field): CellRef | null {
    const column = this.matching.columns[field];
    return column === undefined ? null : { sheet: this.sheet.name, row: row.number, column };
  }

  format(row: SheetRow, field: Field): string {
    const column = this.matching.columns[field];
    const index = column === undefined ? undefined : row.formats?.[column];
    return index === undefined ? this.general : (this.sheet.formatCodes[index] ?? this.general);
  }

  /** As the sheet shows it, on one line. */
  text(row: SheetRow, field: Field): string {
    return clean(this.rawText(row, field));
  }

  /** As the sheet shows it, line breaks and blanks kept. */
  rawText(row: SheetRow, field: Field): string {
    const value = this.value(row, field);
    return typeof value === 'string' ? value : readText(value, this.format(row, field), this.sheet.date1904);
  }

  id(row: SheetRow): string {
    return readId(this.value(row, 'id'), this.format(row, 'id'), this.sheet.date1904);
  }

  error(row: SheetRow, field: Field): string | null {
    const value = this.value(row, field);
    return value instanceof ErrorValue ? value.code : null;
  }

  /** Text of the cell's formula; null where it has none. */
  formula(row: SheetRow, field: Field): { text: string; hasResult: boolean } | null {
    const column = this.matching.columns[field];
    if (column === undefined || this.sheet.formulas.size === 0) return null;
    return this.sheet.formulas.get(cellAddress({ row: row.number, column })) ?? null;
  }

  /** A formula as `=A2`, where the file keeps no result for it and it could not be worked out; else null. */
  pendingFormula(row: SheetRow, field: Field): string | null {
    if (this.value(row, field) !== null) return null;
    const formula = this.formula(row, field);
    return formula && !formula.hasResult ? `=${formula.text}` : null;
  }

  durationCell(row: SheetRow, field: Field): DurationCell {
    const value = this.value(row, field);
    return {
      value,
      format: typeof value === 'number' ? this.format(row, field) : this.general,
      date1904: this.sheet.date1904,
      formula: this.pendingFormula(row, field)?.slice(1) ?? null,
    };
  }

  /** Whether a row holds anything that can be seen, or a formula. */
  holdsAnything(row: SheetRow): boolean {
    if (row.cells.some((value) => !isBlank(value))) return true;
    if (this.sheet.formulas.size === 0) return false;
    return row.cells.some((_, column) => this.sheet.formulas.has(cellAddress({ row: row.number, column })));
  }
}
