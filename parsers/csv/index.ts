import { type CellValue, ErrorValue, type Sheet, type SheetRow } from '@/lib/schedule/sheet';
import { damaged, UnreadableFile } from '@/parsers/errors';
import { LIMITS } from '@/parsers/limits';
import { readDialect } from './dialect';
import { FieldCursor } from './fields';

export { type Dialect, type DialectText, readDialect } from './dialect';
export { FieldCursor } from './fields';

/** What a text file's only sheet is called. */
export const CSV_SHEET = 'CSV';

/** Error values, which a spreadsheet writes into text as it shows them. */
const ERROR =
  /^#(?:NULL!|DIV\/0!|VALUE!|REF!|NAME\?|NUM!|N\/A|SPILL!|CALC!|FIELD!|BLOCKED!|CONNECT!|BUSY!|UNKNOWN!|GETTING_DATA)$/;

/**
 * Reads delimiter-separated text: every cell as text but for error values, rows numbered by record as a spreadsheet would show
 * them. Throws UnreadableFile.
 */
export function readCsv(bytes: Uint8Array): Sheet {
  const { text, dialect } = readDialect(bytes);
  const cursor = new FieldCursor(text, dialect.delimiter, dialect.preamble.length);
  const rows: SheetRow[] = [];
  let cells: CellValue[] = [];
  let filled = 0;
  let columnCount = 0;
  let used = 0;
  while (cursor.next()) {
    if (cells.length >= LIMITS.columns)
      throw damaged('A record of this file has more fields than a sheet has columns.');
    if (cursor.value.length > LIMITS.textLength)
      throw damaged(
        `Record ${cursor.record} of this file holds a text longer than a cell can hold; perhaps a quotation mark is missing.`,
      );
    const value = cellText(cursor.value);
    cells.push(value === '' ? null : ERROR.test(value) ? new ErrorValue(value) : value);
    if (value !== '') filled = cells.length;
    if (!cursor.last) continue;
    if (filled > 0) {
      cells.length = filled;
      used += filled;
      columnCount = Math.max(columnCount, filled);
      rows.push({ number: cursor.record, hidden: false, outline: 0, cells });
      if (rows.length > LIMITS.rows + LIMITS.rowsAround) throw new UnreadableFile('too-many-rows');
      if (used > LIMITS.cells) throw new UnreadableFile('too-many-cells');
    }
    cells = [];
    filled = 0;
  }
  if (rows.length === 0) throw new UnreadableFile('empty');
  return {
    name: CSV_SHEET,
    hidden: false,
    rows,
    columnCount,
    hiddenColumns: new Set(),
    formulas: new Map(),
    formatCodes: ['General'],
    merges: [],
    date1904: false,
  };
}

/**
 * `="007"` is how a text is kept a text when a spreadsheet opens the file, and an apostrophe before
 * = + - @ is how one is kept from becoming a formula (OWASP ASVS 5, 1.2.10).
 */
function cellText(value: string): string {
  const text = value.includes('\r') ? value.replace(/\r\n?/g, '\n') : value;
  if (text.startsWith("'") && /^'+[=+\-@\t\n]/.test(text)) return text.slice(1);
  if (!text.startsWith('="')) return text;
  return /^="([^"]*)"$/.exec(text)?.[1] ?? text;
}
