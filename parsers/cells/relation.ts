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

/** Two letters that name a relation, in capitals; null where they name none. */
export function toRelation(text: string): Relation | null {
  const letters = text.toUpperCase();
  return RELATIONS.find((relation) => relation === letters) ?? null;
}

/** A relation as a column of its own may give it: `SS`, `S-S`, `Start to start`, `start-start (SS)`. */
export function readRelation(text: string): Relation | null {
  const words = fold(text);
  const letters = toRelation(words.replace(/[\s./-]/g, ''));
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
