import { UnreadableFile } from './errors';

const COMPOUND = [0xd0, 0xcf, 0x11, 0xe0, 0xa1, 0xb1, 0x1a, 0xe1];

/** Compound files ([MS-CFB]): old binary workbooks, and encrypted ones ([MS-OFFCRYPTO]). */
export function refuseCompound(bytes: Uint8Array): void {
  if (COMPOUND.every((byte, i) => bytes[i] === byte)) {
    if (hasStream(bytes, 'EncryptedPackage')) throw new UnreadableFile('encrypted');
    if (hasStream(bytes, 'Workbook') || hasStream(bytes, 'Book')) throw new UnreadableFile('old-format');
    throw new UnreadableFile('not-a-spreadsheet');
  }
  // Workbooks of versions 2 to 4 begin with their first record: its kind, then its length.
  const [kind, version, length, high] = bytes;
  if (
    kind === 9 &&
    (version === 0 || version === 2 || version === 4) &&
    (length === 4 || length === 6) &&
    high === 0
  ) {
    throw new UnreadableFile('old-format');
  }
}

/** Whether a directory entry bears the name: UTF-16 with its closing 0. */
function hasStream(bytes: Uint8Array, name: string): boolean {
  const buffer = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  const wanted = Buffer.from(`${name}\0`, 'utf16le');
  for (let at = buffer.indexOf(wanted); at >= 0; at = buffer.indexOf(wanted, at + 2)) {
    // Directory entries are 128 bytes long and begin with the name (section 2.6.1).
    if (at % 128 === 0) return true;
  }
  return false;
}
