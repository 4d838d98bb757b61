import type { Sheet } from '@/lib/schedule/sheet';
import { damaged, UnreadableFile } from '@/parsers/errors';
import { fillMissingResults } from './missing-results';
import { NumberFormats } from './number-formats';
import { OfficePackage } from './package';
import { readSharedStrings } from './shared-strings';
import { readSheet } from './sheet';
import { readWorkbook } from './workbook';

/** Reads the worksheets of an Office Open XML workbook (ECMA-376). Throws UnreadableFile. */
export function readXlsx(bytes: Uint8Array): Sheet[] {
  const files = OfficePackage.open(bytes);
  const workbook = readWorkbook(files);
  const { sharedStrings, styles, date1904 } = workbook;
  const context = {
    sharedStrings: readSharedStrings(
      sharedStrings === null ? null : files.read(sharedStrings),
      sharedStrings ?? '',
    ),
    formats: NumberFormats.read(styles === null ? null : files.read(styles), styles ?? ''),
    date1904,
    used: { rows: 0, cells: 0 },
  };
  const sheets: Sheet[] = [];
  for (const entry of workbook.sheets) {
    const part = files.read(entry.part);
    if (!part) throw damaged(`The sheet ${entry.name} is listed in this workbook, and not in it.`);
    sheets.push(readSheet(part, entry, context));
  }
  files.checkRest();
  if (sheets.every((sheet) => sheet.rows.length === 0)) throw new UnreadableFile('no-rows');
  return fillMissingResults(sheets);
}
