import ExcelJS from 'exceljs';
import { describe, expect, it } from 'vitest';
import { readSheets } from '@/parsers';
import { giveBack } from '@/parsers/workbook';
import { compareParts } from './packages';

async function makeBook(): Promise<Uint8Array> {
  const book = new ExcelJS.Workbook();
  const sheet = book.addWorksheet('Berth plan', { views: [{ state: 'frozen', ySplit: 1 }] });
  sheet.addRow(['Task no.', 'Work', 'min', 'likely', 'max', 'depends on']);
  for (let row = 2; row <= 12; row += 1) {
    sheet.addRow([`B${row}`, `Pile group ${row}`, 1, 2, 4, row > 2 ? `B${row - 1}` : null]);
  }
  sheet.getColumn(3).numFmt = '0.0" d"';
  sheet.getCell('C3').font = { italic: true, color: { argb: 'FF8A3B12' } };
  sheet.getCell('C4').note = 'Tide window.';
  sheet.getCell('D3').dataValidation = { type: 'decimal', operator: 'greaterThan', formulae: [0] };
  sheet.addConditionalFormatting({
    ref: 'E2:E12',
    rules: [
      {
        type: 'cellIs',
        operator: 'greaterThan',
        formulae: [9],
        priority: 1,
        style: { font: { bold: true } },
      },
    ],
  });
  await sheet.protect('', {});
  const other = book.addWorksheet('Notes');
  other.addTable({
    name: 'Tides',
    ref: 'A1',
    columns: [{ name: 'Day' }, { name: 'Height' }],
    rows: [
      [1, 3.2],
      [2, 3.4],
    ],
  });
  other.addImage(
    book.addImage({
      base64:
        'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk+M9QDwADhgGAWjR9awAAAABJRU5ErkJggg==',
      extension: 'png',
    }),
    'D1:E3',
  );
  book.definedNames.add("'Berth plan'!$D$2:$D$12", 'LikelyDays');
  return new Uint8Array(await book.xlsx.writeBuffer());
}

async function open(bytes: Uint8Array): Promise<ExcelJS.Workbook> {
  const copy = new ArrayBuffer(bytes.length);
  new Uint8Array(copy).set(bytes);
  const book = new ExcelJS.Workbook();
  await book.xlsx.load(copy);
  return book;
}

describe('a workbook made by exceljs', async () => {
  const bytes = await makeBook();
  const edit = (cell: string, to: string | number) => ({ sheet: 'Berth plan', cell, from: null, to });
  const corrections = [edit('C3', 1.5), edit('F5', 'B2, B3'), edit('C4', 2)];
  const given = giveBack({ bytes, fileName: 'berths.xlsx', corrections, changes: [] });
  const book = await open(given.bytes);
  const sheet = book.getWorksheet('Berth plan');

  it('is opened by it again with the corrections, marked and noted', () => {
    expect(given.check.sentence).toBe('3 of 3 corrections found in the file.');
    expect(sheet?.getCell('C3').value).toBe(1.5);
    expect(sheet?.getCell('F5').value).toBe('B2, B3');
    for (const cell of ['C3', 'F5', 'C4']) {
      expect(sheet?.getCell(cell).fill).toMatchObject({ pattern: 'solid', fgColor: { argb: 'FFDFEBD9' } });
    }
    expect(JSON.stringify(sheet?.getCell('C3').note)).toContain('Corrected: was “1”, is now “1.5”.');
    expect(JSON.stringify(sheet?.getCell('C4').note)).toMatch(/Tide window\..*Corrected/);
    expect(book.worksheets.map((each) => each.name)).toEqual(['Berth plan', 'Notes', 'Corrected cells']);
  });

  it('colours no other cell, and keeps the styles', async () => {
    const old = (await open(bytes)).getWorksheet('Berth plan');
    const styled: string[] = [];
    old?.eachRow((row) =>
      row.eachCell((cell) => {
        if (JSON.stringify(sheet?.getCell(cell.address).style) !== JSON.stringify(cell.style))
          styled.push(cell.address);
      }),
    );
    expect(styled).toEqual(['C3', 'C4', 'F5']);
    expect(sheet?.getCell('C3').numFmt).toBe('0.0" d"');
    expect(sheet?.getCell('C3').font).toMatchObject({ italic: true, color: { argb: 'FF8A3B12' } });
    expect(sheet?.getCell('D3').dataValidation).toMatchObject({ type: 'decimal' });
  });

  it('leaves the other sheet, its table, its picture and the theme untouched', () => {
    const { changed, added, gone } = compareParts(bytes, given.bytes);
    expect(gone).toEqual([]);
    expect(added).toEqual(['xl/worksheets/sheet3.xml']);
    expect(
      changed.filter((name) => !/styles|workbook|Content_Types|comments|vmlDrawing|sheet1/.test(name)),
    ).toEqual([]);
  });

  it('is read by us as it was but for the corrected cells', () => {
    const [old] = readSheets(bytes, 'berths.xlsx');
    const [now] = readSheets(given.bytes, 'berths.xlsx');
    const cells = old?.rows.map((row) => [...row.cells]) ?? [];
    const put = (row: number, column: number, value: string | number) => {
      const at = cells[row];
      if (at) at[column] = value;
    };
    put(2, 2, 1.5);
    put(4, 5, 'B2, B3');
    put(3, 2, 2);
    expect(now?.rows.map((row) => row.cells)).toEqual(cells);
  });
});
