import type { ItemChange } from './edit';

/** Where an entry of a predecessor or successor cell stands in its text, blanks around it left out. */
interface Span {
  readonly start: number;
  readonly end: number;
}

const SEPARATOR = /[,;&]|\r\n?|\n|(?<=\s)and(?=\s)/gi;
const NONE = /^(?:[-\u2012-\u2015\u2212]+|none|nil|n\/?a|n\.a\.)?$/i;
const DEFAULT_SEPARATOR = ', ';

/** Entries between commas, semicolons, line breaks, `and` and `&`; those without text are left out. */
function spansOf(text: string): Span[] {
  const spans: Span[] = [];
  let from = 0;
  const take = (to: number) => {
    const piece = text.slice(from, to);
    const start = from + (piece.length - piece.trimStart().length);
    const end = start + piece.trim().length;
    if (end > start) spans.push({ start, end });
  };
  for (const match of text.matchAll(SEPARATOR)) {
    take(match.index);
    from = match.index + match[0].length;
  }
  take(text.length);
  return spans;
}

/** The entries of a cell, in the order written. */
export function itemsOf(text: string): string[] {
  return NONE.test(text.trim()) ? [] : spansOf(text).map((span) => text.slice(span.start, span.end));
}

const squash = (text: string) => text.replace(/\s+/g, ' ').trim();

/**
 * Entries first … last whose text together is `item`. An ID may itself hold a separator (`R&D`), so an
 * item may reach over several entries.
 */
function findRun(
  text: string,
  spans: readonly Span[],
  item: string,
  fromEnd: boolean,
): [number, number] | null {
  const wanted = item.trim();
  const order = spans.map((_, index) => (fromEnd ? spans.length - 1 - index : index));
  for (const first of order) {
    const start = spans[first]?.start ?? 0;
    if (!text.startsWith(wanted, start)) continue;
    const last = spans.findIndex((span, index) => index >= first && span.end === start + wanted.length);
    if (last >= 0) return [first, last];
  }
  const loose = order.find((index) => {
    const span = spans[index];
    return span !== undefined && squash(text.slice(span.start, span.end)) === squash(wanted);
  });
  return loose === undefined ? null : [loose, loose];
}

function separatorIn(text: string): string | null {
  const [first, second] = spansOf(text);
  if (!first || !second) return null;
  return /^\s*(?:[,;&]|\r\n?|\n|and(?=\s))[^\S\r\n]*/i.exec(text.slice(first.end, second.start))?.[0] ?? null;
}

function remove(text: string, spans: readonly Span[], [first, last]: [number, number]): string {
  const before = spans[first - 1];
  const after = spans[last + 1];
  const end = spans[last]?.end ?? text.length;
  if (before) return text.slice(0, before.end) + text.slice(end);
  return after ? text.slice(0, spans[first]?.start ?? 0) + text.slice(after.start) : '';
}

function applyOne(
  text: string,
  change: ItemChange,
  separator: string | undefined,
  like: string,
): string | null {
  const blank = NONE.test(text.trim());
  const spans = blank ? [] : spansOf(text);
  // Of two alike the later one goes, and the one the reader saw first stays.
  const run = findRun(text, spans, change.item, change.op === 'remove');
  if (change.op === 'add') {
    if (run) return null;
    if (spans.length === 0) return change.item.trim();
    const end = spans.at(-1)?.end ?? text.length;
    const between = separator ?? separatorIn(text) ?? separatorIn(like) ?? DEFAULT_SEPARATOR;
    return text.slice(0, end) + between + change.item.trim() + text.slice(end);
  }
  if (!run) return null;
  if (change.op === 'remove') return remove(text, spans, run);
  const [start, end] = [spans[run[0]]?.start ?? 0, spans[run[1]]?.end ?? text.length];
  return text.slice(0, start) + change.with.trim() + text.slice(end);
}

export interface AppliedItems {
  /** '' where no entry is left. */
  readonly text: string;
  /** Changes that found nothing to change: the entry is not (or, for an addition, already) there. */
  readonly unmet: readonly ItemChange[];
}

/**
 * Changes entries of a predecessor or successor cell, leaving all else of its text as written.
 * `separator` stands before an added entry; without it the cell's own does, or that of `like`.
 */
export function applyItems(
  text: string,
  changes: readonly ItemChange[],
  separator?: string,
  like = '',
): AppliedItems {
  const unmet: ItemChange[] = [];
  let present = text;
  for (const change of changes) {
    const next = applyOne(present, change, separator, like);
    if (next === null) unmet.push(change);
    else present = next;
  }
  return { text: itemsOf(present).length === 0 ? '' : present, unmet };
}
