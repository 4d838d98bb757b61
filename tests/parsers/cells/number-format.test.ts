import { describe, expect, it } from 'vitest';
import { asShown, formatKind, formatLiteral } from '@/parsers/cells/number-format';
import { serialToIso } from '@/parsers/cells/serial-date';

describe('a number as its format shows it', () => {
  it.each([
    [7, 'General', '7'],
    [0.1 + 0.2, 'General', '0.3'],
    [1.1, '0.00', '1.10'],
    [7, '000', '007'],
    [7, '"A-"000', 'A-007'],
    [5, '0" d"', '5 d'],
    [2.5, '0.0#" h"', '2.5 h'],
    [2.5, 'General" d"', '2.5 d'],
    [1234, '#,##0', '1,234'],
    [1234567.5, '#,##0.00', '1,234,567.50'],
    [-3, '0;(0)', '-3'],
    [0.5, '0%', '50%'],
    [45292, 'm/d/yyyy', '2024-01-01'],
    [3, '0\\d', '3d'],
    [3, '[Red]0_);(0)', '3'],
    [1e22, '0', '1e+22'],
  ])('%d under %s is %s', (value, code, expected) => expect(asShown(value, code, false)).toBe(expected));

  it.each([
    ['General', 'general'],
    ['0.00', 'number'],
    ['0.00E+00', 'general'],
    ['yyyy-mm-dd', 'date'],
    ['[$-409]d-mmm-yy;@', 'date'],
    ['mmm yy', 'date'],
    ['h:mm AM/PM', 'time'],
    ['[h]:mm', 'elapsed'],
    ['mm:ss', 'time'],
    ['0" days"', 'number'],
    ['0\\d', 'number'],
    ['0%', 'percent'],
    ['@', 'text'],
    ['# ?/?', 'general'],
  ])('%s shows a %s', (code, kind) => expect(formatKind(code)).toBe(kind));

  it('tells the text around the digits', () => {
    expect(formatLiteral('0.0" days"').trim()).toBe('days');
    expect(formatLiteral('#,##0\\ \\h').trim()).toBe('h');
  });
});

describe('serial dates', () => {
  it('count from 1900 or 1904', () => {
    // Microsoft support article 214330: 1 January 2024 is 45292 in the one system and 43830 in the other (from memory).
    expect(serialToIso(45292, false)).toBe('2024-01-01');
    expect(serialToIso(43830, true)).toBe('2024-01-01');
    expect(serialToIso(1, false)).toBe('1900-01-01');
    expect(serialToIso(59, false)).toBe('1900-02-28');
    expect(serialToIso(60, false)).toBeNull();
    expect(serialToIso(61, false)).toBe('1900-03-01');
    expect(serialToIso(-1, false)).toBeNull();
    expect(serialToIso(1e9, false)).toBeNull();
  });
});
