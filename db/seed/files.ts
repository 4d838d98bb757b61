import ExcelJS from 'exceljs';
import Papa from 'papaparse';
import type { DemoList, DemoRow, Written } from './scenario/row';

const cells = (row: DemoRow): Written[] => [row.id, row.name, row.a, row.m, row.b, row.after];

/** A workbook as a contractor would lay it out: title block, header, headings in bold, remarks below. */
export async function toWorkbook(list: DemoList): Promise<Uint8Array> {
  const workbook = new ExcelJS.Workbook();
  const sheet = workbook.addWorksheet(list.sheet, { views: [{ state: 'frozen', ySplit: 4 }] });
  sheet.addRow([list.title]).font = { bold: true, size: 14 };
  sheet.addRow([list.subtitle]);
  sheet.addRow([]);
  const header = sheet.addRow([...list.header]);
  header.font = { bold: true };
  header.border = { bottom: { style: 'thin' } };
  for (const row of list.rows) {
    const added = sheet.addRow(cells(row).map(toCellValue));
    if (row.m === null && row.a === null && row.b === null) added.font = { bold: true };
    if (row.hidden) added.hidden = true;
  }
  if (list.foot.length > 0) sheet.addRow([]);
  for (const remark of list.foot) sheet.addRow([null, remark]).font = { italic: true };
  [12, 36, 12, 12, 12, 26].forEach((width, index) => (sheet.getColumn(index + 1).width = width));
  return new Uint8Array(await workbook.xlsx.writeBuffer());
}

function toCellValue(value: Written): ExcelJS.CellValue {
  if (value !== null && typeof value === 'object')
    return { error: value.error as ExcelJS.CellErrorValue['error'] };
  return value;
}

/** A CSV with semicolons, as offices on the continent export it. */
export function toCsv(list: DemoList): Uint8Array {
  const rows = [list.header, ...list.rows.map(cells)];
  return new TextEncoder().encode(Papa.unparse(rows, { delimiter: ';', newline: '\r\n' }) + '\r\n');
}
