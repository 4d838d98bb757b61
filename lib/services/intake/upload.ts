import { storableText } from '@/db/storable';
import { checked, Invalid, TooLarge } from '@/lib/contract/errors';
import { matchingForm, type MatchingForm } from '@/lib/contract/intake';
import type { Form, UploadedFile } from '@/lib/contract/transfer';
import type { Sheet } from '@/lib/schedule/sheet';
import { readSheets, UnreadableFile } from '@/parsers';

/** A file as it was sent, its sheets, and what the sender settled about reading it. */
export interface Upload {
  readonly file: UploadedFile;
  readonly sheets: readonly Sheet[];
  readonly wanted: MatchingForm;
}

export function readUpload({ file, fields }: Form): Upload {
  if (!file) throw Invalid.field('file', 'Choose a file: a workbook (.xlsx) or a CSV.');
  const wanted = checked(matchingForm, {
    ...(fields.sheet && { sheet: fields.sheet }),
    ...(fields.columns && { columns: fromJson('columns', fields.columns[0] ?? '') }),
    ...(fields.headerRow && { headerRow: fromJson('headerRow', fields.headerRow[0] ?? '') }),
  });
  const sheets = refusing(() => readSheets(file.bytes, file.name));
  return { file: { ...file, name: tidyName(file.name) }, sheets, wanted };
}

/** Reads what was sent; where it cannot be read it is refused, with the sentence that says why. */
export function refusing<T>(read: () => T): T {
  try {
    return read();
  } catch (error) {
    if (!(error instanceof UnreadableFile)) throw error;
    const errors = [{ path: 'file', message: error.message }];
    if (error.code === 'too-large') throw new TooLarge(error.message, { errors });
    throw new Invalid(error.message, { errors, members: { code: error.code } });
  }
}

function fromJson(field: string, text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    throw Invalid.field(field, `The field ${field} is not JSON that can be read.`);
  }
}

/** Without the folders that some senders put before it, and of a length that every file system takes. */
function tidyName(name: string): string {
  const last = name.split(/[/\\]/).at(-1) ?? '';
  const tidy = storableText(last)
    .replace(/\p{Cc}/gu, '')
    .trim();
  return tidy.length > 200 ? `${tidy.slice(0, 150)}…${tidy.slice(-40)}` : tidy || 'file';
}
