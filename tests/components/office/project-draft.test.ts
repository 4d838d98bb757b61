import { describe, expect, it } from 'vitest';
import { EMPTY_DRAFT, holidayError, toInput, unitOf } from '@/components/office/project-draft';

describe('toInput', () => {
  it('gives what the server takes', () => {
    const input = toInput({
      ...EMPTY_DRAFT,
      contractor: 'c',
      code: ' A-1 ',
      name: ' Pier ',
      start: '2027-01-04',
      unit: 'week',
      hoursPerDay: '7,5',
      workingDays: [3, 1, 2],
      holidays: '2027-12-24\n2027-05-01, 2027-12-24',
    });
    expect(input).toEqual({
      contractor: 'c',
      code: 'A-1',
      name: 'Pier',
      start: '2027-01-04',
      targetFinish: null,
      unit: 'week',
      hoursPerDay: 7.5,
      calendar: { workingDays: [1, 2, 3], holidays: ['2027-05-01', '2027-12-24'] },
    });
  });

  it('knows no unit beyond the three', () => {
    expect(unitOf('')).toBeNull();
    expect(unitOf('month')).toBeNull();
  });
});

describe('holidayError', () => {
  it('names the date the server could not read', () => {
    const draft = { ...EMPTY_DRAFT, holidays: '2027-12-24\n24.12.2027' };
    expect(holidayError({ 'calendar.holidays.1': 'x' }, draft)).toBe(
      '“24.12.2027” is no date; write it as 2027-12-24.',
    );
    expect(holidayError({ start: 'x' }, draft)).toBeUndefined();
  });
});
