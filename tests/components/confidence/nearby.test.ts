import { describe, expect, it } from 'vitest';
import { nearby } from '@/components/confidence/nearby';
import { DEFAULT_CALENDAR } from '@/lib/schedule/calendar';

describe('nearby', () => {
  it('steps by working weeks around the day and leaves out what lies before the start', () => {
    const rows = nearby({ mean: 10, deviation: 2, days: 10 }, DEFAULT_CALENDAR, '2027-01-04');
    expect(rows.map((row) => row.days)).toEqual([0, 5, 10, 15, 20, 25, 30]);
    expect(rows[2]).toMatchObject({ date: '2027-01-15', before: 0.5 });
  });
});
