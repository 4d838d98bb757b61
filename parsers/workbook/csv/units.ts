import { type Encoding, WINDOWS_1252 } from '@/parsers/csv/text';

/**
 * A text file as a string of its code units (bytes, or pairs of bytes in UTF-16): nothing is lost that
 * decoding could lose, and a place in the string is a place in the file.
 */
export function unitsOf(bytes: Uint8Array, encoding: Encoding): string {
  const buffer = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  if (encoding === 'utf-16le') return buffer.toString('utf16le');
  if (encoding === 'utf-16be') return swapped(buffer).toString('utf16le');
  return buffer.toString('latin1');
}

export const unitSize = (encoding: Encoding) => (encoding.startsWith('utf-16') ? 2 : 1);

function swapped(buffer: Buffer): Buffer {
  return Buffer.from(buffer.subarray(0, buffer.length & ~1)).swap16();
}

/** Text as bytes; null where the encoding lacks a character. */
export function encode(text: string, encoding: Encoding): Buffer | null {
  if (encoding === 'utf-16le') return Buffer.from(text, 'utf16le');
  if (encoding === 'utf-16be') return swapped(Buffer.from(text, 'utf16le'));
  if (encoding === 'utf-8') return Buffer.from(text, 'utf8');
  const bytes = Array.from(text, (character) => {
    const code = character.charCodeAt(0);
    const special = WINDOWS_1252.indexOf(character);
    if (character.length === 1 && special >= 0) return 0x80 + special;
    return character.length === 1 && (code < 0x80 || (code >= 0xa0 && code < 0x100)) ? code : -1;
  });
  return bytes.includes(-1) ? null : Buffer.from(bytes);
}
