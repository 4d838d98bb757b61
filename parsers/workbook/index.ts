import { readSheets } from '@/parsers';
import { readDialect } from '@/parsers/csv';
import { changedCells } from './changed-cells';
import { checkFile } from './check';
import { patchCsv } from './csv';
import type { ChangedCell, GiveBackInput, GivenBack, Patched } from './types';
import { patchXlsx } from './xlsx';

export { changesCsv } from './csv';
export type { Check, GiveBackInput, GivenBack, ListedChange } from './types';

const WORKBOOK_TYPES: Readonly<Record<string, string>> = {
  xlsx: 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
  xlsm: 'application/vnd.ms-excel.sheet.macroEnabled.12',
  xltx: 'application/vnd.openxmlformats-officedocument.spreadsheetml.template',
  xltm: 'application/vnd.ms-excel.template.macroEnabled.12',
};

const isZip = (bytes: Uint8Array) => bytes[0] === 0x50 && bytes[1] === 0x4b;

function contentType(bytes: Uint8Array, ending: string): string {
  if (isZip(bytes)) return WORKBOOK_TYPES[ending] ?? WORKBOOK_TYPES.xlsx ?? '';
  return `text/csv; charset=${readDialect(bytes).dialect.encoding}`;
}

/** `schedule.xlsx` → `schedule (corrected).xlsx`. */
function correctedName(fileName: string): string {
  const dot = fileName.lastIndexOf('.');
  return dot > 0 ? `${fileName.slice(0, dot)} (corrected)${fileName.slice(dot)}` : `${fileName} (corrected)`;
}

/**
 * The received file with the corrected cells changed and all else in it as it was: in a workbook they are
 * marked, noted and listed on a sheet of their own; a CSV keeps its way of writing. The result is read
 * again, and `check` tells how many of the corrections were found in it. Without any correction the bytes
 * are the received ones. Throws UnreadableFile where the file cannot be read or changed in place.
 */
export function giveBack(input: GiveBackInput): GivenBack {
  const { bytes, fileName, corrections } = input;
  const received = input.sheets ?? readSheets(bytes, fileName);
  const cells = changedCells(received, corrections);
  const patched = patch(input, cells);
  const again = patched.bytes === bytes ? received : readSheets(patched.bytes, fileName);
  const ending = /\.(\w+)$/.exec(fileName)?.[1]?.toLowerCase() ?? '';
  return {
    bytes: patched.bytes,
    fileName: correctedName(fileName),
    contentType: contentType(bytes, ending),
    check: checkFile(received, corrections, again, patched),
  };
}

function patch({ bytes, changes }: GiveBackInput, cells: readonly ChangedCell[]): Patched {
  if (cells.length === 0) return { bytes, remarks: [], refused: [] };
  return isZip(bytes) ? patchXlsx(bytes, cells, changes) : patchCsv(bytes, cells);
}
