import { ErrorValue } from '@/lib/schedule/sheet';
import { scanString } from './scan-string';
import { bytesOf, GREATER, parseDecimal, type Scanner, Unusual } from './scanner';
import type { RawFormula, SheetBuilder } from './sheet-builder';
import { unescapeText } from './text';
import { isTrue } from './workbook';

const ROW = bytesOf('row');
const CELL = bytesOf('c');
const VALUE = bytesOf('v');
const FORMULA = bytesOf('f');
const INLINE = bytesOf('is');
const SHEET_DATA = bytesOf('sheetData');
const [LETTER_R, LETTER_S, LETTER_T] = [114, 115, 116];

/** Reads rows up to and past `</sheetData>`; throws Unusual where a strict parser has to decide. */
export function scanRows(scanner: Scanner, builder: SheetBuilder): void {
  for (;;) {
    const first = scanner.tag();
    if (first === 47) break;
    if (!scanner.takes(ROW)) throw new Unusual();
    scanRow(scanner, builder);
  }
  scanner.at--;
  scanner.closes(SHEET_DATA);
}

function scanRow(scanner: Scanner, builder: SheetBuilder): void {
  let number = 0;
  let hidden = false;
  let outline = 0;
  while (scanner.attribute()) {
    if (scanner.shortName() === LETTER_R) number = scanner.integer();
    else if (scanner.shortName() === 0) {
      const name = scanner.name();
      if (name === 'hidden') hidden ||= isTrue(scanner.value());
      else if (name === 'ht') hidden ||= Number(scanner.value()) === 0;
      else if (name === 'outlineLevel') outline = Math.max(0, scanner.integer());
    }
  }
  builder.startRow(number, hidden, outline);
  if (!scanner.empty) {
    for (;;) {
      const first = scanner.tag();
      if (first === 47) break;
      if (!scanner.takes(CELL)) throw new Unusual();
      scanCell(scanner, builder);
    }
    scanner.at--;
    scanner.closes(ROW);
  }
  builder.endRow();
}

function scanCell(scanner: Scanner, builder: SheetBuilder): void {
  let column = -1;
  let style = 0;
  let type = '';
  while (scanner.attribute()) {
    const name = scanner.shortName();
    if (name === LETTER_R) column = columnOf(scanner);
    else if (name === LETTER_S) style = scanner.integer();
    else if (name === LETTER_T) type = typeOf(scanner);
  }
  const at = builder.place(column);
  if (scanner.empty) return;
  let formula: RawFormula | null = null;
  let hasResult = false;
  for (;;) {
    const first = scanner.tag();
    if (first === 118 && scanner.takes(VALUE)) hasResult = scanValue(scanner, builder, at, style, type);
    else if (first === 102 && scanner.takes(FORMULA)) formula = scanFormula(scanner);
    else if (first === 105 && scanner.takes(INLINE)) {
      scanner.skipAttributes();
      if (!scanner.empty) builder.setText(at, unescapeText(scanString(scanner, INLINE)));
      hasResult = true;
    } else break;
  }
  scanner.at--;
  scanner.closes(CELL);
  if (formula) builder.setFormula(at, style, formula, hasResult);
}

/** Column of a reference such as AB12, from its letters. */
function columnOf(scanner: Scanner): number {
  const { bytes, valueStart, valueEnd } = scanner;
  let column = 0;
  let at = valueStart;
  for (; at < valueEnd; at++) {
    const letter = ((bytes[at] ?? 0) & 0xdf) - 64;
    if (letter < 1 || letter > 26) break;
    column = column * 26 + letter;
  }
  if (column === 0 || at === valueEnd) throw new Unusual();
  return column - 1;
}

/** Avoids making a string for the types nearly every cell has. */
function typeOf(scanner: Scanner): string {
  if (scanner.valueEnd - scanner.valueStart === 1) {
    const byte = scanner.bytes[scanner.valueStart];
    if (byte === 115) return 's';
    if (byte === 110) return 'n';
  }
  return scanner.value();
}

/** Reads what follows `<v`; whether there is a value. */
function scanValue(
  scanner: Scanner,
  builder: SheetBuilder,
  column: number,
  style: number,
  type: string,
): boolean {
  if (scanner.bytes[scanner.at] === GREATER) scanner.at++;
  else {
    scanner.skipAttributes();
    if (scanner.empty) return type === 'str';
  }
  const start = scanner.text();
  const end = scanner.at;
  scanner.closes(VALUE);
  if (type === 's' || type === 'n' || type === '') {
    const number = parseDecimal(scanner.bytes, start, end);
    if (!Number.isNaN(number)) {
      if (type === 's') builder.setShared(column, number);
      else builder.setNumber(column, style, number);
      return true;
    }
  }
  const text = scanner.decode(start, end);
  if (type === 'e') builder.setValue(column, new ErrorValue(text.trim()));
  else builder.setTyped(column, style, type, unescapeText(text));
  return text !== '' || type === 'str';
}

function scanFormula(scanner: Scanner): RawFormula {
  let shared = '';
  let isShared = false;
  while (scanner.attribute()) {
    if (scanner.shortName() === LETTER_T) isShared = scanner.value() === 'shared';
    else if (scanner.nameEnd - scanner.nameStart === 2 && scanner.name() === 'si') shared = scanner.value();
  }
  if (scanner.empty) return { text: '', shared: isShared ? shared : '' };
  const start = scanner.text();
  const text = scanner.decode(start, scanner.at);
  scanner.closes(FORMULA);
  return { text: unescapeText(text), shared: isShared ? shared : '' };
}
