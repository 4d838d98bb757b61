import type { CellContent } from '@/lib/schedule/sheet';
import { type Dialect, FieldCursor } from '@/parsers/csv';
import { CHANGE_HEADINGS, changeRow } from '../changes';
import type { ChangedCell, ListedChange, Patched } from '../types';
import { startsLikeFormula } from '../formula-start';
import { type FieldStyle, writeField } from './field';
import { encode, unitSize, unitsOf } from './units';

type Wanted = ReadonlyMap<number, ReadonlyMap<number, CellContent>>;

/** A replacement in the file: places in code units, what is written given only how the file quotes. */
interface Change {
  readonly start: number;
  readonly end: number;
  readonly text: (quotesAll: boolean) => string;
}

interface Walk {
  readonly changes: Change[];
  /** Whether every field that holds anything is quoted. */
  readonly quotesAll: boolean;
  readonly records: number;
}

const byRow = (cells: readonly ChangedCell[]): Wanted => {
  const rows = new Map<number, Map<number, CellContent>>();
  for (const { row, column, to } of cells) rows.set(row, (rows.get(row) ?? new Map()).set(column, to));
  return rows;
};

/** The fields from one column on, up to the last that is to hold something. */
function furtherFields(
  wanted: ReadonlyMap<number, CellContent>,
  from: number,
  write: (content: CellContent) => string,
  delimiter: string,
): string {
  const last = Math.max(-1, ...[...wanted].filter(([, to]) => to !== null).map(([column]) => column));
  const columns = Array.from({ length: Math.max(0, last + 1 - from) }, (_, index) => from + index);
  return columns
    .map(
      (column) =>
        (column === 0 ? '' : delimiter) + (wanted.has(column) ? write(wanted.get(column) ?? null) : ''),
    )
    .join('');
}

const AS_TEXT = /^="[^"]*"$/;

function walk(units: string, dialect: Dialect, wanted: Wanted): Walk {
  const { delimiter, preamble, encoding } = dialect;
  const cursor = new FieldCursor(units, delimiter, preamble.length);
  const changes: Change[] = [];
  // A text that the file holds as it is already is no new danger where it is copied.
  const formulas = new Set<string>();
  const trusted = (text: string) =>
    formulas.has(unitsOf(encode(text, encoding) ?? Buffer.alloc(0), encoding));
  let [quoted, bare, column] = [0, 0, -1];
  const write = (style: FieldStyle) => (content: CellContent) =>
    writeField(content, delimiter, style, trusted);
  while (cursor.next()) {
    column += 1;
    if (cursor.quoted) quoted += 1;
    else if (cursor.end > cursor.start) bare += 1;
    if (startsLikeFormula(cursor.value) && !AS_TEXT.test(cursor.value)) formulas.add(cursor.value);
    const row = wanted.get(cursor.record);
    const { start, end, last } = cursor;
    if (row?.has(column)) {
      const to = row.get(column) ?? null;
      const asText = AS_TEXT.test(cursor.value);
      const isQuoted = cursor.quoted;
      const empty = start === end;
      changes.push({
        ...{ start, end },
        text: (quotesAll) => write({ quoted: isQuoted || (empty && quotesAll), asText })(to),
      });
    }
    if (!last) continue;
    if (row) {
      const from = column + 1;
      const text = (all: boolean) =>
        furtherFields(row, from, write({ quoted: all, asText: false }), delimiter);
      changes.push({ start: end, end, text });
    }
    column = -1;
  }
  return { changes, quotesAll: quoted > 0 && bare === 0, records: cursor.record };
}

/** Records below the last one. */
function furtherRecords(
  units: string,
  dialect: Dialect,
  wanted: Wanted,
  { records, quotesAll }: Walk,
): string {
  const rows = [...wanted.keys()].filter((row) => row > records).sort((a, b) => a - b);
  const { delimiter, newline } = dialect;
  const write = (content: CellContent) =>
    writeField(content, delimiter, { quoted: quotesAll, asText: false });
  const ended = units === '' || /[\r\n]$/.test(units);
  let at = records;
  const text = rows.map((row) => {
    const blank = newline.repeat(row - at - 1);
    at = row;
    return `${blank}${furtherFields(wanted.get(row) ?? new Map(), 0, write, delimiter)}${newline}`;
  });
  const all = text.join('');
  if (all === '') return '';
  return ended ? all : newline + all.slice(0, -newline.length);
}

const MARKS = { 'utf-8': 3, 'utf-16le': 2, 'utf-16be': 2, 'windows-1252': 0 } as const;

/** Changes fields of a delimiter-separated file where they stand; every other byte of it stays as it is. */
export function patchCsv(bytes: Uint8Array, dialect: Dialect, cells: readonly ChangedCell[]): Patched {
  const { encoding, delimiter } = dialect;
  const refuse = ({ sheet, cell }: ChangedCell, reason: string) => ({ sheet, cell, reason });
  if (delimiter.charCodeAt(0) > 127) {
    const reason = 'The fields of this file are parted by a character that cannot be written to.';
    return { bytes, remarks: [], refused: cells.map((cell) => refuse(cell, reason)) };
  }
  const canHold = ({ to }: ChangedCell) => encode(String(to ?? ''), encoding) !== null;
  const refused = cells
    .filter((cell) => !canHold(cell))
    .map((cell) =>
      refuse(cell, `${cell.cell} has a character that the file's encoding (${encoding}) lacks.`),
    );

  const size = unitSize(encoding);
  const mark = dialect.mark ? MARKS[encoding] : 0;
  const body = bytes.subarray(mark);
  const all = unitsOf(body, encoding);
  const units = all.replace(/\u001a+\s*$/, '');
  const wanted = byRow(cells.filter(canHold));
  const walked = walk(units, dialect, wanted);
  const pieces: Uint8Array[] = [bytes.subarray(0, mark)];
  let at = 0;
  const put = (end: number, text: string) => {
    pieces.push(body.subarray(at * size, end * size), encode(text, encoding) ?? Buffer.alloc(0));
  };
  for (const { start, end, text } of walked.changes) {
    put(start, text(walked.quotesAll));
    at = end;
  }
  put(units.length, furtherRecords(units, dialect, wanted, walked));
  pieces.push(body.subarray(units.length * size));
  return { bytes: Buffer.concat(pieces), remarks: [], refused };
}

/** The list of changes as a file of its own (RFC 4180, UTF-8 with a mark), since a CSV cannot hold it. */
export function changesCsv(changes: readonly ListedChange[]): Uint8Array {
  const style = { quoted: false, asText: false };
  const record = (contents: readonly CellContent[]) =>
    contents.map((each) => writeField(each, ',', style)).join(',');
  const records = [[...CHANGE_HEADINGS], ...changes.map(changeRow)].map(
    (contents) => `${record(contents)}\r\n`,
  );
  return Buffer.from(`\ufeff${records.join('')}`, 'utf8');
}
