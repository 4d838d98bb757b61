import ExcelJS from 'exceljs';
import { matchingFrom, readActivityList, readSheets } from '@/parsers';
import { syntheticList, toCsv, toXlsx } from '@/tests/support/lists';
import { type BenchRow, measure } from './measure';

/**
 * Reading a list of twelve columns: a workbook to cells beside exceljs's own load of the same file, delimited
 * text to cells, and the cells to an activity list (columns told, links resolved).
 */
export async function benchParse(sizes: readonly number[]): Promise<BenchRow[]> {
  const rows: BenchRow[] = [];
  for (const size of sizes) {
    const list = syntheticList(size);
    const workbook = await toXlsx(list);
    const text = new TextEncoder().encode(toCsv(list));
    const ours = await measure('read XLSX', size, () => readSheets(workbook, 'list.xlsx'));
    const theirs = await measure('exceljs load', size, () => load(workbook), size > 10_000 ? 1 : 3);
    rows.push({ ...ours, ratio: { to: 'exceljs', times: theirs.ms / ours.ms } }, theirs);
    rows.push(await measure('read CSV', size, () => readSheets(text, 'list.csv')));
    const sheets = readSheets(workbook, 'list.xlsx');
    rows.push(await measure('cells to list', size, () => readActivityList(sheets, matchingFrom({}, sheets))));
  }
  return rows;
}

async function load(bytes: Uint8Array): Promise<void> {
  const held = new ArrayBuffer(bytes.length);
  new Uint8Array(held).set(bytes);
  await new ExcelJS.Workbook().xlsx.load(held);
}
