/**
 * How figures and dates are written. Nothing is rounded before it gets here. A locale is a BCP 47 tag, the
 * office's own.
 */
const MINUS = '−';
/** Keeps a number and its unit on one line. */
const NBSP = '\u00a0';
export const DEFAULT_LOCALE = 'en-GB';

/** A calendar date YYYY-MM-DD, never ambiguous: 12 Mar 2027. */
export function formatDate(isoDate: string, locale: string = DEFAULT_LOCALE): string {
  const date = new Date(`${isoDate.slice(0, 10)}T00:00:00Z`);
  if (Number.isNaN(date.getTime())) return isoDate;
  return dateFormat(locale, { day: 'numeric', month: 'short', year: 'numeric', timeZone: 'UTC' }).format(
    date,
  );
}

/** An instant in the reader's own time zone: 12 Mar 2027, 10:12. */
export function formatInstant(iso: string, locale: string = DEFAULT_LOCALE): string {
  const date = new Date(iso);
  if (Number.isNaN(date.getTime())) return iso;
  const options = {
    day: 'numeric',
    month: 'short',
    year: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
  } as const;
  return dateFormat(locale, options).format(date);
}

/** A plain number with so many decimals and a true minus sign: −1.90. */
export function formatNumber(value: number, decimals: number, locale: string = DEFAULT_LOCALE): string {
  const text = numberFormat(locale, decimals).format(Math.abs(value));
  // What rounds to nothing has no sign: "−0.0" would read as a loss.
  const negative = value < 0 && Number(Math.abs(value).toFixed(decimals)) !== 0;
  return negative ? MINUS + text : text;
}

/** A count: 12 400. */
export function formatCount(value: number, locale: string = DEFAULT_LOCALE): string {
  return formatNumber(value, 0, locale);
}

/** A duration in working days: 118.0 d. */
export function formatDays(days: number, locale: string = DEFAULT_LOCALE, decimals = 1): string {
  return `${formatNumber(days, decimals, locale)}${NBSP}d`;
}

/** A variance in working days squared: 24.83 d². */
export function formatVariance(variance: number, locale: string = DEFAULT_LOCALE): string {
  return `${formatNumber(variance, 2, locale)}${NBSP}d²`;
}

/** A difference with its sign: +5.6, −1.9, 0.0. */
export function formatSigned(value: number, decimals: number, locale: string = DEFAULT_LOCALE): string {
  const text = formatNumber(value, decimals, locale);
  const positive = value > 0 && Number(value.toFixed(decimals)) !== 0;
  return positive ? `+${text}` : text;
}

/** A difference of durations: +5.6 d. */
export function formatDayDifference(days: number, locale: string = DEFAULT_LOCALE): string {
  return `${formatSigned(days, 1, locale)}${NBSP}d`;
}

/** A probability as a whole per cent; only what is certain is written 0 % or 100 %. */
export function formatPercent(probability: number, locale: string = DEFAULT_LOCALE): string {
  const percent = probability * 100;
  if (percent > 0 && percent < 1) return `under${NBSP}1${NBSP}%`;
  if (percent < 100 && percent > 99) return `over${NBSP}99${NBSP}%`;
  return `${formatNumber(percent, 0, locale)}${NBSP}%`;
}

/** The size of a file: 640 B, 84 kB, 3.2 MB (decimal units). */
export function formatBytes(bytes: number, locale: string = DEFAULT_LOCALE): string {
  if (bytes < 1000) return `${formatNumber(bytes, 0, locale)}${NBSP}B`;
  if (bytes < 999_500) return `${formatNumber(bytes / 1000, 0, locale)}${NBSP}kB`;
  return `${formatNumber(bytes / 1_000_000, 1, locale)}${NBSP}MB`;
}

/** `1 finding`, `3 findings`. */
export function plural(count: number, one: string, many: string, locale: string = DEFAULT_LOCALE): string {
  return `${formatCount(count, locale)} ${count === 1 ? one : many}`;
}

const dates = new Map<string, Intl.DateTimeFormat>();
const numbers = new Map<string, Intl.NumberFormat>();

// Making a formatter costs far more than using one, and a table uses thousands.
function dateFormat(locale: string, options: Intl.DateTimeFormatOptions): Intl.DateTimeFormat {
  const key = locale + JSON.stringify(options);
  const known = dates.get(key);
  if (known) return known;
  const made = new Intl.DateTimeFormat(locale, options);
  dates.set(key, made);
  return made;
}

function numberFormat(locale: string, decimals: number): Intl.NumberFormat {
  const key = `${locale}/${String(decimals)}`;
  const known = numbers.get(key);
  if (known) return known;
  const made = new Intl.NumberFormat(locale, {
    minimumFractionDigits: decimals,
    maximumFractionDigits: decimals,
  });
  numbers.set(key, made);
  return made;
}
