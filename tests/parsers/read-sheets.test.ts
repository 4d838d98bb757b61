import ExcelJS from 'exceljs';
import { describe, expect, it } from 'vitest';
import { matchingFrom, readActivityList, readSheets } from '@/parsers';

/** A list as a foreman's office would send it: title block, header of two rows, formats, formulas, a hidden row. */
async function contractorsWorkbook(): Promise<Uint8Array> {
  const workbook = new ExcelJS.Workbook();
  workbook.properties.date1904 = true;
  const cover = workbook.addWorksheet('Cover');
  cover.addRow(['Sluice gate renewal']);
  const sheet = workbook.addWorksheet('Programme');
  sheet.getCell('C1').value = 'Sluice gate renewal, north bank';
  sheet.mergeCells('C1:I1');
  sheet.getCell('C2').value = 'Issued';
  sheet.getCell('D2').value = new Date(Date.UTC(2027, 2, 12));
  sheet.getRow(4).getCell(3).value = 'Task No.';
  sheet.getRow(4).getCell(4).value = 'Task';
  sheet.getRow(4).getCell(5).value = 'Duration';
  sheet.getRow(4).getCell(8).value = 'Depends on';
  sheet.getRow(4).getCell(9).value = 'Crew';
  ['a', 'm', 'b'].forEach((letter, i) => (sheet.getRow(5).getCell(5 + i).value = letter));
  sheet.mergeCells('E4:G4');
  for (const column of ['C', 'D', 'H', 'I']) sheet.mergeCells(`${column}4:${column}5`);
  const put = (row: number, values: ExcelJS.CellValue[]) =>
    values.forEach((value, i) => (sheet.getRow(row).getCell(3 + i).value = value));
  put(6, [null, 'Cofferdam']);
  put(7, [1, 'Drive sheet piles', 3, 5, { formula: 'F7*2', result: 10 }, null, 'Piling']);
  put(8, [
    2,
    { richText: [{ text: 'Pump ' }, { text: 'out', font: { bold: true } }] },
    1,
    2,
    { formula: 'F8+1' },
    1,
  ]);
  put(9, [{ text: '3', hyperlink: 'https://example.org/3' }, 'Inspect', 16, 24, 40, '2 SS+8']);
  put(10, [4, 'Set gate', '2 wks', '3 wks', { formula: 'VLOOKUP(1,A1:B2,2)' }, '2; 3 FF-1 d']);
  put(12, [null, 'Total', { formula: 'SUM(E7:E10)', result: 20 }]);
  sheet.getRow(8).hidden = true;
  for (const cell of ['E9', 'F9', 'G9']) sheet.getCell(cell).numFmt = '0" h"';
  return new Uint8Array(await workbook.xlsx.writeBuffer());
}

describe('a workbook read to the end', () => {
  it('gives the list as the sheet shows it', async () => {
    const sheets = readSheets(await contractorsWorkbook(), 'programme.xlsx');
    const matching = matchingFrom({}, sheets);
    expect(matching).toMatchObject([
      {
        sheet: 'Programme',
        headerRow: 5,
        columns: { id: 2, name: 3, optimistic: 4, likely: 5, pessimistic: 6, predecessors: 7 },
      },
    ]);
    const list = readActivityList(sheets, matching);
    expect(list.rows).toEqual({
      read: 7,
      activities: 4,
      headings: 1,
      continued: 0,
      blank: 1,
      notes: 1,
      refused: 0,
    });
    expect(
      list.activities.map(({ id, name, row, hidden, optimistic, likely, pessimistic }) => [
        id,
        name,
        row,
        hidden,
        optimistic.days,
        likely.days,
        pessimistic.days,
      ]),
    ).toEqual([
      ['1', 'Drive sheet piles', 7, false, 3, 5, 10],
      ['2', 'Pump out', 8, true, 1, 2, 3],
      ['3', 'Inspect', 9, false, 2, 3, 5],
      ['4', 'Set gate', 10, false, 10, 15, null],
    ]);
    expect(list.activities[3]?.pessimistic).toMatchObject({
      problem: 'unreadable',
      text: '=VLOOKUP(1,A1:B2,2)',
      content: null,
    });
    expect(list.activities[2]?.likely).toMatchObject({ unit: 'hour', content: 24, text: '24 h' });
    expect(list.links.map(({ from, to, type, lag }) => [from, to, type, lag])).toEqual([
      ['1', '2', 'FS', 0],
      ['2', '3', 'SS', 8],
      ['2', '4', 'FS', 0],
      ['3', '4', 'FF', -1],
    ]);
    expect(sheets[1]?.date1904).toBe(true);
  });
});
