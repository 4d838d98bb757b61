import { RELATIONS } from '@/lib/schedule/relation';
import type { LinkContext } from './links';
import { readRelation, relationElsewhere } from './relation';

const READINGS_MAX = 6;
const WORDS_MAX = 6;
const SPELLED = /\b(start|finish)[\s-]+(?:to[\s-]+)?(start|finish)\b/i;

/**
 * Ways in which an entry that cannot be read could be meant, likeliest first, each written so that it can
 * be read; `isReadable` tells that.
 */
export function readingsOf(
  text: string,
  context: LinkContext,
  isReadable: (text: string) => boolean,
): string[] {
  const found = new Set<string>();
  for (const propose of [
    relationTypo,
    looseLag,
    relationFirst,
    spelledRelation,
    span,
    otherSeparators,
    named,
    amongWords,
  ]) {
    for (const reading of propose(text, context)) {
      const parts = reading.split(', ');
      if (reading !== text && parts.every(isReadable)) found.add(reading);
    }
    if (found.size > 0) break;
  }
  return [...found].slice(0, READINGS_MAX);
}

/** The longest beginning that is an ID, and what follows it. */
function splitKnown(text: string, { ids }: LinkContext): { id: string; rest: string } | null {
  for (let length = Math.min(text.length - 1, ids.longest + 4); length > 0; length--) {
    if (/[\p{L}\d]/u.test(text.charAt(length)) && /[\p{L}\d]/u.test(text.charAt(length - 1))) continue;
    const id = ids.find(text.slice(0, length).trimEnd());
    if (id !== null) return { id, rest: text.slice(length).trim() };
  }
  return null;
}

/** `B SX+3`: relations that differ in one letter; `B S.S.+3`. */
function relationTypo(text: string, context: LinkContext): string[] {
  const { id, rest } = splitKnown(text, context) ?? {};
  const [, letters, lag = ''] =
    /^[:([]?\s*([\p{L}](?:[\p{L}.\- ]{0,3}[\p{L}.])?)\s*([+\-\u2212\u2013]\s*[\d.,]+.*?)?[)\]]?$/u.exec(
      rest ?? '',
    ) ?? [];
  if (id === undefined || letters === undefined) return [];
  const bare = letters.replace(/[^\p{L}]/gu, '').toUpperCase();
  const elsewhere = relationElsewhere(bare);
  const stated = RELATIONS.filter((relation) => relation === bare || relation === elsewhere);
  return (stated.length > 0 ? stated : RELATIONS.filter((relation) => differsByOne(bare, relation))).map(
    (relation) => `${id} ${relation}${lag}`,
  );
}

function differsByOne(text: string, relation: string): boolean {
  if (text.length === 2) return text[0] === relation[0] || text[1] === relation[1];
  if (text.length === 1) return text === relation[0];
  return text.length === 3 && [0, 1, 2].some((i) => text.slice(0, i) + text.slice(i + 1) === relation);
}

/** `B SS 3`, `B SS+`, `B SS+3x`, `B +`: the sign that is missing, or without what hangs loose. */
function looseLag(text: string, context: LinkContext): string[] {
  const { id, rest } = splitKnown(text, context) ?? {};
  const [, letters = '', sign = '', number = '', unit = ''] =
    /^[:([]?\s*(FS|SS|FF|SF)?\s*[:=]?\s*([+\-\u2212\u2013]*)\s*([\d.,]*)\s*([^\d)\]]*)[)\]]?$/i.exec(
      rest ?? '',
    ) ?? [];
  if (id === undefined || (letters === '' && sign === '')) return [];
  const head = letters === '' ? id : `${id} ${letters.toUpperCase()}`;
  if (number === '') return unit.trim() === '' ? [head] : [];
  if (/%/.test(unit)) return [];
  if (sign === '')
    return [`${head}+${number}${unit === '' ? '' : ` ${unit.trim()}`}`, `${head}+${number}`].slice(0, 1);
  const signs = sign.length > 1 ? [sign.charAt(0)] : [sign];
  return /^(?:mo|mth|month|y|yr|year|e|cd|cal)/i.test(unit.trim())
    ? []
    : signs.map((one) => `${head}${one}${number}`);
}

/** `SS B`, `FS: B`, `SS+3 B`. */
function relationFirst(text: string, { ids }: LinkContext): string[] {
  const [, letters = '', lag = '', id = ''] =
    /^(FS|SS|FF|SF)\s*([+\-\u2212\u2013]\s*[\d.,]+\s*[dhw]?)?\s*[:\s]\s*(.+)$/i.exec(text) ?? [];
  const known = ids.find(id);
  return known === null ? [] : [`${known} ${letters.toUpperCase()}${lag.trim()}`];
}

/** `B start-to-start + 3`. */
function spelledRelation(text: string): string[] {
  const words = SPELLED.exec(text);
  const relation = words && readRelation(words[0]);
  if (!words || !relation) return [];
  const [before = '', after = ''] = text.split(words[0]);
  return [
    `${before.replace(/[([\s]+$/, '')} ${relation}${after.replace(/^[)\]\s]+/, '').replace(/^([+-])\s+/, '$1')}`,
  ];
}

/** `A-C`, `A to C`: all from one to the other in the list's order, or just the two. */
function span(text: string, { ids }: LinkContext): string[] {
  const [, from = '', to = ''] =
    /^(.+?)\s*(?:[-\u2212\u2013]|\.\.+|\bto\b|\bthrough\b|\bthru\b)\s*(.+)$/i.exec(text) ?? [];
  const [first, last] = [ids.find(from), ids.find(to)];
  if (first === null || last === null) return [];
  const all = ids.between(first, last);
  return [...(all.length > 2 ? [all.join(', ')] : []), `${first}, ${last}`];
}

/** `A/B`, `A + B`, `A or B`: IDs with something between that separates nothing here. */
function otherSeparators(text: string, { ids }: LinkContext): string[] {
  const words = text
    .split(/\s*(?:[\s/|+]|\.(?=\s|$)|\b(?:or|und|et|en|y|e|o)\b)+\s*/i)
    .filter((word) => word !== '');
  const known = words.map((word) => ids.find(word));
  return words.length > 1 && known.every((id) => id !== null) ? [known.join(', ')] : [];
}

/** An activity's name in place of its ID. */
function named(text: string, { ids }: LinkContext): string[] {
  const id = ids.named(text);
  return id === null ? [] : [id];
}

/** `after B`, `B (done)`: the only ID among a few words. */
function amongWords(text: string, { ids }: LinkContext): string[] {
  const words = text.split(/[\s()[\]:"']+/).filter((word) => word !== '');
  const known = words.flatMap((word) => ids.find(word.replace(/[.!?]+$/, '')) ?? []);
  return words.length <= WORDS_MAX && known.length === 1 && !/[+%]/.test(text) ? known : [];
}
