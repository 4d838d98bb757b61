import { ErrorValue, type Sheet } from '@/lib/schedule/sheet';
import { columnIndex, parseAddress } from '@/lib/schedule/cell';
import { damaged } from '@/parsers/errors';
import { LIMITS } from '@/parsers/limits';
import { scanRows } from './scan-sheet';
import { bytesOf, isPlain, Scanner, Unusual } from './scanner';
import { SheetBuilder, type WorkbookContext } from './sheet-builder';
import { unescapeText } from './text';
import { isTrue, type SheetEntry } from './workbook';
import { encodingOf, readXml, type XmlHandler } from './xml';

const SHEET_DATA = bytesOf('sheetData');
const EMPTY_SHEET_DATA = Buffer.from('<sheetData/>');

interface Around {
  readonly merges: { top: number; left: number; bottom: number; right: number }[];
  /** First and last of each span. */
  readonly hiddenColumns: [number, number][];
}

/** Reads a worksheet's part: by scanning its bytes where they are of the plain kind, else strictly. */
export function readSheet(bytes: Uint8Array, entry: SheetEntry, workbook: WorkbookContext): Sheet {
  const used = { ...workbook.used };
  const buffer = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  if (isPlain(buffer, encodingOf(bytes))) {
    try {
      return scanSheet(buffer, entry, workbook);
    } catch (error) {
      if (!(error instanceof Unusual)) throw error;
      Object.assign(workbook.used, used);
    }
  }
  return parseSheet(bytes, entry, workbook);
}

/** Rows by the scanner; what stands around them strictly. */
function scanSheet(buffer: Buffer, entry: SheetEntry, workbook: WorkbookContext): Sheet {
  const start = buffer.indexOf('<sheetData');
  if (start < 0) throw new Unusual();
  const scanner = new Scanner(buffer);
  const builder = new SheetBuilder(workbook);
  scanner.at = start + 1;
  if (!scanner.takes(SHEET_DATA)) throw new Unusual();
  scanner.skipAttributes();
  if (!scanner.empty) scanRows(scanner, builder);
  const around: Around = { merges: [], hiddenColumns: [] };
  const rest = Buffer.concat([buffer.subarray(0, start), EMPTY_SHEET_DATA, buffer.subarray(scanner.at)]);
  readXml(rest, entry.part, aroundHandler(around));
  return toSheet(builder, around, entry, workbook);
}

function parseSheet(bytes: Uint8Array, entry: SheetEntry, workbook: WorkbookContext): Sheet {
  const builder = new SheetBuilder(workbook);
  const around: Around = { merges: [], hiddenColumns: [] };
  const outer = aroundHandler(around);
  const cells = cellHandler(builder);
  readXml(
    bytes,
    entry.part,
    {
      open(name, attributes) {
        outer.open?.(name, attributes);
        cells.open?.(name, attributes);
      },
      text: cells.text,
      close: cells.close,
    },
    LIMITS.cellElements,
  );
  return toSheet(builder, around, entry, workbook);
}

function aroundHandler({ merges, hiddenColumns }: Around): XmlHandler {
  return {
    open(name, attributes) {
      if (name === 'mergeCell') {
        const [first, last] = (attributes.ref ?? '').replaceAll('$', '').split(':');
        const from = parseAddress(first ?? '');
        const to = parseAddress(last ?? first ?? '');
        if (from && to) merges.push({ top: from.row, left: from.column, bottom: to.row, right: to.column });
      } else if (name === 'col' && (isTrue(attributes.hidden) || Number(attributes.width ?? 1) === 0)) {
        hiddenColumns.push([Number(attributes.min) - 1, Number(attributes.max) - 1]);
      }
    },
  };
}

/** Reads rows and cells event by event. */
function cellHandler(builder: SheetBuilder): XmlHandler {
  let inData = false;
  let phonetic = false;
  let text: string | null = null;
  let cell = {
    column: 0,
    style: 0,
    type: '',
    formula: null as { text: string; shared: string } | null,
    hasResult: false,
  };
  let inline = '';

  const open: Record<string, (attributes: Readonly<Record<string, string>>) => void> = {
    row: ({ r, hidden, outlineLevel, ht }) =>
      builder.startRow(
        r === undefined ? 0 : Number(r),
        isTrue(hidden) || Number(ht ?? 1) === 0,
        Number(outlineLevel ?? 0) || 0,
      ),
    c: ({ r, s, t }) => {
      const column = r === undefined ? -1 : columnIndex(/^[A-Za-z]{1,3}(?=\d)/.exec(r)?.[0] ?? fail());
      cell = {
        column: builder.place(column),
        style: Number(s ?? 0),
        type: t ?? '',
        formula: null,
        hasResult: false,
      };
      inline = '';
    },
    v: () => {
      text = '';
    },
    f: ({ t, si }) => {
      text = '';
      cell.formula = { text: '', shared: t === 'shared' ? (si ?? '') : '' };
    },
    rPh: () => {
      phonetic = true;
    },
    t: () => {
      text = phonetic ? null : '';
    },
  };
  const close: Record<string, () => void> = {
    row: () => builder.endRow(),
    v: () => {
      const value = unescapeText(text ?? '');
      if (cell.type === 'e') builder.setValue(cell.column, new ErrorValue(value.trim()));
      else builder.setTyped(cell.column, cell.style, cell.type, value);
      cell.hasResult = value !== '' || cell.type === 'str';
    },
    f: () => {
      if (cell.formula) cell.formula.text = unescapeText(text ?? '');
    },
    t: () => {
      inline += text ?? '';
    },
    rPh: () => {
      phonetic = false;
    },
    is: () => {
      builder.setText(cell.column, unescapeText(inline));
      cell.hasResult = true;
    },
    c: () => {
      if (cell.formula) builder.setFormula(cell.column, cell.style, cell.formula, cell.hasResult);
    },
  };
  return {
    open(name, attributes) {
      if (name === 'sheetData') inData = true;
      else if (inData) open[name]?.(attributes);
    },
    text(piece) {
      if (text !== null) text += piece;
    },
    close(name) {
      if (name === 'sheetData') inData = false;
      else if (inData) close[name]?.();
      if (name === 'v' || name === 'f' || name === 't') text = null;
    },
  };
}

function fail(): never {
  throw damaged('A cell of this workbook has no address that can be.');
}

function toSheet(builder: SheetBuilder, around: Around, entry: SheetEntry, workbook: WorkbookContext): Sheet {
  const hiddenColumns = new Set<number>();
  for (const [first, last] of around.hiddenColumns) {
    for (let column = first; column <= Math.min(last, builder.columnCount - 1); column++)
      hiddenColumns.add(column);
  }
  return {
    name: entry.name,
    hidden: entry.hidden,
    rows: builder.finish(),
    columnCount: builder.columnCount,
    hiddenColumns,
    formulas: builder.formulas,
    formatCodes: workbook.formats.codes,
    merges: around.merges,
    date1904: workbook.date1904,
  };
}
