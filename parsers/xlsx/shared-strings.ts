import { UnreadableFile } from '@/parsers/errors';
import { LIMITS } from '@/parsers/limits';
import { scanString } from './scan-string';
import { bytesOf, isPlain, Scanner, Unusual } from './scanner';
import { unescapeText } from './text';
import { encodingOf, readXml } from './xml';

const ITEM = bytesOf('si');
const TABLE = bytesOf('sst');

/** The texts of a workbook's shared string table, in order. */
export function readSharedStrings(bytes: Uint8Array | null, part: string): string[] {
  if (!bytes) return [];
  const buffer = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  if (isPlain(buffer, encodingOf(bytes))) {
    try {
      return scanTable(new Scanner(buffer));
    } catch (error) {
      if (!(error instanceof Unusual)) throw error;
    }
  }
  return parseTable(bytes, part);
}

function scanTable(scanner: Scanner): string[] {
  const strings: string[] = [];
  scanner.at = scanner.bytes.indexOf('<sst');
  if (scanner.at < 0 || scanner.tag() === 0 || !scanner.takes(TABLE)) throw new Unusual();
  scanner.skipAttributes();
  if (scanner.empty) return strings;
  while (scanner.tag() !== 47) {
    if (!scanner.takes(ITEM)) throw new Unusual();
    scanner.skipAttributes();
    if (strings.length >= LIMITS.sharedStrings) throw new UnreadableFile('too-many-cells');
    strings.push(scanner.empty ? '' : unescapeText(scanString(scanner, ITEM)));
  }
  scanner.at--;
  scanner.closes(TABLE);
  return strings;
}

function parseTable(bytes: Uint8Array, part: string): string[] {
  const strings: string[] = [];
  let text = '';
  let inText = false;
  let phonetic = false;
  readXml(
    bytes,
    part,
    {
      open(element) {
        if (element === 'si') text = '';
        else if (element === 'rPh') phonetic = true;
        else if (element === 't') inText = !phonetic;
      },
      text(piece) {
        if (inText) text += piece;
      },
      close(element) {
        if (element === 'si') strings.push(unescapeText(text));
        else if (element === 'rPh') phonetic = false;
        else if (element === 't') inText = false;
      },
    },
    LIMITS.cellElements,
  );
  return strings;
}
