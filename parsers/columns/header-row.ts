import type { Field } from '@/lib/schedule/field';
import type { CellValue, Sheet, SheetRow } from '@/lib/schedule/sheet';
import { numberIn } from '@/parsers/cells/duration';
import { readText } from '@/parsers/cells/id';
import { clean, isBlank } from '@/parsers/cells/text';
import { readUnit } from '@/parsers/cells/unit';
import { type HeaderReading, letterEstimates, readHeader } from './header';

/** A header: its last row, and what stands above each column. */
export interface Header {
  /** From 1; 0 where there is none. */
  readonly row: number;
  /** By column. */
  readonly columns: readonly HeaderReading[];
}

/** Rows from the top in which a header is looked for. */
const SEARCHED = 100;
const ROWS_MAX = 3;
/** Columns in which one is looked for. */
const WIDTH_MAX = 1000;
/** Least score of a header: an ID or a name, and a duration. */
const LEAST = 1.8;
/** What a second row must add to be taken as part of the header. */
const GAIN = 0.3;
const WEIGHTS: Readonly<Partial<Record<Field, number>>> = {
  id: 2,
  optimistic: 1.5,
  likely: 1.5,
  pessimistic: 1.5,
  duration: 1.5,
  predecessors: 2,
  successors: 1.5,
};

/** The row or rows that read most like a header; null where none does. */
export function findHeader(sheet: Sheet): Header | null {
  const lines = new HeaderLines(sheet);
  let best: { header: Header; score: number } | null = null;
  for (const row of sheet.rows.slice(0, SEARCHED)) {
    const candidate = headerEndingAt(lines, row.number);
    if (candidate && candidate.score > (best?.score ?? 0) + 0.001) best = candidate;
  }
  return best && best.score >= LEAST ? best.header : null;
}

/** Where no row reads like a header: the first that holds texts only, right above one that holds numbers. */
export function guessHeader(sheet: Sheet): Header | null {
  for (const [i, row] of sheet.rows.slice(0, SEARCHED).entries()) {
    const held = row.cells.filter((value) => !isBlank(value));
    if (held.some(isNumeric)) return null;
    const next = sheet.rows[i + 1];
    if (held.length >= 2 && next?.number === row.number + 1 && next.cells.some(isNumeric))
      return headerAt(sheet, row.number);
  }
  return null;
}

function isNumeric(value: CellValue): boolean {
  return typeof value === 'number' || (typeof value === 'string' && numberIn(value) !== null);
}

/** The header whose last row is given, with the rows above it that belong to it. */
export function headerAt(sheet: Sheet, row: number): Header {
  const found = row === 0 ? null : headerEndingAt(new HeaderLines(sheet), row);
  return found?.header ?? { row, columns: Array.from({ length: sheet.columnCount }, () => readHeader('')) };
}

function headerEndingAt(lines: HeaderLines, last: number): { header: Header; score: number } | null {
  let best: { header: Header; score: number } | null = null;
  for (let count = 1; count <= ROWS_MAX && count <= last; count++) {
    if (count > 1 && !lines.mayBegin(last - count + 1)) break;
    const columns = lines.compose(last - count + 1, last);
    const units = count > 1 && lines.holdsOnlyUnits(last) ? 0.5 : 0;
    const score = scoreOf(columns) + units;
    if (!best || score > best.score + GAIN) best = { header: { row: last, columns }, score };
  }
  return best;
}

/** How much a row reads like a header: the fields it names, each counted once. */
function scoreOf(columns: readonly HeaderReading[]): number {
  const letters = letterEstimates(columns);
  const best = new Map<Field, number>();
  columns.forEach(({ fields }, i) => {
    const named = letters.get(i);
    const [first] = named ? [{ field: named, sureness: 1 }] : fields;
    if (first) best.set(first.field, Math.max(best.get(first.field) ?? 0, first.sureness));
  });
  let score = 0;
  for (const [field, sureness] of best) score += sureness * (WEIGHTS[field] ?? 1);
  return best.size < 2 ? 0 : score;
}

/** The sheet's first rows as texts, merged cells spread over what they cover. */
class HeaderLines {
  private readonly rows = new Map<number, SheetRow>();
  private readonly texts = new Map<number, string[]>();
  /** For each row, by column: the column whose cell is merged over it. */
  private readonly merged = new Map<number, Map<number, number>>();
  private readonly width: number;

  constructor(private readonly sheet: Sheet) {
    this.width = Math.min(sheet.columnCount, WIDTH_MAX);
    for (const row of sheet.rows) this.rows.set(row.number, row);
    for (const { top, left, right } of sheet.merges) {
      if (!this.rows.has(top) || left === right) continue;
      const over = this.merged.get(top) ?? new Map<number, number>();
      for (let column = left + 1; column <= Math.min(right, this.width); column++) over.set(column, left);
      this.merged.set(top, over);
    }
  }

  /** Whether a row can be the upper row of a header: it holds texts only. */
  mayBegin(row: number): boolean {
    const held = this.rows.get(row)?.cells.filter((value) => value !== null) ?? [];
    return held.length > 0 && held.every((value) => typeof value === 'string');
  }

  holdsOnlyUnits(row: number): boolean {
    const held = this.line(row).filter((text) => text !== '');
    return held.length > 0 && held.every((text) => readUnit(text.replace(/[()[\]]/g, '')) !== null);
  }

  compose(first: number, last: number): HeaderReading[] {
    const columns: HeaderReading[] = [];
    const lines: string[][] = [];
    for (let row = first; row < last; row++) lines.push(this.spread(row, last));
    const bottom = this.line(last);
    for (let column = 0; column < this.width; column++) {
      const parts = [...lines.map((line) => line[column] ?? ''), bottom[column] ?? ''].filter(
        (text) => text !== '',
      );
      columns.push(readHeader([...new Set(parts)].join(' ')));
    }
    return columns;
  }

  private line(row: number): string[] {
    const known = this.texts.get(row);
    if (known) return known;
    const held = this.rows.get(row);
    const line = (held?.cells ?? []).map((value, column) => {
      const code = this.sheet.formatCodes[held?.formats?.[column] ?? 0] ?? 'General';
      return typeof value === 'string' || typeof value === 'number'
        ? clean(readText(value, code, this.sheet.date1904))
        : '';
    });
    this.texts.set(row, line);
    return line;
  }

  /** An upper row: a text stands for the columns its cell is merged over, or for those to its right that name something below and nothing here. */
  private spread(row: number, last: number): string[] {
    const own = this.line(row);
    const below = this.line(last);
    const line: string[] = [];
    for (let column = 0; column < this.width; column++) {
      const text = own[column] ?? '';
      const over = this.merged.get(row)?.get(column);
      const goesOn =
        this.merged.size === 0 && (below[column] ?? '') !== '' && (below[column - 1] ?? '') !== '';
      if (text !== '') line.push(text);
      else if (over !== undefined) line.push(own[over] ?? '');
      else line.push(goesOn ? (line[column - 1] ?? '') : '');
    }
    return line;
  }
}
