import { damaged } from '@/parsers/errors';

const QUOTE = 34;
const NEWLINE = 10;
const RETURN = 13;

/**
 * A cursor over the fields of delimiter-separated text (RFC 4180, and what spreadsheets make of the rest:
 * any line end closes a record, and text after a closing quotation mark belongs to the field).
 */
export class FieldCursor {
  /** Extent of the field last read, quotation marks included. */
  start = 0;
  end = 0;
  quoted = false;
  /** Its text, quotation marks resolved. */
  value = '';
  /** Whether it closes its record. */
  last = false;
  /** Number of the record it stands in, from 1; blank lines count. */
  record = 0;
  private at: number;
  private fresh = true;
  private readonly separator: number;

  constructor(
    private readonly text: string,
    delimiter: string,
    from = 0,
    /** What becomes of a quotation mark that is never closed. */
    private readonly unclosed: 'refused' | 'closed at the end' = 'refused',
  ) {
    this.separator = delimiter.charCodeAt(0);
    this.at = from;
  }

  /** Reads the next field; false at the end. Throws UnreadableFile where a quotation mark is never closed. */
  next(): boolean {
    const { text } = this;
    if (this.fresh) {
      if (this.at >= text.length) return false;
      this.record++;
    }
    this.start = this.at;
    this.quoted = text.charCodeAt(this.at) === QUOTE;
    if (this.quoted) this.readQuoted();
    else {
      this.end = this.plainEnd(this.at);
      this.value = text.slice(this.start, this.end);
    }
    this.pass();
    return true;
  }

  private readQuoted(): void {
    const { text } = this;
    let closing = text.indexOf('"', this.at + 1);
    let doubled = false;
    while (closing >= 0 && text.charCodeAt(closing + 1) === QUOTE) {
      doubled = true;
      closing = text.indexOf('"', closing + 2);
    }
    if (closing < 0) {
      if (this.unclosed === 'refused')
        throw damaged(`The quotation mark that opens in record ${this.record} of this file is never closed.`);
      closing = text.length;
    }
    const inner = text.slice(this.at + 1, closing);
    this.end = this.plainEnd(closing + 1);
    const rest = text.slice(closing + 1, this.end);
    this.value = (doubled ? inner.replaceAll('""', '"') : inner) + (rest.trim() === '' ? '' : rest);
  }

  private plainEnd(from: number): number {
    const { text, separator } = this;
    let at = from;
    for (; at < text.length; at++) {
      const code = text.charCodeAt(at);
      if (code === separator || code === NEWLINE || code === RETURN) break;
    }
    return at;
  }

  /** Moves past the delimiter or the line end. */
  private pass(): void {
    const { text, end } = this;
    this.last = text.charCodeAt(end) !== this.separator;
    this.fresh = this.last;
    const isPair = text.charCodeAt(end) === RETURN && text.charCodeAt(end + 1) === NEWLINE;
    this.at = end + (isPair ? 2 : 1);
  }
}
