import { describe, expect, it } from 'vitest';
import {
  formatBytes,
  formatDate,
  formatDayDifference,
  formatDays,
  formatNumber,
  formatPercent,
  formatSigned,
  formatVariance,
  plural,
} from '@/lib/client/format';

/** Blanks that keep a number and its unit together, written as plain ones here. */
const plain = (text: string) => text.replace(/[\u00a0\u202f]/g, ' ');

describe('formatDate', () => {
  it('writes the month as a word, so that no day can be taken for a month', () => {
    expect(formatDate('2027-03-12', 'en-GB')).toBe('12 Mar 2027');
    expect(formatDate('2027-03-04', 'en-US')).toBe('Mar 4, 2027');
  });

  it('does not shift with the time zone', () => {
    expect(formatDate('2027-01-01')).toBe('1 Jan 2027');
    expect(formatDate('2027-12-31')).toBe('31 Dec 2027');
  });

  it('gives back what is no date', () => {
    expect(formatDate('soon')).toBe('soon');
  });
});

describe('formatNumber', () => {
  it('uses a true minus, and none for what rounds to nothing', () => {
    expect(formatNumber(-1.94, 1)).toBe('−1.9');
    expect(formatNumber(-0.04, 1)).toBe('0.0');
    expect(formatNumber(-0, 2)).toBe('0.00');
  });

  it('follows the locale', () => {
    expect(formatNumber(1234.5, 1, 'de-DE')).toBe('1.234,5');
  });
});

describe('durations, variances and differences', () => {
  it('carry their unit', () => {
    expect(plain(formatDays(118))).toBe('118.0 d');
    expect(plain(formatVariance(24.834))).toBe('24.83 d²');
    expect(plain(formatDayDifference(5.6))).toBe('+5.6 d');
    expect(plain(formatDayDifference(-1.9))).toBe('−1.9 d');
  });

  it('a difference that rounds to nothing has no sign', () => {
    expect(formatSigned(0.04, 1)).toBe('0.0');
    expect(formatSigned(-0.04, 1)).toBe('0.0');
    expect(formatSigned(0.06, 1)).toBe('+0.1');
  });
});

describe('formatPercent', () => {
  it('is a whole per cent', () => {
    expect(plain(formatPercent(0.3821))).toBe('38 %');
  });

  it('writes 0 and 100 only for what is certain', () => {
    expect(plain(formatPercent(0))).toBe('0 %');
    expect(plain(formatPercent(0.0004))).toBe('under 1 %');
    expect(plain(formatPercent(0.9996))).toBe('over 99 %');
    expect(plain(formatPercent(1))).toBe('100 %');
  });
});

describe('sizes and counts', () => {
  it('steps from bytes to megabytes', () => {
    expect(plain(formatBytes(999))).toBe('999 B');
    expect(plain(formatBytes(1000))).toBe('1 kB');
    expect(plain(formatBytes(999_499))).toBe('999 kB');
    expect(plain(formatBytes(999_500))).toBe('1.0 MB');
    expect(plain(formatBytes(20_000_000))).toBe('20.0 MB');
  });

  it('chooses the word by the count', () => {
    expect(plural(1, 'row', 'rows')).toBe('1 row');
    expect(plural(0, 'row', 'rows')).toBe('0 rows');
  });
});
