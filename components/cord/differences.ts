import type { Figures } from '@/lib/contract/submission';
import { formatDate, formatDayDifference, formatDays, formatNumber, formatSigned } from '@/lib/client/format';

/** The last line of each head figure: the difference with sign and unit, and what belongs beside it. */

export function finishLine(received: Figures, corrected: Figures, locale: string): string | null {
  return joined([
    difference(received.expectedDuration, corrected.expectedDuration, (days) =>
      formatDayDifference(days, locale),
    ),
    corrected.finish === null ? null : formatDate(corrected.finish, locale),
  ]);
}

export function varianceLine(received: Figures, corrected: Figures, locale: string): string | null {
  return joined([
    difference(received.variance, corrected.variance, (value) => `${formatSigned(value, 2, locale)}\u00a0d²`),
    corrected.standardDeviation === null
      ? null
      : `deviation ${formatDays(corrected.standardDeviation, locale, 2)}`,
  ]);
}

export function chanceLine(received: Figures, corrected: Figures, locale: string): string | null {
  const points = difference(
    received.chanceOfTarget,
    corrected.chanceOfTarget,
    (value) => `${formatSigned(value * 100, 0, locale)} ${isOne(value * 100) ? 'point' : 'points'}`,
  );
  return corrected.chanceOfTarget === null ? points : joined([points, 'one path, normal']);
}

/** Null where one of the two states has no figure, or both have the same. */
function difference(
  received: number | null,
  corrected: number | null,
  write: (value: number) => string,
): string | null {
  if (received === null || corrected === null || received === corrected) return null;
  return write(corrected - received);
}

function joined(parts: readonly (string | null)[]): string | null {
  const present = parts.filter((part) => part !== null);
  return present.length > 0 ? present.join(' · ') : null;
}

function isOne(value: number): boolean {
  return formatNumber(Math.abs(value), 0) === '1';
}
