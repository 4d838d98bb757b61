import ExcelJS from 'exceljs';
import { zipSync } from 'fflate';
import { readSheets } from '@/parsers';
import { giveBack } from '@/parsers/workbook';
import { columnLetters } from '@/lib/schedule/cell';
import type { CellEdit } from '@/lib/schedule/edit';
import { measure, type BenchRow } from './measure';

const MAIN = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main';
const OFFICE = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';
const PACKAGE = 'http://schemas.openxmlformats.org/package/2006';
const HEADINGS = [
  'ID',
  'Name',
  'a',
  'm',
  'b',
  'Predecessors',
  'Area',
  'Trade',
  'Lead',
  'Zone',
  'Phase',
  'Remark',
];
const CORRECTIONS = 200;

/** A list of 12 columns with shared texts, as spreadsheet programs write it. */
function makeList(size: number): Uint8Array {
  const texts = new Map<string, number>();
  const cell = (value: string | number, row: number, column: number) => {
    const ref = `${columnLetters(column)}${row}`;
    if (typeof value === 'number') return `<c r="${ref}" s="1"><v>${value}</v></c>`;
    const index = texts.get(value) ?? texts.size;
    texts.set(value, index);
    return `<c r="${ref}" s="1" t="s"><v>${index}</v></c>`;
  };
  const rows = [HEADINGS, ...Array.from({ length: size }, (_, index) => listRow(index))].map(
    (values, index) => {
      const cells = values.map((value, column) => cell(value, index + 1, column)).join('');
      return `<row r="${index + 1}" spans="1:12">${cells}</row>`;
    },
  );
  const head = '<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n';
  const type = 'application/vnd.openxmlformats-officedocument.spreadsheetml';
  const part = (name: string, kind: string) =>
    `<Override PartName="/xl/${name}.xml" ContentType="${type}.${kind}+xml"/>`;
  const relation = (id: number, kind: string, target: string) =>
    `<Relationship Id="rId${id}" Type="${OFFICE}/${kind}" Target="${target}.xml"/>`;
  const files = {
    '[Content_Types].xml': `${head}<Types xmlns="${PACKAGE}/content-types"><Default Extension="rels" ContentType="application/vnd.openxmlformats-package.relationships+xml"/>${part('workbook', 'sheet.main')}${part('worksheets/sheet1', 'worksheet')}${part('styles', 'styles')}${part('sharedStrings', 'sharedStrings')}</Types>`,
    '_rels/.rels': `${head}<Relationships xmlns="${PACKAGE}/relationships">${relation(1, 'officeDocument', 'xl/workbook')}</Relationships>`,
    'xl/workbook.xml': `${head}<workbook xmlns="${MAIN}" xmlns:r="${OFFICE}"><sheets><sheet name="List" sheetId="1" r:id="rId1"/></sheets></workbook>`,
    'xl/_rels/workbook.xml.rels': `${head}<Relationships xmlns="${PACKAGE}/relationships">${relation(1, 'worksheet', 'worksheets/sheet1')}${relation(2, 'styles', 'styles')}${relation(3, 'sharedStrings', 'sharedStrings')}</Relationships>`,
    'xl/worksheets/sheet1.xml': `${head}<worksheet xmlns="${MAIN}"><dimension ref="A1:L${size + 1}"/><sheetData>${rows.join('')}</sheetData></worksheet>`,
    'xl/styles.xml': `${head}<styleSheet xmlns="${MAIN}"><fonts count="1"><font><sz val="10"/><name val="Arial"/></font></fonts><fills count="2"><fill><patternFill patternType="none"/></fill><fill><patternFill patternType="gray125"/></fill></fills><borders count="1"><border/></borders><cellStyleXfs count="1"><xf numFmtId="0" fontId="0" fillId="0" borderId="0"/></cellStyleXfs><cellXfs count="2"><xf numFmtId="0" fontId="0" fillId="0" borderId="0" xfId="0"/><xf numFmtId="0" fontId="0" fillId="0" borderId="0" xfId="0"/></cellXfs></styleSheet>`,
    'xl/sharedStrings.xml': `${head}<sst xmlns="${MAIN}">${[...texts.keys()].map((text) => `<si><t>${text}</t></si>`).join('')}</sst>`,
  };
  return zipSync(Object.fromEntries(Object.entries(files).map(([name, text]) => [name, Buffer.from(text)])));
}

function listRow(index: number): (string | number)[] {
  const likely = 2 + ((index * 7) % 19);
  const before = index === 0 ? '-' : `T${index}${index > 9 ? `, T${index - 7}` : ''}`;
  return [
    ...[
      `T${index + 1}`,
      `Work package ${index % 977} in bay ${index % 41}`,
      likely - 1,
      likely,
      likely * 2,
      before,
    ],
    ...[
      `Area ${index % 12}`,
      `Trade ${index % 9}`,
      `Lead ${index % 30}`,
      `Zone ${index % 5}`,
      index % 4,
      'as agreed',
    ],
  ];
}

function makeEdits(sheet: string, size: number): CellEdit[] {
  const step = Math.max(1, Math.floor(size / CORRECTIONS));
  return Array.from({ length: Math.min(size, CORRECTIONS) }, (_, index) => {
    const row = 2 + index * step;
    return index % 2 === 0
      ? { sheet, cell: `D${row}`, from: null, to: 500 + index }
      : { sheet, cell: `F${row}`, from: null, to: `T${index}, T${index + 1}` };
  });
}

async function withExcelJs(bytes: Uint8Array, edits: readonly CellEdit[]): Promise<void> {
  const book = new ExcelJS.Workbook();
  const copy = new ArrayBuffer(bytes.length);
  new Uint8Array(copy).set(bytes);
  await book.xlsx.load(copy);
  for (const { sheet, cell, to } of edits) {
    const found = book.getWorksheet(sheet)?.getCell(cell);
    if (found) found.value = to;
  }
  await book.xlsx.writeBuffer();
}

/** A workbook and a CSV of each size, 200 cells corrected: given back by us, and loaded and saved by exceljs. */
export async function benchGiveBack(sizes: readonly number[]): Promise<BenchRow[]> {
  const rows: BenchRow[] = [];
  for (const size of sizes) {
    const bytes = makeList(size);
    const sheets = readSheets(bytes, 'list.xlsx');
    const edits = makeEdits('List', size);
    const input = { bytes, fileName: 'list.xlsx', corrections: edits, changes: [], sheets };
    const ours = await measure('give back, workbook', size, () => giveBack(input));
    const theirs = await measure('exceljs, load and save', size, () => withExcelJs(bytes, edits));
    rows.push({ ...ours, ratio: { to: 'exceljs', times: theirs.ms / ours.ms } }, theirs);

    const lines = [HEADINGS, ...Array.from({ length: size }, (_, index) => listRow(index))];
    const text = lines
      .map((values) => values.map((value) => (/,/.test(String(value)) ? `"${value}"` : value)).join(','))
      .join('\r\n');
    const csv = new Uint8Array(Buffer.from(text));
    const csvInput = { bytes: csv, fileName: 'list.csv', corrections: makeEdits('CSV', size), changes: [] };
    rows.push(await measure('give back, CSV', size, () => giveBack(csvInput)));
  }
  return rows;
}
