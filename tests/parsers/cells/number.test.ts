import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readNumber, settleMark, valuesOf } from '@/parsers/cells/number';

const value = (text: string) => {
  const reading = readNumber(text);
  if (reading === null) return null;
  return reading.kind === 'number' ? reading.value : [reading.ifDecimal, reading.ifGrouped];
};

describe('numbers written as text', () => {
  it.each([
    ['12', 12],
    ['+12', 12],
    ['-12', -12],
    ['\u221212', -12],
    ['- 3', -3],
    ['1.5', 1.5],
    ['1,5', 1.5],
    ['.5', 0.5],
    ['5.', 5],
    ['0,125', 0.125],
    ['0.125', 0.125],
    ['1234,567', 1234.567],
    ['1,234.5', 1234.5],
    ['1.234,5', 1234.5],
    ['1 234,5', 1234.5],
    ['1 234', 1234],
    ["1'234.5", 1234.5],
    ['1,234,567', 1234567],
    ['1.234.567', 1234567],
    ['1,234,567.25', 1234567.25],
    ['1e3', 1000],
    ['2.5E-1', 0.25],
    ['1/2', 0.5],
    ['1 1/2', 1.5],
    ['\u00bd', 0.5],
    ['1\u00bd', 1.5],
    ['1,234', [1.234, 1234]],
    ['-1.234', [-1.234, -1234]],
  ])('%s', (text, expected) => expect(value(text)).toEqual(expected));

  it.each([
    '',
    '-',
    'x',
    '1,2,3',
    '1,23,456',
    '1.2.3',
    '5,',
    '1,',
    '1/0',
    '1 23',
    '12 345 6',
    '5 d',
    '1,234,56',
    '1e999',
    '--1',
  ])('is none: %s', (text) => expect(value(text)).toBeNull());
});

describe('the decimal mark of a column', () => {
  const settle = (...texts: string[]) => settleMark(texts.map(readNumber));

  it('is settled by any number that shows it, and not by one that could be either', () => {
    expect(settle('1,234', '5', '2,5')).toBe(',');
    expect(settle('1,234', '2.5')).toBe('.');
    expect(settle('1,234.5')).toBe('.');
    expect(settle('1.234.567')).toBe(',');
    expect(settle('1,234', '12')).toBeNull();
    expect(settle('1,5', '2.5', '1,234')).toBeNull();
  });

  it('tells what a number is that could be either', () => {
    const reading = readNumber('1,234');
    if (!reading) throw new Error('a number expected');
    expect(valuesOf(reading, ',')).toEqual([1.234]);
    expect(valuesOf(reading, '.')).toEqual([1234]);
    expect(valuesOf(reading, null)).toEqual([1.234, 1234]);
  });
});

it('reads back whatever is written in any style', () => {
  const style = fc.constantFrom<[string, string]>(
    ['.', ','],
    [',', '.'],
    [',', ' '],
    ['.', "'"],
    ['.', ''],
    [',', ''],
  );
  fc.assert(
    fc.property(
      fc.integer({ min: -9_999_999, max: 9_999_999 }),
      fc.integer({ min: 0, max: 4 }),
      style,
      (digits, places, [mark, group]) => {
        const expected = digits / 10 ** places;
        const [whole = '', decimals] = Math.abs(expected).toFixed(places).split('.');
        const grouped = group === '' ? whole : whole.replace(/\B(?=(\d{3})+$)/g, group);
        const text = (expected < 0 ? '-' : '') + grouped + (decimals ? mark + decimals : '');
        const reading = readNumber(text);
        expect(reading && valuesOf(reading, mark === ',' ? ',' : '.')).toEqual([expected]);
      },
    ),
    { numRuns: 1000 },
  );
});
