import { applyCorrections } from '@/lib/corrections';
import type { Sheet } from '@/lib/schedule/sheet';
import { readSheets, UnreadableFile } from '@/parsers';
import { type Dialect, readDialect } from '@/parsers/csv';
import { changedCells } from './changed-cells';
import { checkFile } from './check';
import { patchCsv } from './csv';
import type { ChangedCell, GiveBackInput, GivenBack, Patched } from './types';
import { recalculate } from './recalculate';
import { patchXlsx } from './xlsx';

export { changesCsv } from './csv';
export { recalculate } from './recalculate';
export type { Check, GiveBackInput, GivenBack, ListedChange } from './types';

const WORKBOOK_TYPE = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';
const WORKBOOK_TYPES: Readonly<Record<string, string>> = {
  xlsx: WORKBOOK_TYPE,
  xlsm: 'application/vnd.ms-excel.sheet.macroEnabled.12',
  xltx: 'application/vnd.openxmlformats-officedocument.spreadsheetml.template',
  xltm: 'application/vnd.ms-excel.template.macroEnabled.12',
};

const isZip = (bytes: Uint8Array) => bytes[0] === 0x50 && bytes[1] === 0x4b;

function contentType(fileName: string, dialect: Dialect | null): string {
  if (dialect) return `text/csv; charset=${dialect.encoding}`;
  const ending = /\.(\w+)$/.exec(fileName)?.[1]?.toLowerCase() ?? 'xlsx';
  return WORKBOOK_TYPES[ending] ?? WORKBOOK_TYPE;
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
  const dialect = isZip(bytes) ? null : readDialect(bytes).dialect;
  const patched = patch(input, received, cells, dialect);
  const { sheets, remarks } =
    patched.bytes === bytes ? { sheets: received, remarks: [] } : readAgain(patched, fileName);
  return {
    bytes: patched.bytes,
    fileName: correctedName(fileName),
    contentType: contentType(fileName, dialect),
    check: checkFile(received, corrections, sheets, {
      ...patched,
      remarks: [...patched.remarks, ...remarks],
    }),
  };
}

function patch(
  { bytes, changes, corrections }: GiveBackInput,
  received: readonly Sheet[],
  cells: readonly ChangedCell[],
  dialect: Dialect | null,
): Patched {
  if (cells.length === 0) return { bytes, remarks: [], refused: [] };
  if (dialect) return patchCsv(bytes, dialect, cells);
  const { results } = recalculate(received, applyCorrections(received, corrections));
  return patchXlsx(bytes, cells, changes, results);
}

/** A list that was as long as a list may be can become too long by the sheet that lists its changes. */
function readAgain({ bytes }: Patched, fileName: string): { sheets: Sheet[]; remarks: string[] } {
  try {
    return { sheets: readSheets(bytes, fileName), remarks: [] };
  } catch (error) {
    if (!(error instanceof UnreadableFile)) throw error;
    return { sheets: [], remarks: [`The corrected file could not be read again. ${error.message}`] };
  }
}
