import type { LinkItem } from '@/lib/schedule/activity';
import type { Relation } from '@/lib/schedule/relation';
import type { IdBook } from './id-book';
import { readingsOf } from './link-readings';
import { type LagContext, readLag, toRelation } from './relation';
import { clean } from './text';

export interface LinkContext extends LagContext {
  readonly ids: IdBook;
}

export interface LinkReading {
  readonly id: string;
  readonly type: Relation;
  readonly lag: number;
  /** Whether the relation, or the lag, is written and not supposed. */
  readonly stated: boolean;
}

/** An entry of a cell; `stated` tells whether it gives a relation or lag of its own. */
export interface CellItem extends LinkItem {
  readonly stated: boolean;
}

export interface CellLinks {
  readonly items: readonly CellItem[];
  /** What stands between the first two entries; null where there are fewer. */
  readonly separator: string | null;
}

/** What may stand between two entries. */
export const SEPARATOR = /\s*[,;\n&]\s*(?:and\s+)?|\s+and\s+/i;
const ALL_SEPARATORS = new RegExp(SEPARATOR, 'gi');
const NONE = /^(?:[-\u2012-\u2015\u2212]+|none|nil|n\/?a|n\.a\.)$/i;
const REST = /^\s*[:([]?\s*(FS|SS|FF|SF)?(?![\p{L}\d])\s*:?\s*(.*?)\s*[)\]]?$/isu;
const MAY_FOLLOW_ID = /[\sfs:([+\-\u2212\u2013]/i;
const UNKNOWN = /^(\S(?:.*?\S)?)\s*[:\s]\s*[([]?(FS|SS|FF|SF)(?![\p{L}\d])\s*(.*?)[)\]]?$/isu;
const UNKNOWN_JOINED = /^(\S*[\p{L}\d])(FS|SS|FF|SF)\s*([+\-\u2212\u2013].*)?$/iu;
const UNKNOWN_LAG = /^(\S*[\p{L}\d])\s*(\+.*)$/u;
const TOKEN_MAX = 40;
/** Beyond this a text is prose, and not searched for IDs letter by letter. */
const ITEM_MAX = 400;

interface Piece {
  readonly start: number;
  readonly end: number;
}

/**
 * Reads a predecessor or successor cell: IDs, each with a relation and a lag if it has them, separated by
 * comma, semicolon, line break, `and` or `&`. What is literally an ID of the list is that ID.
 */
export function readLinks(text: string, context: LinkContext): CellLinks {
  const whole = clean(text);
  if (whole === '') return { items: [], separator: null };
  if (context.ids.find(whole) === null && NONE.test(whole)) return { items: [], separator: null };
  const pieces = piecesOf(text);
  const items: CellItem[] = [];
  const ends: Piece[] = [];
  for (let i = 0; i < pieces.length;) {
    const count = joined(text, pieces, i, context);
    const piece = { start: pieces[i]?.start ?? 0, end: pieces[i + count - 1]?.end ?? 0 };
    const found = readPiece(text.slice(piece.start, piece.end), context);
    items.push(...found);
    ends.push(piece);
    i += count;
  }
  const [first, second] = ends;
  const separator = first && second ? text.slice(first.end, second.start) : null;
  return { items, separator: separator ?? (items.length > 1 ? ' ' : null) };
}

/** The stretches between separators that hold anything. */
function piecesOf(text: string): Piece[] {
  const pieces: Piece[] = [];
  let start = 0;
  const push = (end: number) => {
    const raw = text.slice(start, end);
    const held = raw.trim();
    if (clean(held) === '') return;
    const from = start + raw.indexOf(held);
    pieces.push({ start: from, end: from + held.length });
  };
  for (const match of text.matchAll(ALL_SEPARATORS)) {
    push(match.index);
    start = match.index + match[0].length;
  }
  push(text.length);
  return pieces;
}

/** How many pieces from here on make one entry: an ID that holds separators, or a lag with a decimal comma. */
function joined(text: string, pieces: readonly Piece[], from: number, context: LinkContext): number {
  const { ids } = context;
  const start = pieces[from]?.start ?? 0;
  for (let count = Math.min(ids.separators + 1, pieces.length - from); count > 1; count--) {
    const last = pieces[from + count - 1];
    if (last && readKnown(clean(text.slice(start, last.end)), context)) return count;
  }
  const [first, next] = [pieces[from], pieces[from + 1]];
  if (!first || !next || text.slice(first.end, next.start) !== ',') return 1;
  const [head, tail] = [text.slice(first.start, first.end), text.slice(next.start, next.end)];
  const isDecimal = /[+\-\u2212\u2013]\s*\d+$/.test(head) && /^\d+(?:\s*\p{L}[\p{L} .]*)?$/u.test(tail);
  return isDecimal && ids.find(tail) === null && readKnown(clean(`${head},${tail}`), context) ? 2 : 1;
}

function readPiece(raw: string, context: LinkContext): CellItem[] {
  const text = clean(raw);
  const link = readKnown(text, context);
  if (link) return [toItem(raw, link)];
  const byBlanks = readByBlanks(text, context);
  if (byBlanks) return byBlanks;
  const readings = () => readingsOf(text, context, (one) => readKnown(one, context) !== null);
  const unknown = readUnknown(text, context);
  if (unknown && !isSpan(text, context)) return [toItem(raw, unknown)];
  return [{ text: raw.trim(), link: null, readings: readings(), stated: false }];
}

function toItem(raw: string, { id, type, lag, stated }: LinkReading): CellItem {
  return { text: raw.trim(), link: { id, type, lag }, readings: [], stated };
}

/** An entry that begins with an ID of the list, the longest that fits. */
export function readKnown(text: string, context: LinkContext): LinkReading | null {
  const id = context.ids.find(text);
  if (id !== null) return { id, type: 'FS', lag: 0, stated: false };
  if (text.length > ITEM_MAX) return null;
  for (let length = Math.min(text.length - 1, context.ids.longest + 4); length > 0; length--) {
    if (!MAY_FOLLOW_ID.test(text.charAt(length))) continue;
    const known = context.ids.find(text.slice(0, length).trimEnd());
    const rest = known === null ? null : readRest(text.slice(length), context);
    if (known === null || rest === null) continue;
    if (rest.isLead && mayBeAnId(text, text.slice(length), context)) continue;
    return { id: known, type: rest.type, lag: rest.lag, stated: true };
  }
  return null;
}

/** What follows an ID: a relation, a lag, or both. */
function readRest(
  rest: string,
  context: LinkContext,
): { type: Relation; lag: number; isLead: boolean } | null {
  const [, letters, tail = ''] = REST.exec(rest) ?? [];
  const type = letters === undefined ? null : toRelation(letters);
  if (tail === '') return type ? { type, lag: 0, isLead: false } : null;
  const lag = readLag(tail, context);
  return lag === null ? null : { type: type ?? 'FS', lag, isLead: type === null && lag < 0 };
}

/** `B-2` without a relation: a lead, or an ID built like others of the list, or a span of IDs. */
function mayBeAnId(text: string, rest: string, { ids }: LinkContext): boolean {
  const after = rest.replace(/^\s*[-\u2212\u2013]\s*/, '');
  return ids.hasShape(text) || ids.find(after) !== null;
}

/** Two IDs of the list with a hyphen or dots between: from one to the other, or just the two. */
function isSpan(text: string, { ids }: LinkContext): boolean {
  const [, first, last] = /^(.+?)\s*(?:[-\u2212\u2013/+]|\.\.+)\s*(.+)$/.exec(text) ?? [];
  return first !== undefined && last !== undefined && ids.find(first) !== null && ids.find(last) !== null;
}

/** Entries with nothing but blanks between, where each begins with an ID of the list. */
function readByBlanks(text: string, context: LinkContext): CellItem[] | null {
  if (!text.includes(' ') || text.length > ITEM_MAX) return null;
  const words = text.split(' ');
  const items: CellItem[] = [];
  for (let from = 0; from < words.length;) {
    let taken = 0;
    for (let to = Math.min(words.length, from + 8); to > from && taken === 0; to--) {
      const part = words.slice(from, to).join(' ');
      const link = readKnown(part, context);
      if (!link) continue;
      items.push(toItem(part, link));
      taken = to - from;
    }
    if (taken === 0) return null;
    from += taken;
  }
  return items;
}

/** An entry that begins with no ID of the list, and is built as one that does. */
function readUnknown(text: string, context: LinkContext): LinkReading | null {
  const { ids } = context;
  const looksLikeId = (id: string) =>
    (id.length <= TOKEN_MAX && !/\s/.test(id)) || ids.hasShape(id) || ids.isNearlyId(id);
  if (ids.hasShape(text)) return { id: text, type: 'FS', lag: 0, stated: false };
  const apart = UNKNOWN.exec(text);
  const close = apart ? null : UNKNOWN_JOINED.exec(text);
  const [, id = '', letters = '', tail = ''] = apart ?? close ?? [];
  const type = toRelation(letters);
  if (type && looksLikeId(id) && (apart || tail !== '' || ids.hasShape(id))) {
    const lag = tail.trim() === '' ? 0 : readLag(tail, context);
    return lag === null ? null : { id, type, lag, stated: true };
  }
  const [, bare = '', signed = ''] = UNKNOWN_LAG.exec(text) ?? [];
  if (bare !== '' && looksLikeId(bare)) {
    const lag = readLag(signed, context);
    return lag === null ? null : { id: bare, type: 'FS', lag, stated: true };
  }
  return looksLikeId(text) && !/[:([+%]/.test(text) ? { id: text, type: 'FS', lag: 0, stated: false } : null;
}
