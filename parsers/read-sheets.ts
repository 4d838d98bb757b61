import type { Sheet } from '@/lib/schedule/sheet';
import { refuseCompound } from './compound';
import { readCsv } from './csv';
import { UnreadableFile } from './errors';
import { LIMITS } from './limits';
import { readXlsx } from './xlsx';

/**
 * Reads a file into sheets of located cells. What it holds decides, not what it is called. Throws
 * UnreadableFile with a plain sentence where it cannot be read.
 */
export function readSheets(bytes: Uint8Array, fileName: string): Sheet[] {
  if (bytes.length === 0) throw new UnreadableFile('empty');
  if (bytes.length > LIMITS.fileBytes) throw new UnreadableFile('too-large');
  if (isZip(bytes)) return readXlsx(bytes);
  refuseCompound(bytes);
  try {
    return [readCsv(bytes)];
  } catch (error) {
    throw isZipName(fileName) ? asWorkbookError(error) : error;
  }
}

function isZip(bytes: Uint8Array): boolean {
  return bytes[0] === 0x50 && bytes[1] === 0x4b && (bytes[2] === 3 || bytes[2] === 5);
}

function isZipName(fileName: string): boolean {
  return /\.xls[xm]$/i.test(fileName);
}

/** A file called .xlsx that is neither workbook nor text is most likely a workbook that came to harm. */
function asWorkbookError(error: unknown): unknown {
  if (!(error instanceof UnreadableFile) || error.code !== 'not-a-spreadsheet') return error;
  return new UnreadableFile(
    'not-a-spreadsheet',
    'This file is called a workbook and is none. Open it, save it as an Excel workbook (.xlsx), and send that.',
  );
}
