import { serialToIso } from './serial-date';

/** What a number format makes of a number. */
export type FormatKind = 'general' | 'number' | 'percent' | 'date' | 'time' | 'elapsed' | 'text';

interface Format {
  readonly kind: FormatKind;
  /** Literal text before and after the digits. */
  readonly before: string;
  readonly after: string;
  /** Least digits before the point, and digits after it: at least and at most. */
  readonly whole: number;
  readonly decimals: readonly [number, number];
  readonly grouped: boolean;
  /** Digits as they come, with literal text around them. */
  readonly plain: boolean;
}

const LITERAL = /"([^"]*)"|\\(.)|_.|\*.|\[\$([^\]-]*)[^\]]*\]/g;
const known = new Map<string, Format>();

/** What kind of value a format code shows. */
export function formatKind(code: string): FormatKind {
  return formatOf(code).kind;
}

/** The literal text a format puts around the digits: the code `0.0" d"` gives ` d`. */
export function formatLiteral(code: string): string {
  const { before, after } = formatOf(code);
  return `${before} ${after}`;
}

/**
 * The number as the sheet shows it under its format, as far as that bears on what it names: digits, fixed
 * decimals, leading zeros, literal text. A date is given as YYYY-MM-DD.
 */
export function asShown(value: number, code: string, date1904: boolean): string {
  const format = formatOf(code);
  if (format.kind === 'date') return serialToIso(value, date1904) ?? plain(value);
  if (format.kind === 'percent') return `${plain(value * 100)}%`;
  if (format.kind !== 'number') return plain(value);
  return `${format.before}${value < 0 ? '-' : ''}${digitsOf(Math.abs(value), format)}${format.after}`.trim();
}

function digitsOf(
  value: number,
  { whole, decimals: [least, most], grouped, plain: asItComes }: Format,
): string {
  if (asItComes || value >= 1e21) return plain(value);
  const [digits = '', fraction = ''] = value.toFixed(Math.min(most, 20)).split('.');
  const padded = digits.padStart(whole, '0');
  const kept = fraction.slice(0, least) + fraction.slice(least).replace(/0+$/, '');
  return (grouped ? padded.replace(/\B(?=(\d{3})+$)/g, ',') : padded) + (kept === '' ? '' : `.${kept}`);
}

/** A number without a format: fifteen digits, as a spreadsheet keeps them. */
function plain(value: number): string {
  return Number.isSafeInteger(value) ? String(value) : String(Number(value.toPrecision(15)));
}

function formatOf(code: string): Format {
  const found = known.get(code);
  if (found) return found;
  const format = parseFormat(code);
  if (known.size > 5000) known.clear();
  known.set(code, format);
  return format;
}

function parseFormat(code: string): Format {
  const literals: string[] = [];
  const section = firstSection(code);
  // Each literal becomes a mark that stands for it, so that what is left are the format's own signs.
  const signs = section
    .replace(LITERAL, (_, quoted?: string, escaped?: string, currency?: string) => {
      literals.push(quoted ?? escaped ?? currency ?? ' ');
      return '\u0001';
    })
    .replace(/\[(?!h+\]|m+\]|s+\])[^\]]*\]/gi, '');
  const spell = (part: string) => part.replace(/\u0001/g, () => literals.shift() ?? '');
  const digits = /general|[#0?](?:[#0?,]*[#0?])?(?:\.[#0?]*)?/i.exec(signs);
  const pattern = digits?.[0] ?? '';
  const at = digits?.index ?? signs.length;
  const before = spell(signs.slice(0, at));
  const after = spell(signs.slice(at + pattern.length));
  const [whole = '', decimal = ''] = pattern.split('.');
  return {
    kind: kindOf(signs, pattern, before + after),
    before,
    after,
    whole: whole.replace(/[^0]/g, '').length,
    decimals: [decimal.replace(/[^0]/g, '').length, decimal.length],
    grouped: whole.includes(','),
    plain: /general/i.test(pattern),
  };
}

function kindOf(signs: string, pattern: string, around: string): FormatKind {
  const bare = signs.replace(/\u0001/g, '').replace(/am\/pm|a\/p/gi, '');
  if (/general/i.test(pattern)) return around.trim() === '' ? 'general' : 'number';
  if (/\[[hms]+\]/i.test(bare)) return 'elapsed';
  if (/[yd]/i.test(bare)) return 'date';
  if (/[hs]/i.test(bare)) return 'time';
  if (/m/i.test(bare)) return 'date';
  if (bare.includes('%')) return 'percent';
  if (bare.includes('@')) return 'text';
  // Fractions, powers of ten and digits with text between them are shown as plain numbers.
  return pattern === '' || /e[+-]|\/|[#0?]/i.test(bare.replace(pattern, '')) ? 'general' : 'number';
}

/** The section for positive numbers. */
function firstSection(code: string): string {
  let quoted = false;
  for (let i = 0; i < code.length; i++) {
    if (code[i] === '\\' && !quoted) i++;
    else if (code[i] === '"') quoted = !quoted;
    else if (code[i] === ';' && !quoted) return code.slice(0, i);
  }
  return code;
}
