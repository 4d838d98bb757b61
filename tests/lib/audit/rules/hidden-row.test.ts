import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, sentence, withActivity } from '../helpers';

describe('hidden-row', () => {
  it('finds an activity whose row is hidden', () => {
    const received = withActivity(list('A 1 2 3', 'B 1 2 3 <- A'), 1, () => ({ hidden: true }));
    const [finding, ...more] = found('hidden-row', received);
    expect(more).toEqual([]);
    expect(finding).toMatchObject({ weight: 'query', activityId: 'B', row: 3 });
    expect(sentence(finding!)).toBe('B stands in row 3, which is hidden, and is part of the list.');
  });

  it('finds none where all rows show', () => {
    expect(found('hidden-row', list('A 1 2 3'))).toEqual([]);
  });
});
