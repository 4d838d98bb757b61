import type { CellContent } from '@/lib/schedule/sheet';
import { giveBack } from '@/parsers/workbook';
import { makeWorkbook, partsOf } from './packages';

export const edit = (cell: string, to: CellContent, sheet = 'List') => ({ sheet, cell, from: null, to });

export const give = (bytes: Uint8Array, ...corrections: ReturnType<typeof edit>[]) =>
  giveBack({ bytes, fileName: 'list.xlsx', corrections, changes: [] });

/** The markup of a worksheet, by its number. */
export const sheetXml = (bytes: Uint8Array, number = 1) =>
  partsOf(bytes).get(`xl/worksheets/sheet${number}.xml`)?.content ?? '';

/** A workbook written by hand with one sheet. */
export const withList = (content: string) => makeWorkbook({ sheets: { List: content } });
