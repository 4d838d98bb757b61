import { damaged } from '@/parsers/errors';
import { LIMITS } from '@/parsers/limits';
import { decodeText } from './text';

export const LESS = 60;
export const GREATER = 62;
const SLASH = 47;
const EQUALS = 61;
const QUOTE = 34;
const APOSTROPHE = 39;

/** Thrown where the bytes are not of the plain kind that is scanned; a strict parser then decides. */
export class Unusual extends Error {
  override readonly name = 'Unusual';
}

/**
 * A cursor over the bytes of an XML part of the plain kind nearly every writer makes: UTF-8, no prefixes,
 * no comments, CDATA or instructions. Anything else throws Unusual.
 */
export class Scanner {
  at = 0;
  /** Of the attribute last read. */
  nameStart = 0;
  nameEnd = 0;
  valueStart = 0;
  valueEnd = 0;
  /** Whether the tag last read closes itself. */
  empty = false;

  constructor(readonly bytes: Buffer) {}

  /** Moves past white space to the next tag and onto the first byte of its name; text between is unusual. */
  tag(): number {
    const { bytes } = this;
    let byte = bytes[this.at];
    while (byte === 32 || byte === 10 || byte === 13 || byte === 9) byte = bytes[++this.at];
    if (byte !== LESS) throw new Unusual();
    return bytes[++this.at] ?? 0;
  }

  /** Moves past a name if it stands here, followed by the end of a tag's name. */
  takes(name: Uint8Array): boolean {
    const { bytes, at } = this;
    for (let i = 0; i < name.length; i++) if (bytes[at + i] !== name[i]) return false;
    const next = bytes[at + name.length] ?? 0;
    if (next !== GREATER && next !== SLASH && next > 32) return false;
    this.at = at + name.length;
    return true;
  }

  /** Reads the next attribute of a tag; false at the tag's end, which it passes. */
  attribute(): boolean {
    const { bytes } = this;
    let at = this.at;
    let byte = bytes[at] ?? 0;
    while (byte <= 32 && at < bytes.length) byte = bytes[++at] ?? 0;
    if (byte === GREATER || byte === SLASH) {
      this.empty = byte === SLASH;
      if (this.empty && bytes[++at] !== GREATER) throw new Unusual();
      this.at = at + 1;
      return false;
    }
    this.nameStart = at;
    while (byte !== EQUALS) {
      if (byte <= 32 || byte === GREATER || byte === LESS) throw new Unusual();
      byte = bytes[++at] ?? 0;
    }
    this.nameEnd = at;
    const quote = bytes[++at];
    if (quote !== QUOTE && quote !== APOSTROPHE) throw new Unusual();
    this.valueStart = ++at;
    while (bytes[at] !== quote) {
      if (at >= bytes.length || bytes[at] === LESS) throw new Unusual();
      at++;
    }
    this.valueEnd = at;
    this.at = at + 1;
    return true;
  }

  /** The name's only byte where it has one, else 0. */
  shortName(): number {
    return this.nameEnd - this.nameStart === 1 ? (this.bytes[this.nameStart] ?? 0) : 0;
  }

  name(): string {
    return this.bytes.toString('latin1', this.nameStart, this.nameEnd);
  }

  value(): string {
    return this.decode(this.valueStart, this.valueEnd);
  }

  /** The value as a whole number; −1 where it is none. */
  integer(): number {
    let number = 0;
    for (let at = this.valueStart; at < this.valueEnd; at++) {
      const digit = (this.bytes[at] ?? 0) - 48;
      if (digit < 0 || digit > 9) return -1;
      number = number * 10 + digit;
    }
    return this.valueEnd > this.valueStart ? number : -1;
  }

  /** Passes the attributes of a tag. */
  skipAttributes(): void {
    while (this.attribute());
  }

  /** Moves to the next `<` and returns where the text before it began. */
  text(): number {
    const start = this.at;
    const end = this.bytes.indexOf(LESS, start);
    if (end < 0) throw new Unusual();
    if (end - start > LIMITS.textBytes)
      throw damaged('A cell of this workbook holds a text longer than a cell can hold.');
    this.at = end;
    return start;
  }

  /** Moves past `</name>`. */
  closes(name: Uint8Array): void {
    const { bytes, at } = this;
    if (bytes[at] !== LESS || bytes[at + 1] !== SLASH) throw new Unusual();
    this.at = at + 2;
    if (!this.takes(name)) throw new Unusual();
    while ((bytes[this.at] ?? GREATER) <= 32) this.at++;
    if (bytes[this.at++] !== GREATER) throw new Unusual();
  }

  /** Moves past the next `</name>`, whatever stands before it. */
  skipTo(closing: string): void {
    const end = this.bytes.indexOf(closing, this.at, 'latin1');
    if (end < 0) throw new Unusual();
    this.at = end + closing.length;
  }

  decode(start: number, end: number): string {
    const text = decodeText(this.bytes, start, end);
    if (text === null) throw new Unusual();
    return text;
  }
}

export function bytesOf(name: string): Uint8Array {
  return Buffer.from(name, 'latin1');
}

/**
 * Whether a part can be scanned: UTF-8, and no comment, CDATA, document type or instruction but the
 * declaration at its beginning.
 */
export function isPlain(bytes: Buffer, encoding: string): boolean {
  if (encoding !== 'utf-8' && encoding !== 'utf8' && encoding !== 'us-ascii') return false;
  return bytes.indexOf('<!') < 0 && bytes.indexOf('<?', 8) < 0;
}

/**
 * A decimal number written between start and end; NaN where it is none of the plain form. Exact: mantissas
 * within 2^53 and powers of ten up to 22 are exact doubles, and their quotient is rounded once.
 */
export function parseDecimal(bytes: Uint8Array, start: number, end: number): number {
  let at = start;
  const negative = bytes[at] === 45;
  if (negative) at++;
  if (end - at > 16 || end === at) return Number.NaN;
  let mantissa = 0;
  let point = -1;
  for (; at < end; at++) {
    const byte = bytes[at] ?? 0;
    if (byte >= 48 && byte <= 57) mantissa = mantissa * 10 + byte - 48;
    else if (byte === 46 && point < 0) point = at;
    else return Number.NaN;
  }
  if (mantissa > Number.MAX_SAFE_INTEGER) return Number.NaN;
  const value = point < 0 ? mantissa : mantissa / (POWERS[end - point - 1] ?? Number.NaN);
  return negative ? -value : value;
}

const POWERS = Array.from({ length: 23 }, (_, i) => 10 ** i);
