import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dayNumber, isoDate, weekday } from '@/lib/schedule/day-number';

describe('day numbers', () => {
  it('count from 1 January 1970, a Thursday', () => {
    expect(dayNumber('1970-01-01')).toBe(0);
    expect(weekday(0)).toBe(4);
    expect(dayNumber('1969-12-31')).toBe(-1);
    expect(weekday(-1)).toBe(3);
    expect(dayNumber('2000-03-01')).toBe(11_017);
    expect(isoDate(0)).toBe('1970-01-01');
  });

  it('agree with the engine’s own calendar in universal time', () => {
    fc.assert(
      fc.property(fc.integer({ min: -700_000, max: 2_900_000 }), (number) => {
        const date = new Date(number * 86_400_000);
        expect(isoDate(number)).toBe(date.toISOString().slice(0, 10));
        expect(dayNumber(isoDate(number))).toBe(number);
        expect(weekday(number)).toBe(date.getUTCDay() === 0 ? 7 : date.getUTCDay());
      }),
    );
  });

  it.each(['2027-02-29', '2027-13-01', '2027-00-10', '2027-04-31', '27-04-01', '2027-4-1', '', '0000-12-31'])(
    'refuses %j',
    (text) => {
      expect(() => dayNumber(text)).toThrow(RangeError);
    },
  );

  it('stops at the first and last date the form can write', () => {
    expect(isoDate(Infinity)).toBe('9999-12-31');
    expect(isoDate(-1e12)).toBe('0001-01-01');
    expect(() => isoDate(Number.NaN)).toThrow(RangeError);
  });
});
