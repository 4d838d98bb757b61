import type { DurationContext } from './duration';
import { readNumber, valuesOf } from './number';
import { fold } from './text';
import { daysIn, readUnit, type WrittenUnit } from './unit';

/** Words that may stand beside a number and leave no doubt that it is meant. */
const FILLERS = new Set(
  'about approx approximately around ca circa roughly say est estimate estimated tbc or so only net max min up to'.split(
    ' ',
  ),
);
const IN_WORDS = [
  'zero',
  'one',
  'two',
  'three',
  'four',
  'five',
  'six',
  'seven',
  'eight',
  'nine',
  'ten',
  'eleven',
  'twelve',
];
/** Letters that are taken for digits: O for 0, l and I for 1. */
const LOOKALIKE = /^(?=.*\d)(?=.*[OolI])[\dOolI.,]+$/;
const DATE = /\d{4}-\d\d?-\d\d?|\d\d?[./-]\d\d?[./-]\d{2}/;
const TOKENS = /[\d.,]*\d[\d.,]*|\p{L}+|[^\s\p{L}\d]/gu;
const MARKS = /^[~?*!()'"\u2248<>=\u2264\u2265.:,/\u2013-]$/;
const READINGS_MAX = 4;

/** Working days of each way in which a text that is no duration could be meant as one. */
export function numbersWithin(text: string, context: DurationContext): number[] {
  if (DATE.test(text) || /^[-\u2212\u2013]/.test(text)) return [];
  const lookalike = LOOKALIKE.test(text) ? text.replace(/[Oo]/g, '0').replace(/[lI]/g, '1') : text;
  const values: number[] = [];
  let units: readonly WrittenUnit[] | null = null;
  for (const token of fold(lookalike).match(TOKENS) ?? []) {
    const number = numberOf(token, context);
    if (number) values.push(...number);
    else if (/^\p{L}/u.test(token)) {
      const named = readUnit(token) ?? misspelt(token);
      if (named && units && units !== named) return [];
      if (!named && !FILLERS.has(token)) return [];
      units = named ?? units;
    } else if (!MARKS.test(token)) return [];
  }
  const meant = units ?? context.header ?? [{ unit: context.unit, times: 1 }];
  const days = values.flatMap((value) =>
    meant.map(({ unit, times }) => value * times * daysIn(unit, context.options)),
  );
  return [...new Set(days)].slice(0, READINGS_MAX);
}

function numberOf(token: string, { mark }: DurationContext): readonly number[] | null {
  const word = IN_WORDS.indexOf(token);
  if (word >= 0) return [word];
  const reading = /\d/.test(token) ? readNumber(token.replace(/[.,]+$/, '')) : null;
  return reading && valuesOf(reading, mark);
}

/** A word that begins like a unit and goes on otherwise: `dayz`, `hourss`. */
function misspelt(word: string): readonly WrittenUnit[] | null {
  return /^(day|hou|wee)/.test(word) ? readUnit(word.charAt(0)) : null;
}
