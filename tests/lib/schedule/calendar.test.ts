import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  dateOfFinish,
  dateOfStart,
  datesOf,
  DEFAULT_CALENDAR,
  type WorkCalendar,
  workingDaysThrough,
} from '@/lib/schedule/calendar';

const MONDAY = '2027-03-01';

describe('Monday to Friday', () => {
  it.each([
    ['2027-02-26', 0],
    ['2027-03-01', 1],
    ['2027-03-05', 5],
    ['2027-03-06', 5],
    ['2027-03-07', 5],
    ['2027-03-08', 6],
    ['2028-02-29', 262],
  ])('counts the working days through %s', (date, days) => {
    expect(workingDaysThrough(DEFAULT_CALENDAR, MONDAY, date)).toBe(days);
  });

  it.each([
    [0, '2027-03-01', '2027-03-01'],
    [0.5, '2027-03-01', '2027-03-01'],
    [1, '2027-03-02', '2027-03-01'],
    [4.999, '2027-03-05', '2027-03-05'],
    [5, '2027-03-08', '2027-03-05'],
    [5.25, '2027-03-08', '2027-03-08'],
  ])('gives time %d the day it begins and the day it ends', (t, begins, ends) => {
    expect(dateOfStart(DEFAULT_CALENDAR, MONDAY, t)).toBe(begins);
    expect(dateOfFinish(DEFAULT_CALENDAR, MONDAY, t)).toBe(ends);
  });

  it('does not take the noise of a sum for a further day', () => {
    expect(dateOfFinish(DEFAULT_CALENDAR, MONDAY, 5 + 1e-9)).toBe('2027-03-05');
    expect(dateOfStart(DEFAULT_CALENDAR, MONDAY, 5 - 1e-9)).toBe('2027-03-08');
    expect(dateOfFinish(DEFAULT_CALENDAR, MONDAY, -1e-9)).toBe(MONDAY);
  });

  it('begins on the first working day after a start on a Saturday', () => {
    expect(dateOfStart(DEFAULT_CALENDAR, '2027-02-27', 0)).toBe(MONDAY);
    expect(workingDaysThrough(DEFAULT_CALENDAR, '2027-02-27', '2027-02-28')).toBe(0);
    expect(workingDaysThrough(DEFAULT_CALENDAR, '2027-02-27', MONDAY)).toBe(1);
  });

  it('counts back from time 0 as well', () => {
    expect(dateOfStart(DEFAULT_CALENDAR, MONDAY, -1)).toBe('2027-02-26');
    expect(dateOfFinish(DEFAULT_CALENDAR, MONDAY, -0.5)).toBe('2027-02-26');
    expect(dateOfFinish(DEFAULT_CALENDAR, MONDAY, -5)).toBe('2027-02-19');
  });
});

describe('a calendar of its own', () => {
  const easter: WorkCalendar = {
    workingDays: [1, 2, 3, 4, 5],
    holidays: ['2027-03-29', '2027-03-26', '2027-03-28', '2027-03-26'],
  };

  it('leaves out holidays, once each, and those that are free anyway not at all', () => {
    expect(workingDaysThrough(easter, '2027-03-25', '2027-03-30')).toBe(2);
    expect(dateOfStart(easter, '2027-03-25', 1)).toBe('2027-03-30');
    expect(dateOfFinish(easter, '2027-03-26', 1)).toBe('2027-03-30');
  });

  it('takes any week', () => {
    const sundayToThursday: WorkCalendar = { workingDays: [7, 1, 2, 3, 4], holidays: [] };
    expect(dateOfFinish(sundayToThursday, '2027-03-04', 2)).toBe('2027-03-07');
    expect(dateOfStart({ workingDays: [3], holidays: [] }, MONDAY, 1)).toBe('2027-03-10');
  });

  it('refuses a week without a working day, and dates that are none', () => {
    expect(() => dateOfStart({ workingDays: [], holidays: [] }, MONDAY, 0)).toThrow(RangeError);
    expect(() => dateOfStart({ workingDays: [1], holidays: ['29.03.2027'] }, MONDAY, 0)).toThrow(RangeError);
    expect(() => workingDaysThrough(DEFAULT_CALENDAR, MONDAY, 'soon')).toThrow(RangeError);
  });
});

describe('the dates of an activity', () => {
  it('run from the day it starts to the day it ends', () => {
    expect(datesOf(DEFAULT_CALENDAR, MONDAY, 5, 7)).toEqual({ start: '2027-03-08', finish: '2027-03-09' });
    expect(datesOf(DEFAULT_CALENDAR, MONDAY, 0.5, 1)).toEqual({ start: MONDAY, finish: MONDAY });
  });

  it('are one and the same for a milestone', () => {
    expect(datesOf(DEFAULT_CALENDAR, MONDAY, 5, 5)).toEqual({ start: '2027-03-05', finish: '2027-03-05' });
    expect(datesOf(DEFAULT_CALENDAR, MONDAY, 0, 0)).toEqual({ start: MONDAY, finish: MONDAY });
  });
});

describe('against a walk from day to day', () => {
  const day = fc.integer({ min: 20_000, max: 20_400 });
  const calendar = fc.record({
    workingDays: fc.uniqueArray(fc.integer({ min: 1, max: 7 }), { minLength: 1 }),
    holidays: fc.array(day, { maxLength: 60 }).map((days) => days.map(iso)),
  });

  it('finds the same dates and counts', () => {
    fc.assert(
      fc.property(calendar, day, day, fc.integer({ min: 0, max: 300 }), (own, start, other, t) => {
        const working = walk(own, start, 4000);
        expect(dateOfStart(own, iso(start), t)).toBe(working[t]);
        expect(dateOfStart(own, iso(start), t + 0.4)).toBe(working[t]);
        expect(dateOfFinish(own, iso(start), t + 1)).toBe(working[t]);
        expect(dateOfFinish(own, iso(start), t + 0.6)).toBe(working[t]);
        const through = working.filter((date) => date <= iso(other)).length;
        expect(workingDaysThrough(own, iso(start), iso(other))).toBe(through);
      }),
    );
  });

  function iso(number: number): string {
    return new Date(number * 86_400_000).toISOString().slice(0, 10);
  }

  function walk(own: WorkCalendar, start: number, days: number): string[] {
    const working: string[] = [];
    for (let number = start; number < start + days; number++) {
      const weekday = new Date(number * 86_400_000).getUTCDay() || 7;
      if (own.workingDays.includes(weekday) && !own.holidays.includes(iso(number))) working.push(iso(number));
    }
    return working;
  }
});
