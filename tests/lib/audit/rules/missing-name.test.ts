import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, sentence } from '../helpers';

describe('missing-name', () => {
  it('finds an activity without a name in a list that names them', () => {
    const [finding, ...more] = found('missing-name', list('A 1', 'B "" 1 <- A'));
    expect(more).toEqual([]);
    expect(finding).toMatchObject({ weight: 'query', activityId: 'B', cell: 'B3' });
    expect(sentence(finding!)).toBe('B has no name.');
  });

  it('says nothing where the list has no column for names', () => {
    const matching = [{ sheet: 'Activities', headerRow: 1, columns: { id: 0, duration: 2 } }];
    expect(found('missing-name', { ...list('A "" 1', 'B "" 1 <- A'), matching })).toEqual([]);
  });
});
