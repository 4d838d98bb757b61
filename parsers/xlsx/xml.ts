import { SaxesParser } from 'saxes';
import { damaged, UnreadableFile } from '@/parsers/errors';
import { LIMITS } from '@/parsers/limits';

/** Called for elements of the namespaces a workbook is made of; others are passed over. */
export interface XmlHandler {
  open?(name: string, attributes: Readonly<Record<string, string>>): void;
  close?(name: string): void;
  text?(text: string): void;
}

/** ECMA-376 part 1, transitional and strict; parts written without a namespace are read as if they had it. */
const NAMESPACES = new Set([
  '',
  'http://schemas.openxmlformats.org/spreadsheetml/2006/main',
  'http://purl.oclc.org/ooxml/spreadsheetml/main',
  'http://schemas.openxmlformats.org/package/2006/relationships',
  'http://schemas.openxmlformats.org/package/2006/content-types',
]);
const CHUNK = 256 * 1024;
const DEPTH_MAX = 200;
/** Characters without a tag: beyond what a cell's text, or the space between cells, can be. */
const QUIET_MAX = 4 * 1024 * 1024;

/**
 * Reads a part of a workbook strictly: well-formed, namespaces resolved, no document type. Attributes come
 * by their local name. Throws UnreadableFile, also where the part has more elements than given.
 */
export function readXml(
  bytes: Uint8Array,
  part: string,
  handler: XmlHandler,
  elements: number = LIMITS.otherElements,
): void {
  const parser = new SaxesParser({ xmlns: true, position: false });
  let depth = 0;
  let count = 0;
  let quiet = 0;
  parser.on('error', () => {
    throw damaged(`The part ${part} inside this workbook is not well-formed.`);
  });
  parser.on('doctype', () => {
    throw new UnreadableFile(
      'damaged',
      `The part ${part} inside this workbook declares a document type, which no workbook needs; it is not read.`,
    );
  });
  parser.on('opentag', (tag) => {
    quiet = 0;
    if (++count > elements) throw new UnreadableFile('too-many-cells');
    if (++depth > DEPTH_MAX) throw damaged(`The part ${part} inside this workbook is nested too deeply.`);
    if (!NAMESPACES.has(tag.uri)) return;
    const attributes: Record<string, string> = Object.create(null);
    for (const { prefix, local, uri, value } of Object.values(tag.attributes)) {
      if (prefix === '' || uri.endsWith('/relationships')) attributes[local] = value;
    }
    handler.open?.(tag.local, attributes);
  });
  parser.on('closetag', (tag) => {
    depth--;
    quiet = 0;
    if (NAMESPACES.has(tag.uri)) handler.close?.(tag.local);
  });
  const text = handler.text?.bind(handler);
  if (text) {
    parser.on('text', text);
    parser.on('cdata', text);
  }
  for (const chunk of decode(bytes, part)) {
    quiet += chunk.length;
    if (quiet > QUIET_MAX)
      throw damaged(`The part ${part} inside this workbook holds a text longer than a cell can hold.`);
    parser.write(chunk);
  }
  parser.close();
}

/** The part's text in pieces, since a large part is longer than a string may be. */
function* decode(bytes: Uint8Array, part: string): Generator<string> {
  const decoder = decoderFor(bytes, part);
  try {
    for (let at = 0; at < bytes.length; at += CHUNK) {
      yield decoder.decode(bytes.subarray(at, at + CHUNK), { stream: true });
    }
    yield decoder.decode();
  } catch (error) {
    if (error instanceof TypeError)
      throw damaged(`The part ${part} inside this workbook holds bytes that are no text.`);
    throw error;
  }
}

function decoderFor(bytes: Uint8Array, part: string): TextDecoder {
  try {
    return new TextDecoder(encodingOf(bytes), { fatal: true });
  } catch {
    throw damaged(`The part ${part} inside this workbook is in an unknown encoding.`);
  }
}

/** By its mark, else by its first bytes, else as its declaration says (XML 1.0, appendix F). */
export function encodingOf(bytes: Uint8Array): string {
  const [first, second] = bytes;
  if ((first === 0xff && second === 0xfe) || (first === 0x3c && second === 0)) return 'utf-16le';
  if ((first === 0xfe && second === 0xff) || (first === 0 && second === 0x3c)) return 'utf-16be';
  const head = String.fromCharCode(...bytes.subarray(0, 200));
  return (
    /^(?:ï»¿)?\s*<\?xml[^>]*?encoding\s*=\s*["']([\w.:-]+)["']/.exec(head)?.[1]?.toLowerCase() ?? 'utf-8'
  );
}
