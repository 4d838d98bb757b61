import { columnIndex } from '@/lib/schedule/cell';
import { type Area, covers, parseArea, type SheetArea } from './areas';

/** What a formula's names may stand for. */
export interface NameBook {
  /** Formula texts by name in small letters; a name may be defined for several sheets. */
  readonly names: ReadonlyMap<string, readonly string[]>;
  readonly tables: readonly (SheetArea & { readonly name: string })[];
}

export interface References {
  readonly areas: readonly SheetArea[];
  /** True where the formula may read cells that its text does not show. */
  readonly unsure: boolean;
}

interface Home {
  readonly sheet: string;
  readonly row: number;
  readonly column: number;
}

const WORD = String.raw`[A-Za-z_\\\u00a0-\uffff][\w.\\?\u00a0-\uffff]*`;
/**
 * One piece of a formula: text, error value, sheet prefix, range of cells, of columns or of rows, number,
 * name with what follows it, bracketed part of a table, or a colon or spill mark that joins what is not known.
 */
const PIECE = new RegExp(
  [
    String.raw`(?<text>"(?:[^"]|"")*"|#(?:[A-Z/0]+[!?]|N/A))`,
    String.raw`(?:'(?<quoted>(?:[^']|'')+)'|(?<plain>(?:\[\d+\])?${WORD}(?::${WORD})?|\[\d+\]))!`,
    String.raw`(?<cells>\$?[A-Za-z]{1,3}\$?\d+(?::\$?[A-Za-z]{1,3}\$?\d+)?)(?![\w.(!])`,
    String.raw`(?<columns>\$?[A-Za-z]{1,3}:\$?[A-Za-z]{1,3})(?![\w.(!])`,
    String.raw`(?<rows>\$?\d+:\$?\d+)(?![\w.])`,
    String.raw`\d+(?:\.\d*)?(?:[eE][-+]?\d+)?|\.\d+(?:[eE][-+]?\d+)?`,
    `(?<word>${WORD})(?<after>\\s*[([])?`,
    String.raw`(?<bracket>\[)`,
    String.raw`(?<joint>[:#])`,
  ].join('|'),
  'gu',
);
/** They read cells that they make the address of themselves. */
const HIDDEN_READS = /^(?:_xlfn\.)?(?:indirect|offset)$/i;
const LAST_ROW = 1_048_576;
const LAST_COLUMN = 16_383;
const DEPTH = 8;

/** The cells a formula reads, as far as its text shows them. */
export function referencesOf(text: string, home: Home, book: NameBook, depth = 0): References {
  const areas: SheetArea[] = [];
  let unsure = depth > DEPTH;
  let sheet: string | null = home.sheet;
  const take = (area: Area | null) => {
    if (!area) unsure = true;
    else if (sheet !== null) areas.push({ ...area, sheet });
  };
  if (unsure) return { areas, unsure };
  PIECE.lastIndex = 0;
  for (const match of text.matchAll(PIECE)) {
    const { quoted, plain, cells, columns, rows, word, after, bracket, joint } = match.groups ?? {};
    const prefix = quoted?.replaceAll("''", "'") ?? plain;
    if (prefix !== undefined) {
      // Another workbook's cells do not change; a run of sheets is not followed.
      sheet = prefix.includes('[') ? null : prefix;
      unsure ||= prefix.includes(':') && sheet !== null;
      continue;
    }
    if (cells !== undefined) take(parseArea(cells));
    else if (columns !== undefined) take(wholeColumns(columns));
    else if (rows !== undefined) take(wholeRows(rows));
    else if (joint !== undefined) unsure = true;
    else if (bracket !== undefined || after?.endsWith('[')) {
      const table = tableOf(word, home, book);
      if (!table) unsure = true;
      else areas.push(partOf(table, text.slice(match.index + match[0].length), home));
      // The rest of the brackets names columns, which may look like anything.
      const rest = referencesOf(afterBrackets(text, match.index + match[0].length), home, book, depth);
      return { areas: [...areas, ...rest.areas], unsure: unsure || rest.unsure };
    } else if (word !== undefined) {
      if (after) unsure ||= HIDDEN_READS.test(word);
      else if (!/^(?:true|false)$/i.test(word) && sheet !== null) {
        const defined = book.names.get(word.toLowerCase());
        const inside = (defined ?? []).map((each) => referencesOf(each, home, book, depth + 1));
        unsure ||= !defined || inside.some((each) => each.unsure);
        areas.push(...inside.flatMap((each) => each.areas));
      }
    }
    sheet = home.sheet;
  }
  return { areas, unsure };
}

function wholeColumns(text: string): Area {
  const [left = 0, right = left] = text.replaceAll('$', '').split(':').map(columnIndex);
  return { top: 1, bottom: LAST_ROW, left: Math.min(left, right), right: Math.max(left, right) };
}

function wholeRows(text: string): Area {
  const [top = 1, bottom = top] = text.replaceAll('$', '').split(':').map(Number);
  return { left: 0, right: LAST_COLUMN, top: Math.min(top, bottom), bottom: Math.max(top, bottom) };
}

function tableOf(word: string | undefined, home: Home, book: NameBook) {
  return word === undefined
    ? book.tables.find((table) => table.sheet === home.sheet && covers(table, home.row, home.column))
    : book.tables.find((table) => table.name.toLowerCase() === word.toLowerCase());
}

/** The row the formula stands in where it says "this row", else the whole table. */
function partOf(table: SheetArea, rest: string, home: Home): SheetArea {
  const thisRow = /^\s*(?:@|\[\s*#This Row)/i.test(rest) && table.sheet === home.sheet;
  const { sheet, left, right } = table;
  return thisRow ? { sheet, left, right, top: home.row, bottom: home.row } : table;
}

/** What follows the bracket that was opened just before a place; an apostrophe makes the next one a letter. */
function afterBrackets(text: string, from: number): string {
  let depth = 1;
  let at = from;
  for (; at < text.length && depth > 0; at += 1) {
    const character = text[at];
    if (character === "'") at += 1;
    else if (character === '[') depth += 1;
    else if (character === ']') depth -= 1;
  }
  return text.slice(at);
}
