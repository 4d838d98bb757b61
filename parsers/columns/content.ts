import type { Sheet } from '@/lib/schedule/sheet';
import { numberIn } from '@/parsers/cells/duration';
import { readId } from '@/parsers/cells/id';
import { formatKind } from '@/parsers/cells/number-format';

/** What the cells of a column below the header are like. */
export interface Content {
  readonly filled: number;
  /** Share of the filled cells that are numbers or begin with one. */
  readonly numeric: number;
  readonly dates: number;
  /** Share of the filled cells that no other cell equals. */
  readonly unique: number;
  /** Of texts. */
  readonly length: number;
  /** Share of the filled cells that hold a blank between words. */
  readonly phrases: number;
  readonly numbers: readonly (number | null)[];
  readonly values: readonly string[];
}

/** Rows that are looked at. */
const SAMPLE = 400;
const ENTRY = /[,;\n&]|\s+and\s+/i;
const ENTRY_ID = /^\s*(.+?)\s*(?:[:\s]?\s*(?:FS|SS|FF|SF)\s*(?:[+\-\u2212].*)?|\+.*)?\s*$/i;

/** The content of each column below a header row. */
export function contentsOf(sheet: Sheet, headerRow: number, width: number): Content[] {
  const rows = sheet.rows.filter(({ number }) => number > headerRow).slice(0, SAMPLE);
  return Array.from({ length: width }, (_, column) => contentOf(sheet, rows, column));
}

function contentOf(sheet: Sheet, rows: Sheet['rows'], column: number): Content {
  const values: string[] = [];
  const numbers: (number | null)[] = [];
  const seen = new Map<string, number>();
  let [filled, numeric, dates, letters, phrases] = [0, 0, 0, 0, 0];
  for (const { cells, formats } of rows) {
    const value = cells[column] ?? null;
    const code = sheet.formatCodes[formats?.[column] ?? 0] ?? 'General';
    const text = readId(value, code, sheet.date1904);
    values.push(text);
    const number = typeof value === 'number' ? value : textNumber(text);
    const isDate = typeof value === 'number' && formatKind(code) === 'date';
    numbers.push(isDate ? null : number);
    if (text === '') continue;
    filled++;
    if (isDate || /^\d{1,4}[-/.]\d{1,2}[-/.]\d{1,4}$/.test(text)) dates++;
    else if (number !== null) numeric++;
    letters += text.length;
    if (/\S\s\S/.test(text)) phrases++;
    seen.set(text, (seen.get(text) ?? 0) + 1);
  }
  const once = [...seen.values()].filter((count) => count === 1).length;
  const share = (count: number) => (filled === 0 ? 0 : count / filled);
  return {
    filled,
    numeric: share(numeric),
    dates: share(dates),
    unique: share(once),
    length: share(letters),
    phrases: share(phrases),
    numbers,
    values,
  };
}

function textNumber(text: string): number | null {
  const reading = numberIn(text);
  if (!reading) return null;
  return reading.kind === 'number' ? reading.value : reading.ifDecimal;
}

/** Share of a predecessor column's entries that stand in another column as a whole cell; null without entries. */
export function referenceShare(predecessors: Content, ids: Content): number | null {
  const known = new Set(ids.values);
  let [found, all] = [0, 0];
  for (const cell of predecessors.values) {
    for (const entry of cell.split(ENTRY)) {
      const id = ENTRY_ID.exec(entry)?.[1] ?? '';
      if (id === '' || /^[-\u2013\u2014]|^(?:none|n\/?a|nil)$/i.test(id)) continue;
      all++;
      if (known.has(id) || known.has(entry.trim())) found++;
    }
  }
  return all === 0 ? null : found / all;
}
