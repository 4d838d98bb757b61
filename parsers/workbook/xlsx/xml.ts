/**
 * Just enough XML to change a part without writing it anew: elements are found as places in the text.
 * The text may be a part's characters or, for big parts, its UTF-8 bytes one a character (`latin1`);
 * the markup is ASCII in either.
 */

export interface Tag {
  /** With its prefix. */
  readonly name: string;
  readonly kind: 'open' | 'close' | 'empty';
  readonly start: number;
  readonly end: number;
}

export interface Element {
  readonly name: string;
  readonly start: number;
  /** Where the content begins and ends; both equal `end` for `<x/>`. */
  readonly inner: number;
  readonly innerEnd: number;
  readonly end: number;
}

/** End of the tag that begins at `start`; a `>` within quotes is part of a value. */
export function tagEnd(xml: string, start: number): number {
  for (let at = start + 1; at < xml.length; at += 1) {
    const code = xml.charCodeAt(at);
    if (code === 62) return at + 1;
    if (code === 34 || code === 39) {
      at = xml.indexOf(code === 34 ? '"' : "'", at + 1);
      if (at < 0) return xml.length;
    }
  }
  return xml.length;
}

function afterOpaque(xml: string, at: number): number {
  const [closing] = (xml.startsWith('<!--', at) && ['-->']) ||
    (xml.startsWith('<![CDATA[', at) && [']]>']) || ['>'];
  const end = xml.indexOf(closing ?? '>', at + 2);
  return end < 0 ? xml.length : end + (closing ?? '>').length;
}

/** The next tag from a place on; comments, CDATA and instructions are passed over. */
export function nextTag(xml: string, from: number): Tag | null {
  let start = xml.indexOf('<', from);
  while (start >= 0) {
    const next = xml.charCodeAt(start + 1);
    if (next !== 33 && next !== 63) break;
    start = xml.indexOf('<', afterOpaque(xml, start));
  }
  if (start < 0) return null;
  const end = tagEnd(xml, start);
  const closing = xml.charCodeAt(start + 1) === 47;
  const name = /[^\s/>]+/.exec(xml.slice(start + (closing ? 2 : 1), Math.min(end, start + 200)))?.[0] ?? '';
  const kind = closing ? 'close' : xml.charCodeAt(end - 2) === 47 ? 'empty' : 'open';
  return { name, kind, start, end };
}

/** The elements that stand directly between two places, in order. */
export function* children(xml: string, within: { inner: number; innerEnd: number }): Generator<Element> {
  let depth = 0;
  let open: Tag | null = null;
  for (
    let tag = nextTag(xml, within.inner);
    tag && tag.start < within.innerEnd;
    tag = nextTag(xml, tag.end)
  ) {
    if (tag.kind === 'empty') {
      if (depth === 0)
        yield { name: tag.name, start: tag.start, inner: tag.end, innerEnd: tag.end, end: tag.end };
    } else if (tag.kind === 'open') {
      if (depth === 0) open = tag;
      depth += 1;
    } else {
      depth -= 1;
      if (depth < 0) return;
      if (depth === 0 && open) {
        yield { name: open.name, start: open.start, inner: open.end, innerEnd: tag.start, end: tag.end };
      }
    }
  }
}

export function child(
  xml: string,
  within: { inner: number; innerEnd: number },
  name: string,
): Element | null {
  for (const element of children(xml, within)) if (element.name === name) return element;
  return null;
}

/** The outermost element, found without walking through it; null where there is none. */
export function rootOf(xml: string): Element | null {
  const tag = nextTag(xml, 0);
  if (!tag || tag.kind === 'close') return null;
  if (tag.kind === 'empty') return { ...tag, inner: tag.end, innerEnd: tag.end };
  const closing = xml.lastIndexOf(`</${tag.name}`);
  if (closing < 0) return null;
  return { name: tag.name, start: tag.start, inner: tag.end, innerEnd: closing, end: tagEnd(xml, closing) };
}

/** `x:` of `<x:worksheet>`; '' without a prefix. */
export const prefixOf = (name: string) => name.slice(0, name.indexOf(':') + 1);

const patterns = new Map<string, RegExp>();

function attributePattern(name: string): RegExp {
  const pattern = patterns.get(name) ?? new RegExp(`(\\s${name}\\s*=\\s*)(?:"([^"]*)"|'([^']*)')`);
  patterns.set(name, pattern);
  return pattern;
}

/** An attribute of a start tag, given with its prefix, as a pattern; its entities resolved. */
export function attribute(tag: string, name: string): string | null {
  const match = attributePattern(name).exec(tag);
  return match ? unescapeXml(match[2] ?? match[3] ?? '') : null;
}

/** The relationship an element names: the `id` of whatever prefix. */
export const relationId = (tag: string) => attribute(tag, '[\\w.-]+:id');

export function withAttribute(tag: string, name: string, value: string): string {
  const quoted = `"${escapeAttribute(value)}"`;
  const pattern = attributePattern(name);
  if (pattern.test(tag)) return tag.replace(pattern, (_, start: string) => start + quoted);
  return tag.replace(/\s*(\/?>)$/, (_, close: string) => ` ${name}=${quoted}${close}`);
}

export function withoutAttribute(tag: string, name: string): string {
  return tag.replace(attributePattern(name), '');
}

const ENTITIES: Readonly<Record<string, string>> = { amp: '&', lt: '<', gt: '>', quot: '"', apos: "'" };

export function unescapeXml(text: string): string {
  if (!text.includes('&')) return text;
  return text.replace(
    /&(?:#x([0-9a-fA-F]+)|#(\d+)|(\w+));/g,
    (whole, hex?: string, decimal?: string, name = '') => {
      const code = hex ? parseInt(hex, 16) : decimal ? Number(decimal) : -1;
      if (code >= 0) return code <= 0x10ffff ? String.fromCodePoint(code) : whole;
      return ENTITIES[name] ?? whole;
    },
  );
}

/** The text of an element without children: entities resolved, CDATA taken as it is. */
export function textIn(xml: string): string {
  if (!xml.includes('<')) return unescapeXml(xml);
  const pieces = xml.matchAll(/<!\[CDATA\[([\s\S]*?)\]\]>|<[^>]*>|([^<]+)/g);
  return [...pieces].map(([, raw, text]) => raw ?? unescapeXml(text ?? '')).join('');
}

/** Text as a workbook keeps it: what XML cannot hold, and what looks like its stand-in, as `_xHHHH_` (ST_Xstring). */
export function escapeText(text: string): string {
  const kept = text
    .replace(/_(?=x[0-9A-Fa-f]{4}_)/g, '_x005F_')
    // Half a surrogate pair is passed over by the u flag only where it is no half.
    .replace(/[^\t\n\r\u{20}-\u{d7ff}\u{e000}-\u{fffd}\u{10000}-\u{10ffff}]/gu, standIn);
  return kept
    .replace(/[&<>]/g, (character) => (character === '&' ? '&amp;' : character === '<' ? '&lt;' : '&gt;'))
    .replaceAll('\r', '&#13;');
}

function standIn(character: string): string {
  return `_x${character.charCodeAt(0).toString(16).toUpperCase().padStart(4, '0')}_`;
}

export function escapeAttribute(text: string): string {
  return escapeText(text).replaceAll('"', '&quot;').replaceAll('\n', '&#10;').replaceAll('\t', '&#9;');
}

/** A replacement of the text between two places. */
export interface Splice {
  readonly start: number;
  readonly end: number;
  readonly text: string;
}

/** Carries out replacements that do not overlap; what is put in before a place comes before what replaces it. */
export function splice(xml: string, splices: readonly Splice[]): string {
  const ordered = [...splices].sort((a, b) => a.start - b.start || a.end - b.end);
  const pieces: string[] = [];
  let at = 0;
  for (const { start, end, text } of ordered) {
    pieces.push(xml.slice(at, start), text);
    at = end;
  }
  pieces.push(xml.slice(at));
  return pieces.join('');
}

/** Adds markup at the end of an element's content; `<x/>` is opened. */
export function append(xml: string, element: Element, markup: string): Splice {
  if (element.inner < element.end) return { start: element.innerEnd, end: element.innerEnd, text: markup };
  const tag = xml.slice(element.start, element.end).replace(/\s*\/>$/, '>');
  return { start: element.start, end: element.end, text: `${tag}${markup}</${element.name}>` };
}
