import { UnreadableFile } from '@/parsers/errors';

export const ENCODINGS = ['utf-8', 'utf-16le', 'utf-16be', 'windows-1252'] as const;
export type Encoding = (typeof ENCODINGS)[number];

export interface DecodedText {
  /** Without the byte order mark. */
  readonly text: string;
  readonly encoding: Encoding;
  /** Whether a byte order mark stands first. */
  readonly mark: boolean;
}

const SAMPLE = 4096;
const CONTROLS = /[\u0000-\u0008\u000e-\u0019\u001b-\u001f\u007f\u0080-\u0084\u0086-\u009f\ufffd\uffff]/g;
/** Share of control characters beyond which the content is no text. */
const CONTROL_SHARE = 0.001;

const KINDS: readonly [RegExp, string][] = [
  [
    /^\s*<(?:!doctype|html|head|body|table|\?xml|\w+:workbook|workbook)\b/i,
    'This file holds a web page or XML, not a spreadsheet. Open it in a spreadsheet program, save it as an Excel workbook (.xlsx), and send that.',
  ],
  [
    /^%PDF-/,
    'This file is a PDF. Send the list as an Excel workbook (.xlsx) or as comma-separated text (.csv).',
  ],
  [
    /^\{\\rtf/,
    'This file is a text document. Send the list as an Excel workbook (.xlsx) or as comma-separated text (.csv).',
  ],
];

/** Decodes the bytes of a text file; throws UnreadableFile where they are no text. */
export function decodeText(bytes: Uint8Array): DecodedText {
  const { encoding, length } = markOf(bytes);
  const body = length > 0 ? bytes.subarray(length) : bytes;
  const found = encoding ?? wideEncoding(body);
  const decoded = found ? { text: decode(body, found), encoding: found } : narrowText(body);
  const text = decoded.text.replace(/\u001a+\s*$/, '');
  checkIsText(text);
  return { ...decoded, text, mark: length > 0 };
}

function markOf(bytes: Uint8Array): { encoding: Encoding | null; length: number } {
  const [a, b, c] = bytes;
  if (a === 0xef && b === 0xbb && c === 0xbf) return { encoding: 'utf-8', length: 3 };
  if (a === 0xff && b === 0xfe) return { encoding: 'utf-16le', length: 2 };
  if (a === 0xfe && b === 0xff) return { encoding: 'utf-16be', length: 2 };
  return { encoding: null, length: 0 };
}

/** UTF-16 without a mark: every other byte of Western text is 0. */
function wideEncoding(bytes: Uint8Array): Encoding | null {
  const sample = bytes.subarray(0, SAMPLE);
  const zeros = [0, 0];
  sample.forEach((byte, i) => {
    if (byte === 0) zeros[i % 2] = (zeros[i % 2] ?? 0) + 1;
  });
  const [even = 0, odd = 0] = zeros;
  const many = sample.length * 0.3;
  if (odd > many && even < odd * 0.05) return 'utf-16le';
  if (even > many && odd < even * 0.05) return 'utf-16be';
  return null;
}

/** UTF-8 where the bytes are valid as such, else Windows-1252. */
function narrowText(bytes: Uint8Array): { text: string; encoding: Encoding } {
  try {
    return {
      text: new TextDecoder('utf-8', { fatal: true, ignoreBOM: true }).decode(bytes),
      encoding: 'utf-8',
    };
  } catch {
    return { text: decode(bytes, 'windows-1252'), encoding: 'windows-1252' };
  }
}

function decode(bytes: Uint8Array, encoding: Encoding): string {
  if (encoding === 'windows-1252') return decodeWindows1252(bytes);
  return new TextDecoder(encoding, { ignoreBOM: true }).decode(bytes);
}

/** Characters of the bytes 80 to 9F (WHATWG Encoding Standard, index windows-1252); five stay controls. */
export const WINDOWS_1252 =
  '\u20ac\u0081\u201a\u0192\u201e\u2026\u2020\u2021\u02c6\u2030\u0160\u2039\u0152\u008d\u017d\u008f' +
  '\u0090\u2018\u2019\u201c\u201d\u2022\u2013\u2014\u02dc\u2122\u0161\u203a\u0153\u009d\u017e\u0178';

/** By hand, since TextDecoder in some releases of Node.js 20 decodes these bytes as ISO 8859-1. */
function decodeWindows1252(bytes: Uint8Array): string {
  const text = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength).toString('latin1');
  return text.replace(/[\u0080-\u009f]/g, (control) => WINDOWS_1252[control.charCodeAt(0) - 128] ?? control);
}

function checkIsText(text: string): void {
  for (const [kind, sentence] of KINDS) {
    if (kind.test(text.slice(0, 200))) throw new UnreadableFile('not-a-spreadsheet', sentence);
  }
  const controls = text.match(CONTROLS)?.length ?? 0;
  if (text.includes('\0') || controls > text.length * CONTROL_SHARE)
    throw new UnreadableFile('not-a-spreadsheet');
  if (text.trim() === '') throw new UnreadableFile('empty');
}
