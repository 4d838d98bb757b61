/** The sign that stands before the decimals. */
export type DecimalMark = '.' | ',';

export type NumberReading =
  /** `mark`: the decimal mark it shows to be in use, null where it shows none. */
  | { readonly kind: 'number'; readonly value: number; readonly mark: DecimalMark | null }
  /** `1,234`: one number where the comma stands before decimals, another where it groups thousands. */
  | {
      readonly kind: 'ambiguous';
      readonly ifDecimal: number;
      readonly ifGrouped: number;
      readonly sign: DecimalMark;
    };

const SIGNED = /^([+\-\u2212\u2013]?)\s*(.+)$/;
const SPACED = /^\d{1,3}(?:[ '\u2019]\d{3})+(?:([.,])(\d+))?$/;
const BOTH = /^\d{1,3}(?:([.,])\d{3})(?:\1\d{3})*(?!\1)([.,])\d*$/;
const GROUPS = /^\d{1,3}(?:([.,])\d{3})(?:\1\d{3})+$/;
const ONE = /^(\d*)([.,])(\d*)$/;
const POWER = /^\d+(?:([.,])\d+)?[eE][+-]?\d{1,3}$/;
const FRACTION = /^(?:(\d+)\s+)?(\d+)\s*[/\u2044]\s*(\d+)$/;

/**
 * Reads a number written as text: decimal point or comma, thousands grouped by the other, a blank or an
 * apostrophe, powers of ten, fractions. Null where it is none.
 */
export function readNumber(text: string): NumberReading | null {
  const [, sign = '', body = ''] = SIGNED.exec(text) ?? [];
  const reading = readUnsigned(
    body.replace(/[\u00bc-\u00be\u2150-\u215e]/g, (one) => ` ${one.normalize('NFKD')}`).trim(),
  );
  if (!reading || sign === '' || sign === '+') return reading;
  return reading.kind === 'number'
    ? { ...reading, value: -reading.value }
    : { ...reading, ifDecimal: -reading.ifDecimal, ifGrouped: -reading.ifGrouped };
}

function readUnsigned(body: string): NumberReading | null {
  if (/^\d+$/.test(body)) return plain(body, null);
  const one = ONE.exec(body);
  if (one) return readOneMark(one[1] ?? '', one[2] === ',' ? ',' : '.', one[3] ?? '');
  const spaced = SPACED.exec(body);
  if (spaced) return plain(body.replace(/[ '\u2019]/g, '').replace(',', '.'), toMark(spaced[1]));
  const both = BOTH.exec(body);
  if (both?.[1] && both[2]) return plain(body.replaceAll(both[1], '').replace(both[2], '.'), toMark(both[2]));
  const groups = GROUPS.exec(body);
  if (groups?.[1]) return plain(body.replaceAll(groups[1], ''), groups[1] === ',' ? '.' : ',');
  const power = POWER.exec(body);
  if (power) return plain(body.replace(',', '.'), toMark(power[1]));
  const [, whole = '0', top, bottom] = FRACTION.exec(body) ?? [];
  if (top === undefined || Number(bottom) === 0) return null;
  return plain(String(Number(whole) + Number(top) / Number(bottom)), null);
}

function readOneMark(whole: string, mark: DecimalMark, decimals: string): NumberReading | null {
  if (decimals === '') return whole !== '' && mark === '.' ? plain(whole, null) : null;
  const ifDecimal = Number(`${whole}.${decimals}`);
  const isGroup = decimals.length === 3 && whole.length >= 1 && whole.length <= 3 && !whole.startsWith('0');
  if (!isGroup) return { kind: 'number', value: ifDecimal, mark };
  return { kind: 'ambiguous', ifDecimal, ifGrouped: Number(whole + decimals), sign: mark };
}

function plain(digits: string, mark: DecimalMark | null): NumberReading | null {
  const value = Number(digits);
  return Number.isFinite(value) ? { kind: 'number', value, mark } : null;
}

function toMark(sign: string | undefined): DecimalMark | null {
  return sign === '.' || sign === ',' ? sign : null;
}

/** The decimal mark that a column's numbers show to be in use; null where they show none, or both. */
export function settleMark(readings: Iterable<NumberReading | null>): DecimalMark | null {
  let settled: DecimalMark | null = null;
  for (const reading of readings) {
    if (reading?.kind !== 'number' || reading.mark === null) continue;
    if (settled !== null && settled !== reading.mark) return null;
    settled = reading.mark;
  }
  return settled;
}

/** The values a reading can have under the settled mark: one, or two where nothing settles it. */
export function valuesOf(reading: NumberReading, mark: DecimalMark | null): readonly number[] {
  if (reading.kind === 'number') return [reading.value];
  if (mark === null) return [reading.ifDecimal, reading.ifGrouped];
  return [reading.sign === mark ? reading.ifDecimal : reading.ifGrouped];
}
