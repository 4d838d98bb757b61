import type { LinkItem } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { RELATIONS, type Relation } from '@/lib/schedule/relation';
import { daysIn } from './written';

/** A way of writing an entry, read: a link to an activity of the list. */
export interface Reading {
  readonly text: string;
  readonly activity: number;
  readonly type: Relation;
  /** Working days. */
  readonly lag: number;
}

const ENTRY = /^(.*?)\s*(?:\b(FS|SS|FF|SF)\b)?\s*([+-]\s*\d+(?:[.,]\d+)?\s*(?:d|h|w)?)?$/i;
const LAG = /^([+-])\s*(\d+(?:[.,]\d+)?)\s*(d|h|w)?$/i;
const UNIT_OF = { d: 'day', h: 'hour', w: 'week' } as const;

function lagDays(text: string | undefined, list: ActivityList): number {
  const match = LAG.exec(text ?? '');
  if (!match) return 0;
  const letter = (match[3] ?? '').toLowerCase();
  const unit = letter === 'd' || letter === 'h' || letter === 'w' ? UNIT_OF[letter] : list.unit.value;
  const value = Number((match[2] ?? '0').replace(',', '.')) * daysIn(unit, list.reading);
  return match[1] === '-' ? -value : value;
}

const relationOf = (text: string | undefined): Relation =>
  RELATIONS.find((relation) => relation === text?.toUpperCase()) ?? 'FS';

/** Null where the reading names no activity of the list. */
export function toReading(text: string, list: ActivityList): Reading | null {
  const literal = list.indexOf.get(text.trim());
  if (literal !== undefined) return { text, activity: literal, type: 'FS', lag: 0 };
  const match = ENTRY.exec(text.trim());
  const activity = match ? list.indexOf.get((match[1] ?? '').trim()) : undefined;
  if (!match || activity === undefined) return null;
  return { text, activity, type: relationOf(match[2]), lag: lagDays(match[3], list) };
}

/** The readings of an entry that name an activity of the list other than its own, each once. */
export function readingsOf(item: LinkItem, owner: number, list: ActivityList): Reading[] {
  return [...new Set(item.readings)].flatMap((text) => {
    const reading = toReading(text, list);
    return reading && reading.activity !== owner ? [reading] : [];
  });
}

/** An ID that stands first in an entry stands within so many characters. */
const LONGEST_ID = 80;

/** The activity an unreadable entry seems to speak of: by its readings, else by the ID it begins with. */
export function spokenOf(item: LinkItem, owner: number, list: ActivityList): number | null {
  const [reading] = readingsOf(item, owner, list);
  if (reading) return reading.activity;
  for (let end = Math.min(item.text.length, LONGEST_ID); end > 0; end--) {
    const cut = item.text.slice(end - 1, end + 1);
    if (cut.length === 2 && /^[\p{L}\p{N}]{2}$/u.test(cut)) continue;
    const activity = list.indexOf.get(item.text.slice(0, end).trim());
    if (activity !== undefined && activity !== owner) return activity;
  }
  return null;
}
