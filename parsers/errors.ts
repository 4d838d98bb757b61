/** Why a file cannot be read, with the sentence shown where no better one is at hand. */
export const UNREADABLE = {
  'not-a-spreadsheet':
    'This file is not a spreadsheet. Send the list as an Excel workbook (.xlsx) or as comma-separated text (.csv).',
  encrypted: 'This workbook is protected by a password. Save it without the password and send it again.',
  'old-format':
    'This is a workbook in the old binary format (.xls). Open it, save it as an Excel workbook (.xlsx), and send that.',
  empty: 'This file is empty. Nothing was kept; send the file again.',
  'no-rows': 'No sheet of this workbook holds anything. Check that the right file was chosen.',
  'too-large': 'This file is over 20 MB. Send a workbook that holds only the activity list.',
  'too-many-rows': 'This file has more than 200 000 rows. Send a workbook that holds only the activity list.',
  'too-many-links':
    'This list has more than 2 000 000 links. Send a list in which an activity names only what it waits for.',
  'too-many-cells':
    'This file spreads over more cells than can be read. Send a workbook that holds only the activity list.',
  'unpacks-too-large':
    'This workbook unpacks to more than 500 MB. Send a workbook that holds only the activity list.',
  damaged: 'This file is damaged and cannot be read. Open it, save it anew, and send that.',
} as const;

export type UnreadableCode = keyof typeof UNREADABLE;

/** The file cannot be read; the message is a plain sentence for the person who sent it. */
export class UnreadableFile extends Error {
  override readonly name = 'UnreadableFile';

  constructor(
    readonly code: UnreadableCode,
    message: string = UNREADABLE[code],
  ) {
    super(message);
  }
}

/** A damaged file, with what is wrong in it put before what to do. */
export function damaged(what: string): UnreadableFile {
  return new UnreadableFile('damaged', `${what} Open the file, save it anew, and send that.`);
}
