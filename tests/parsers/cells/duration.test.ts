import { describe, expect, it } from 'vitest';
import { ErrorValue } from '@/lib/schedule/sheet';
import { DEFAULT_READING } from '@/lib/schedule/activity-list';
import { type DurationContext, readDuration } from '@/parsers/cells/duration';
import { readUnit } from '@/parsers/cells/unit';

const context = (given: Partial<DurationContext> = {}): DurationContext => ({
  mark: null,
  header: null,
  unit: 'day',
  options: DEFAULT_READING,
  ...given,
});
const read = (
  value: string | number | boolean | ErrorValue | null,
  format = 'General',
  given: Partial<DurationContext> = {},
) => readDuration({ value, format, date1904: false, formula: null }, context(given));

describe('durations', () => {
  it.each([
    ['5', 5, null],
    ['5d', 5, 'day'],
    ['5 days', 5, 'day'],
    ['5 wd', 5, 'day'],
    ['5 working days', 5, 'day'],
    ['16 hrs', 2, 'hour'],
    ['16h', 2, 'hour'],
    ['90 mins', 0.1875, 'hour'],
    ['2 wks', 10, 'week'],
    ['1.5 w', 7.5, 'week'],
    ['1 1/2 weeks', 7.5, 'week'],
    ['2w 3d', 13, 'week'],
    ['1 d, 4 h', 1.5, 'day'],
    ['3 Arbeitstage', 3, 'day'],
    ['2 semaines', 10, 'week'],
    ['-4 d', -4, 'day'],
    ['\u22124', -4, null],
    ['5\u00a0d.', 5, 'day'],
    ['1,5 d', 1.5, 'day'],
  ])('%s', (text, days, unit) =>
    expect(read(text)).toMatchObject({ days, unit, problem: null, text: text.replace('\u00a0', ' ') }),
  );

  it('take the unit of the cell, else its format, else the header, else the project', () => {
    const header = readUnit('hours');
    expect(read('2 w', '0" d"', { header })).toMatchObject({ days: 10, unit: 'week' });
    expect(read(2, '0" d"', { header })).toMatchObject({ days: 2, unit: 'day', text: '2 d' });
    expect(read(16, '0.0', { header })).toMatchObject({ days: 2, unit: 'hour', text: '16.0' });
    expect(read('16', 'General', { header })).toMatchObject({ days: 2, unit: 'hour' });
    expect(read(2, 'General', { unit: 'week' })).toMatchObject({ days: 10, unit: null });
    expect(read(1 / 3, '[h]:mm')).toMatchObject({ days: 1, unit: 'hour', text: '8 h' });
    expect(
      read(3, 'General', { unit: 'hour', options: { unit: 'hour', hoursPerDay: 10, daysPerWeek: 6 } }).days,
    ).toBeCloseTo(0.3, 12);
  });

  it('are empty where nothing or a dash stands', () => {
    for (const value of [null, '', ' \u00a0', '-', '\u2013'])
      expect(read(value)).toMatchObject({ days: null, problem: 'empty' });
  });

  it('are ambiguous where the column does not settle the decimal mark', () => {
    expect(read('1,234')).toMatchObject({ days: null, problem: 'ambiguous', readings: [1.234, 1234] });
    expect(read('1.234 h')).toMatchObject({
      problem: 'ambiguous',
      unit: 'hour',
      readings: [1.234 / 8, 154.25],
    });
    expect(read('1,234', 'General', { mark: '.' })).toMatchObject({ days: 1234, problem: null });
  });

  it.each([
    ['~5', [5]],
    ['ca. 5 d', [5]],
    ['5?', [5]],
    ['5-7', [5, 7]],
    ['3O', [30]],
    ['l0', [10]],
    ['5 dayz', [5]],
    ['five', [5]],
    ['two weeks', [10]],
    ['TBD', []],
    ['n/a', []],
    ['see row 12', []],
    ['2027-03-01', []],
    ['10 %', []],
    ['2 mo', [40, 2 * (52 / 12) * 5]],
    ['7 calendar days', [7, 5]],
  ])('cannot be read: %s', (text, readings) => {
    expect(read(text)).toMatchObject({ days: null, problem: 'unreadable', text });
    expect(read(text).readings).toEqual(readings);
  });

  it('are not made of dates, shares, truth values, errors or formulas without a result', () => {
    expect(read(45292, 'yyyy-mm-dd')).toMatchObject({
      problem: 'unreadable',
      text: '2024-01-01',
      readings: [],
    });
    expect(read(5, 'd-mmm')).toMatchObject({ problem: 'unreadable', readings: [5] });
    expect(read(0.5, '0%')).toMatchObject({ problem: 'unreadable', text: '50%' });
    expect(read(true)).toMatchObject({ problem: 'unreadable', text: 'TRUE' });
    expect(read(new ErrorValue('#REF!'))).toMatchObject({ problem: 'error', text: '#REF!' });
    expect(
      readDuration({ value: null, format: 'General', date1904: false, formula: 'NOW()' }, context()),
    ).toMatchObject({
      problem: 'unreadable',
      text: '=NOW()',
    });
  });
});
