import { columnIndex } from '@/lib/schedule/cell';
import { damaged } from '@/parsers/errors';
import { requireRoot } from './parts';
import { attribute, type Element, prefixOf, tagEnd } from './xml';

/** A worksheet part, its bytes one a character, with the place of its rows. */
export interface SheetMarkup {
  readonly xml: string;
  /** The same length as `xml`, with comments and CDATA blanked out: what is markup there is markup. */
  readonly structure: string;
  readonly prefix: string;
  readonly root: Element;
  readonly data: Element;
}

export interface RowSpot {
  readonly number: number;
  readonly start: number;
}

export interface CellSpot extends Element {
  readonly column: number;
}

function blanked(xml: string): string {
  if (!xml.includes('<!')) return xml;
  return xml.replace(/<!--[\s\S]*?-->|<!\[CDATA\[[\s\S]*?\]\]>/g, (opaque) => ' '.repeat(opaque.length));
}

export function openSheet(xml: string, part: string): SheetMarkup {
  const structure = blanked(xml);
  const root = requireRoot(structure, part);
  const prefix = prefixOf(root.name);
  const name = `${prefix}sheetData`;
  const start = structure.indexOf(`<${name}`, root.inner);
  if (start < 0) throw damaged(`The part ${part} inside this workbook has no rows.`);
  const inner = tagEnd(structure, start);
  const empty = structure[inner - 2] === '/';
  const innerEnd = empty ? inner : structure.lastIndexOf(`</${name}`);
  if (innerEnd < inner) throw damaged(`The part ${part} inside this workbook is not complete.`);
  const end = empty ? inner : tagEnd(structure, innerEnd);
  return { xml, structure, prefix, root, data: { name, start, inner, innerEnd, end } };
}

/** Where the next tag of a name begins; `<row` is no `<rowBreaks`. */
function findTag(structure: string, tag: string, from: number, to: number): number {
  let at = structure.indexOf(tag, from);
  while (at >= 0 && at < to) {
    const next = structure.charCodeAt(at + tag.length);
    if (next <= 32 || next === 47 || next === 62) return at;
    at = structure.indexOf(tag, at + tag.length);
  }
  return -1;
}

/** Every row with its number; one that does not tell it is the next after the one before. */
export function rowsOf({ structure, prefix, data }: SheetMarkup): RowSpot[] {
  const rows: RowSpot[] = [];
  const open = `<${prefix}row`;
  let number = 0;
  let start = findTag(structure, open, data.inner, data.innerEnd);
  while (start >= 0) {
    // Nearly every writer puts the number first.
    const first = structure.startsWith(' r="', start + open.length) ? start + open.length + 4 : -1;
    const quote = first < 0 ? -1 : structure.indexOf('"', first);
    const end = quote < 0 ? tagEnd(structure, start) : quote;
    const told = quote < 0 ? attribute(structure.slice(start, end), 'r') : structure.slice(first, quote);
    number = Number(told ?? number + 1);
    rows.push({ number, start });
    start = findTag(structure, open, end, data.innerEnd);
  }
  return rows;
}

/** The element that begins at a place, where none of its own name is nested in it. */
function elementAt(structure: string, start: number, name: string): Element {
  const inner = tagEnd(structure, start);
  if (structure[inner - 2] === '/') return { name, start, inner, innerEnd: inner, end: inner };
  const closing = `</${name}`;
  let innerEnd = structure.indexOf(closing, inner);
  while (innerEnd >= 0 && !/[\s>]/.test(structure[innerEnd + closing.length] ?? '>')) {
    innerEnd = structure.indexOf(closing, innerEnd + 1);
  }
  if (innerEnd < 0) throw damaged('A sheet inside this workbook is not complete.');
  return { name, start, inner, innerEnd, end: tagEnd(structure, innerEnd) };
}

export const rowAt = (sheet: SheetMarkup, spot: RowSpot) =>
  elementAt(sheet.structure, spot.start, `${sheet.prefix}row`);

/** The cells of a row; one that does not tell its column is the next after the one before. */
export function cellsOf({ structure, prefix }: SheetMarkup, row: Element): CellSpot[] {
  const cells: CellSpot[] = [];
  const name = `${prefix}c`;
  let column = -1;
  let start = findTag(structure, `<${name}`, row.inner, row.innerEnd);
  while (start >= 0) {
    const element = elementAt(structure, start, name);
    const address = attribute(structure.slice(start, element.inner), 'r');
    column = address ? columnIndex(address.replace(/\d+$/, '')) : column + 1;
    cells.push({ ...element, column });
    start = findTag(structure, `<${name}`, element.end, row.innerEnd);
  }
  return cells;
}

/** Where an element of a name begins in a cell; −1 where there is none. */
export function findIn(sheet: SheetMarkup, cell: Element, name: string): Element | null {
  const full = sheet.prefix + name;
  const start = findTag(sheet.structure, `<${full}`, cell.inner, cell.innerEnd);
  return start < 0 ? null : elementAt(sheet.structure, start, full);
}

/** Every element of a name among the rows, in order. */
export function* allOf(sheet: SheetMarkup, name: string): Generator<Element> {
  const full = sheet.prefix + name;
  const { structure, data } = sheet;
  let start = findTag(structure, `<${full}`, data.inner, data.innerEnd);
  while (start >= 0) {
    const element = elementAt(structure, start, full);
    yield element;
    start = findTag(structure, `<${full}`, element.end, data.innerEnd);
  }
}
