/** An ID as a member of a numbered series: prefix, number, suffix (`T-009` → T-, 9, ''; `C` → the third letter). */
export interface Member {
  /** Same for all IDs of a series. */
  readonly series: string;
  readonly number: number;
  /** Digits written at least, where shorter numbers are filled up with zeros; 0 where they are not. */
  readonly width: number;
  readonly write: (number: number, width: number) => string;
}

const NUMBERED = /^(.*?)(\d{1,15})(\D*)$/s;
const LETTERS = /^(?:[A-Z]{1,2}|[a-z]{1,2})$/;

/** 1 → A, 26 → Z, 27 → AA. */
function lettersOf(number: number): string {
  let letters = '';
  for (let n = number; n > 0; n = Math.floor((n - 1) / 26)) {
    letters = String.fromCharCode(65 + ((n - 1) % 26)) + letters;
  }
  return letters;
}

const numberOf = (letters: string) =>
  [...letters.toUpperCase()].reduce((number, letter) => number * 26 + (letter.charCodeAt(0) - 64), 0);

/** Null for an ID that is a word (`START`). */
export function memberOf(id: string): Member | null {
  const numbered = NUMBERED.exec(id);
  if (numbered) {
    const [, prefix = '', digits = '', suffix = ''] = numbered;
    return {
      series: `${prefix}\u0000${suffix}`,
      number: Number(digits),
      width: digits.startsWith('0') ? digits.length : 0,
      write: (number, width) => prefix + String(number).padStart(width, '0') + suffix,
    };
  }
  if (!LETTERS.test(id)) return null;
  const upper = id === id.toUpperCase();
  return {
    series: upper ? '\u0000A' : '\u0000a',
    number: numberOf(id),
    width: 0,
    write: (number) => (upper ? lettersOf(number) : lettersOf(number).toLowerCase()),
  };
}

/** A series as the list has it. */
export interface Series {
  /** The largest number in use. */
  last: number;
  readonly step: number;
  readonly width: number;
  readonly size: number;
  readonly write: Member['write'];
}

function greatestCommonDivisor(a: number, b: number): number {
  let [one, other] = [a, b];
  while (other !== 0) [one, other] = [other, one % other];
  return one;
}

/** The series among the IDs; the step is what all their distances are multiples of (10, 20, 40 → 10). */
export function seriesOf(ids: Iterable<string>): Map<string, Series> {
  const members = new Map<string, Member[]>();
  for (const id of ids) {
    const member = memberOf(id);
    if (!member) continue;
    const known = members.get(member.series);
    if (known) known.push(member);
    else members.set(member.series, [member]);
  }
  return new Map([...members].map(([name, all]) => [name, toSeries(all)]));
}

function toSeries(members: readonly Member[]): Series {
  const [first] = members;
  let [last, step, width] = [0, 0, 0];
  for (const member of members) {
    last = Math.max(last, member.number);
    width = Math.max(width, member.width);
    step = greatestCommonDivisor(step, Math.abs(member.number - (first?.number ?? 0)));
  }
  return { last, step: step || 1, width, size: members.length, write: first?.write ?? String };
}
