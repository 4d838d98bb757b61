import { bytesOf, type Scanner, Unusual } from './scanner';

const TEXT = bytesOf('t');
const RUN = bytesOf('r');
const RUN_PROPERTIES = bytesOf('rPr');
const PHONETIC = bytesOf('rPh');
const PHONETIC_PROPERTIES = bytesOf('phoneticPr');

/**
 * Reads the content of a string item (`si` or `is`) up to and past its closing tag: its text, or its runs
 * joined. Phonetic runs are left out.
 */
export function scanString(scanner: Scanner, closing: Uint8Array): string {
  let text = '';
  for (;;) {
    const first = scanner.tag();
    if (first === 47) break;
    if (scanner.takes(TEXT)) text += scanText(scanner);
    else if (scanner.takes(RUN)) text += scanRun(scanner);
    else if (scanner.takes(PHONETIC)) skip(scanner, '</rPh>');
    else if (scanner.takes(PHONETIC_PROPERTIES)) skip(scanner, '</phoneticPr>');
    else throw new Unusual();
  }
  scanner.at--;
  scanner.closes(closing);
  return text;
}

function scanRun(scanner: Scanner): string {
  scanner.skipAttributes();
  if (scanner.empty) return '';
  let text = '';
  for (;;) {
    const first = scanner.tag();
    if (first === 47) break;
    if (scanner.takes(TEXT)) text += scanText(scanner);
    else if (scanner.takes(RUN_PROPERTIES)) skip(scanner, '</rPr>');
    else throw new Unusual();
  }
  scanner.at--;
  scanner.closes(RUN);
  return text;
}

function scanText(scanner: Scanner): string {
  scanner.skipAttributes();
  if (scanner.empty) return '';
  const start = scanner.text();
  const text = scanner.decode(start, scanner.at);
  scanner.closes(TEXT);
  return text;
}

function skip(scanner: Scanner, closing: string): void {
  scanner.skipAttributes();
  if (!scanner.empty) scanner.skipTo(closing);
}
