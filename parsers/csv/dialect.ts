import { FieldCursor } from './fields';
import { decodeText, type Encoding } from './text';

/** How a delimiter-separated file is written: what is needed to read it, and to write it the same way. */
export interface Dialect {
  readonly encoding: Encoding;
  /** Whether a byte order mark stands first. */
  readonly mark: boolean;
  readonly delimiter: string;
  readonly newline: '\r\n' | '\n' | '\r';
  /** A leading `sep=` line with its line end, '' where there is none; a spreadsheet does not show it as a row. */
  readonly preamble: string;
}

export interface DialectText {
  readonly dialect: Dialect;
  /** The whole text after the byte order mark; records begin after the preamble. */
  readonly text: string;
}

export const DELIMITERS = [',', ';', '\t', '|'] as const;
const SAMPLE_LENGTH = 128 * 1024;
const SAMPLE_RECORDS = 200;

/** Decodes a text file and tells how it is written. Throws UnreadableFile where it is no text. */
export function readDialect(bytes: Uint8Array): DialectText {
  const { text, encoding, mark } = decodeText(bytes);
  const stated = /^"?sep=([^"\r\n])"?[^\S\r\n]*(?:\r\n|\n|\r|$)/i.exec(text);
  const preamble = stated?.[0] ?? '';
  const delimiter = stated?.[1] ?? detectDelimiter(text);
  return { text, dialect: { encoding, mark, delimiter, newline: newlineOf(text), preamble } };
}

function newlineOf(text: string): Dialect['newline'] {
  const at = text.search(/[\r\n]/);
  if (at < 0 || text.startsWith('\r\n', at)) return '\r\n';
  return text[at] === '\n' ? '\n' : '\r';
}

/** The delimiter that cuts most records into the same number of fields, and into most fields. */
function detectDelimiter(text: string): string {
  let best = { delimiter: ',', score: 0 };
  for (const delimiter of DELIMITERS) {
    const score = consistency(text, delimiter);
    if (score > best.score) best = { delimiter, score };
  }
  return best.delimiter;
}

function consistency(text: string, delimiter: string): number {
  const counts = new Map<number, number>();
  let records = 0;
  for (const { fields, width } of sampleRecords(text, delimiter)) {
    if (fields === 0) continue;
    records++;
    counts.set(width, (counts.get(width) ?? 0) + 1);
  }
  let score = 0;
  for (const [width, count] of counts) {
    if (width > 1) score = Math.max(score, (count / records) * (1 - 1 / width));
  }
  return score;
}

/** Of the first records: how many fields hold anything, and how many there are. */
function* sampleRecords(text: string, delimiter: string): Generator<{ fields: number; width: number }> {
  // The sample may end within a quoted field.
  const cursor = new FieldCursor(text.slice(0, SAMPLE_LENGTH), delimiter, 0, 'closed at the end');
  let fields = 0;
  let width = 0;
  while (cursor.record <= SAMPLE_RECORDS && cursor.next()) {
    width++;
    if (cursor.value.trim() !== '') fields++;
    if (!cursor.last) continue;
    yield { fields, width };
    fields = 0;
    width = 0;
  }
}
