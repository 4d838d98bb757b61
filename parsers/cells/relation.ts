import type { Unit } from '@/lib/schedule/activity';
import type { ReadingOptions } from '@/lib/schedule/activity-list';
import { RELATION_NAMES, RELATIONS, type Relation } from '@/lib/schedule/relation';
import { readNumber, valuesOf } from './number';
import { fold } from './text';
import { daysIn, oneUnit } from './unit';

/** How lags are read. */
export interface LagContext {
  /** The unit of a lag that states none: that of the durations. */
  readonly unit: Unit;
  readonly options: ReadingOptions;
}

const MINUS = /^[-\u2212\u2013]$/;
const LAG = /^([+\-\u2212\u2013])\s*(\d[\d.,]*|[.,]\d+)\s*(\p{L}[\p{L} .]*)?$/u;

/**
 * The letters by which lists in other languages name the relations (German, French, Spanish, Italian): common
 * practice, from memory. Read where a column of its own gives the relation.
 */
const ELSEWHERE: Readonly<Record<string, Relation>> = {
  EA: 'FS',
  AA: 'SS',
  EE: 'FF',
  AE: 'SF',
  FD: 'FS',
  DD: 'SS',
  DF: 'SF',
  FC: 'FS',
  CC: 'SS',
  CF: 'SF',
  FI: 'FS',
  II: 'SS',
  IF: 'SF',
};

/** The relation that two letters of another language name; null where they name none. */
export function relationElsewhere(letters: string): Relation | null {
  return ELSEWHERE[letters.toUpperCase()] ?? null;
}

/** Two letters that name a relation, in capitals; null where they name none. */
export function toRelation(text: string): Relation | null {
  const letters = text.toUpperCase();
  return RELATIONS.find((relation) => relation === letters) ?? null;
}

/** A relation as a column of its own may give it: `SS`, `S-S`, `Start to start`, `start-start (SS)`. */
export function readRelation(text: string): Relation | null {
  const words = fold(text);
  const bare = words.replace(/[\s./-]/g, '');
  const letters = toRelation(bare) ?? relationElsewhere(bare);
  if (letters) return letters;
  const [, named = words, bracketed = ''] = /^(.*?)\s*\(([a-z]{2})\)$/.exec(words) ?? [];
  const spelled = named.replace(/[\s-]+(?:to[\s-]+)?/g, ' to ');
  const found = RELATIONS.find((relation) => RELATION_NAMES[relation] === spelled) ?? null;
  return bracketed === '' || toRelation(bracketed) === found ? found : null;
}

/** Working days of a signed lag such as `+3`, `- 2 d`, `+1.5w`; null where it cannot be read. */
export function readLag(text: string, { unit, options }: LagContext): number | null {
  const [, sign, number, word] = LAG.exec(text.trim()) ?? [];
  if (sign === undefined || number === undefined) return null;
  const reading = readNumber(number);
  const [value, other] = reading ? valuesOf(reading, null) : [];
  const stated = word === undefined ? { unit, times: 1 } : oneUnit(word);
  if (value === undefined || other !== undefined || !stated) return null;
  const days = value * stated.times * daysIn(stated.unit, options);
  return MINUS.test(sign) && days !== 0 ? -days : days;
}
