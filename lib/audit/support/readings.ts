import type { LinkItem } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { RELATIONS, type Relation } from '@/lib/schedule/relation';
import { daysIn } from './written';

interface ReadLink {
  readonly activity: number;
  readonly type: Relation;
  /** Working days. */
  readonly lag: number;
}

/** A way of writing an entry, read: links to activities of the list. */
export interface Reading {
  readonly text: string;
  readonly links: readonly ReadLink[];
}

/** What may follow an ID: a relation, a lag, or both. */
const REST = /^\s*(FS|SS|FF|SF)?\s*([+\-\u2212\u2013]\s*\d[\d.,]*\s*\p{L}*)?$/iu;
const LAG = /^([+\-\u2212\u2013])\s*(\d[\d.,]*)\s*(\p{L}*)$/u;
const UNIT_OF = { d: 'day', h: 'hour', w: 'week' } as const;

function lagDays(text: string | undefined, list: ActivityList): number {
  const [, sign, number = '0', word = ''] = LAG.exec(text ?? '') ?? [];
  if (sign === undefined) return 0;
  const letter = word.charAt(0).toLowerCase();
  const unit = letter === 'd' || letter === 'h' || letter === 'w' ? UNIT_OF[letter] : list.unit.value;
  const value = Number(number.replace(',', '.')) * daysIn(unit, list.reading);
  return sign === '+' ? value : -value;
}

const relationOf = (text: string | undefined): Relation =>
  RELATIONS.find((relation) => relation === text?.toUpperCase()) ?? 'FS';

/** An ID stands within so many characters. */
const LONGEST_ID = 80;

/** The longest beginning that is an ID, with what follows it. */
function splitId(text: string, list: ActivityList): { activity: number; rest: string } | null {
  for (let end = Math.min(text.length, LONGEST_ID); end > 0; end--) {
    if (/^[\p{L}\p{N}]{2}$/u.test(text.slice(end - 1, end + 1))) continue;
    const activity = list.indexOf.get(text.slice(0, end).trimEnd());
    if (activity !== undefined) return { activity, rest: text.slice(end) };
  }
  return null;
}

function toLink(text: string, list: ActivityList): ReadLink | null {
  const split = splitId(text, list);
  const match = split && REST.exec(split.rest);
  return match
    ? { activity: split.activity, type: relationOf(match[1]), lag: lagDays(match[2], list) }
    : null;
}

/** Null where part of the reading names no activity of the list. */
function toReading(text: string, list: ActivityList): Reading | null {
  const whole = toLink(text.trim(), list);
  const links = whole ? [whole] : text.split(', ').map((part) => toLink(part.trim(), list));
  return links.some((link) => link === null) ? null : { text, links: links.filter((link) => link !== null) };
}

/** The readings of an entry that name activities of the list other than its own, each once. */
export function readingsOf(item: LinkItem, owner: number, list: ActivityList): Reading[] {
  return [...new Set(item.readings)].flatMap((text) => {
    const reading = toReading(text, list);
    return reading?.links.every(({ activity }) => activity !== owner) ? [reading] : [];
  });
}

/** The activities an unreadable entry seems to speak of: by its first reading, else by the ID it begins with. */
export function spokenOf(item: LinkItem, owner: number, list: ActivityList): number[] {
  const [reading] = readingsOf(item, owner, list);
  if (reading) return reading.links.map(({ activity }) => activity);
  const split = splitId(item.text, list);
  return split && split.activity !== owner ? [split.activity] : [];
}
