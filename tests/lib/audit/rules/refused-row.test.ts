import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, sentence } from '../helpers';

describe('refused-row', () => {
  it('finds each row that was left out, with the reason', () => {
    const refused = [
      { sheet: 'Activities', row: 9, reason: 'Its cells hold dates where the durations should be.' },
    ];
    const [finding, ...more] = found('refused-row', { ...list('A 1', 'B 1 <- A'), refused });
    expect(more).toEqual([]);
    expect(finding).toMatchObject({
      weight: 'distorts',
      sheet: 'Activities',
      row: 9,
      cell: null,
      activityId: null,
    });
    expect(sentence(finding!)).toBe(
      'Row 9 of sheet “Activities” is left out. Its cells hold dates where the durations should be.',
    );
  });

  it('finds none where every row was read', () => {
    expect(found('refused-row', list('A 1'))).toEqual([]);
  });
});
