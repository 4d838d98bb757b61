import type { Field } from '@/lib/schedule/field';
import { clean, fold } from '@/parsers/cells/text';
import { readUnit, type WrittenUnit } from '@/parsers/cells/unit';
import { LETTER_SETS, NAMES, OTHER_THINGS, WORDS } from './names';

/** What a header's text means. */
export interface HeaderReading {
  /** As the sheet shows it, on one line. */
  readonly text: string;
  /** Folded, without units, brackets and punctuation. */
  readonly key: string;
  /** Fields it may stand for, surest first. */
  readonly fields: readonly { readonly field: Field; readonly sureness: number }[];
  /** Ways the unit it states can be meant; null where it states none. */
  readonly unit: readonly WrittenUnit[] | null;
}

const LENGTH_MAX = 80;
/** Words that say nothing of which estimate it is. */
const FILLERS =
  /\b(?:duration|durations|dur|estimate|estimates|estimated|est|time|times|activity|task|value|values|in|of|the|for|s|dauer|duree|duracion|durata|duur)\b/g;
/** Units of one or two letters that are words of their own where no bracket is around them. */
const NOT_TRAILING = new Set([
  'at',
  'an',
  'j',
  'y',
  'e',
  'min',
  'mo',
  'sem',
  'so',
  'jo',
  'jr',
  'ed',
  'cd',
  'gg',
  'ora',
  'mes',
  'mon',
]);
/** In brackets these are estimates, not minutes or months. */
const NOT_IN_BRACKETS = new Set(['min', 'mon', 'mo']);

const exact = new Map<string, { field: Field; sureness: number }[]>();
for (const [field, sureness, names] of NAMES) {
  for (const name of names.split('|')) {
    const known = exact.get(name) ?? [];
    if (!known.some((one) => one.field === field)) known.push({ field, sureness });
    exact.set(name, known);
  }
}
const worded = WORDS.map(([field, sureness, names]) => ({
  field,
  sureness,
  pattern: new RegExp(`(?:^| )(?:${names})(?: |$)`),
}));
/** Single words long enough that one wrong letter leaves no doubt. */
const distinctive = [...exact.keys()].filter((name) => name.length >= 7 && !name.includes(' '));

const read = new Map<string, HeaderReading>();

/** Reads a header's text. */
export function readHeader(text: string): HeaderReading {
  const shown = clean(text);
  const known = read.get(shown);
  if (known) return known;
  const reading = parseHeader(shown);
  if (read.size > 20_000) read.clear();
  read.set(shown, reading);
  return reading;
}

function parseHeader(text: string): HeaderReading {
  if (text === '' || text.length > LENGTH_MAX) return { text, key: '', fields: [], unit: null };
  let unit: readonly WrittenUnit[] | null = null;
  const inner: string[] = [];
  const outside = fold(text).replace(/[([{]([^)\]}]*)[)\]}]?/g, (_, content: string) => {
    const stated = NOT_IN_BRACKETS.has(content.trim()) ? null : unitIn(content);
    if (stated) unit ??= stated;
    else inner.push(content);
    return ' ';
  });
  const stripped = stripUnit(plainWords(outside));
  unit ??= stripped.unit;
  const main = stripped.key;
  const whole = [main, plainWords(inner.join(' '))].filter((part) => part !== '').join(' ');
  const fields = OTHER_THINGS.test(whole) && !exact.has(whole) ? [] : fieldsOf(main, whole);
  return { text, key: whole, fields, unit };
}

/** `days`, `in days`, `working days`, `unit: days`. */
function unitIn(content: string): readonly WrittenUnit[] | null {
  return readUnit(plainWords(content).replace(/^(?:in|unit|units|all in|en)\s+/, ''));
}

function plainWords(text: string): string {
  return text
    .replaceAll('%', ' percent ')
    .replace(/#|\bn[o\u00ba\u00b0]?\.(?=\s|$)|\u2116|\bn[\u00ba\u00b0]/g, ' no ')
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim();
}

/** Takes a unit off the end, or the beginning, of a header. */
function stripUnit(key: string): { key: string; unit: readonly WrittenUnit[] | null } {
  const words = key.split(' ');
  for (const count of [2, 1]) {
    const last = words.slice(-count).join(' ');
    const unit = NOT_TRAILING.has(last) ? null : readUnit(last);
    if (!unit) continue;
    const rest = words
      .slice(0, -count)
      .join(' ')
      .replace(/ (?:in|en)$/, '');
    return rest === '' || /^(?:in|en)$/.test(rest)
      ? { key, unit }
      : { key: exact.has(key) ? key : rest, unit };
  }
  const [first = '', ...others] = words;
  const unit = first.length > 2 && others.length > 0 && !NOT_TRAILING.has(first) ? readUnit(first) : null;
  return unit ? { key: others.join(' '), unit } : { key, unit: null };
}

function fieldsOf(main: string, whole: string): { field: Field; sureness: number }[] {
  const direct = exact.get(whole);
  if (direct) return sorted(direct);
  const bare = whole.replace(FILLERS, ' ').replace(/\s+/g, ' ').trim();
  const loose = /\b(?:id|no|code|name)\b/.test(whole) ? undefined : exact.get(bare);
  if (loose) return sorted(loose.map(({ field, sureness }) => ({ field, sureness: sureness * 0.95 })));
  for (const { field, sureness, pattern } of worded) {
    if (whole.split(' ').length <= 8 && pattern.test(whole)) return [{ field, sureness }];
  }
  const outer = main === whole ? undefined : exact.get(main);
  if (outer) return sorted(outer.map(({ field, sureness }) => ({ field, sureness: sureness * 0.9 })));
  return misspelt(whole);
}

/** A header of one word with one letter wrong, missing or too many. */
function misspelt(word: string): { field: Field; sureness: number }[] {
  if (word.length < 6 || word.includes(' ')) return [];
  const meant = distinctive.find((name) => isNear(word, name));
  return (meant ? (exact.get(meant) ?? []) : []).map(({ field, sureness }) => ({
    field,
    sureness: sureness * 0.85,
  }));
}

/** One letter changed, added or left out, or two neighbours exchanged. */
function isNear(a: string, b: string): boolean {
  if (Math.abs(a.length - b.length) > 1) return false;
  let start = 0;
  while (start < a.length && a[start] === b[start]) start++;
  let end = 0;
  while (end < a.length - start && end < b.length - start && a.at(-1 - end) === b.at(-1 - end)) end++;
  const [inA, inB] = [a.slice(start, a.length - end), b.slice(start, b.length - end)];
  return Math.max(inA.length, inB.length) <= 1 || (inA.length === 2 && inA === [...inB].reverse().join(''));
}

function sorted(fields: readonly { field: Field; sureness: number }[]) {
  return [...fields].sort((a, b) => b.sureness - a.sureness);
}

/** The letters a header is left with once words that say nothing are taken off: `Duration a` gives `a`. */
function lettersOf({ key }: HeaderReading): string {
  return key.replace(FILLERS, ' ').replace(/\s+/g, ' ').trim();
}

/** The estimates that headers of a letter or two mean, by their position; none where no set is complete. */
export function letterEstimates(headers: readonly HeaderReading[]): Map<number, Field> {
  const found = new Map<number, Field>();
  const letters = headers.map(lettersOf);
  for (const set of LETTER_SETS) {
    const places = set.map((letter) => letters.indexOf(letter));
    if (places.some((place) => place < 0)) continue;
    (['optimistic', 'likely', 'pessimistic'] as const).forEach((field, i) =>
      found.set(places[i] ?? -1, field),
    );
    break;
  }
  return found;
}
