import { type CellContent, type CellValue, ErrorValue, type Sheet } from '@/lib/schedule/sheet';

/** What a cell holds, as a correction says it: a truth value or an error value by its name. */
export function contentOf(value: CellValue | undefined): CellContent {
  if (value === undefined || value === null || value === '') return null;
  if (typeof value === 'boolean') return value ? 'TRUE' : 'FALSE';
  return value instanceof ErrorValue ? value.code : value;
}

export const textOf = (content: CellContent) => (content === null ? '' : String(content));

/** The number a text is, where the number's own text is the same; else null (`007`, `1.50` and `1e3` stay text). */
export function exactNumber(text: string): number | null {
  const number = Number(text);
  return text !== '' && Number.isFinite(number) && String(number) === text ? number : null;
}

/** How a column writes its numbers. */
export interface ColumnHabit {
  /** Whether most of its numbers are numbers proper or kept as text; null where it has as many of either. */
  readonly keeps: 'number' | 'text' | null;
  readonly decimalMark: '.' | ',';
}

const NUMBER_TEXT = /^\s*[-+]?\d[\d.,' \u00a0]*\s*$/;
const DECIMAL_COMMA = /^\s*[-+]?(?:\d+|\d{1,3}(?:[. \u00a0]\d{3})+),(?:\d{1,2}|\d{4,})\s*$/;
const DECIMAL_POINT = /^\s*[-+]?(?:\d+|\d{1,3}(?:[, \u00a0]\d{3})+)\.(?:\d{1,2}|\d{4,})\s*$/;

/** Reads a whole column: linear in the sheet's rows. */
export function habitOf(sheet: Sheet, column: number): ColumnHabit {
  let [numbers, texts, commas, points] = [0, 0, 0, 0];
  for (const row of sheet.rows) {
    const value = row.cells[column];
    if (typeof value === 'number') numbers += 1;
    else if (typeof value === 'string' && NUMBER_TEXT.test(value)) {
      texts += 1;
      if (DECIMAL_COMMA.test(value)) commas += 1;
      else if (DECIMAL_POINT.test(value)) points += 1;
    }
  }
  const keeps = numbers === texts ? null : numbers > texts ? 'number' : 'text';
  return { keeps, decimalMark: commas > points ? ',' : '.' };
}

/**
 * What is really put into a cell: a number where the cell (or, where it is empty or holds words, its
 * column) keeps numbers, and text in the column's notation where those are kept as text.
 */
export function settle(
  current: CellValue | undefined,
  to: CellContent,
  habit: () => ColumnHabit,
): CellContent {
  if (to === null || to === '') return null;
  const empty = current === null || current === undefined || current === '';
  if (typeof to === 'number') {
    if (typeof current === 'number') return to;
    const asText = (typeof current === 'string' && NUMBER_TEXT.test(current)) || habit().keeps === 'text';
    return asText ? String(to).replace('.', habit().decimalMark) : to;
  }
  const asNumber = typeof current === 'number' || (empty && habit().keeps === 'number');
  return asNumber ? (exactNumber(to) ?? to) : to;
}

/** True where every character is one that XML 1.0 (§2.2), and so a workbook, can hold. */
export function isWritable(text: string): boolean {
  for (const character of text) {
    const code = character.codePointAt(0) ?? 0;
    if (code < 0x20 ? code !== 9 && code !== 10 && code !== 13 : code >= 0xd800 && code <= 0xdfff)
      return false;
    if (code === 0xfffe || code === 0xffff) return false;
  }
  return true;
}
