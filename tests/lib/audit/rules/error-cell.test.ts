import { describe, expect, it } from 'vitest';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { list } from '@/tests/support/networks';
import { found, keys, sentence, withActivity, withEstimate } from '../helpers';

const clean = list('A 1 2 3', 'B 4 5 6 <- A', 'C 1 2 3 <- B');

function withError(received: ActivityList, field: string, column: number, owner = 1): ActivityList {
  const cell = { sheet: 'Activities', row: owner + 2, column };
  return { ...received, errorCells: [{ cell, field, code: '#REF!', owner }] };
}

describe('error-cell', () => {
  it('blocks where an estimate shows an error, and is the only finding', () => {
    const received = withError(
      withEstimate(clean, 1, 'likely', { days: null, text: '#REF!', content: '#REF!', problem: 'error' }),
      'likely',
      3,
    );
    const [finding] = found('error-cell', received);
    expect(keys(received)).toEqual(['error-cell|B|likely']);
    expect(finding).toMatchObject({ weight: 'blocks', cell: 'D3', row: 3, activityId: 'B' });
    expect(sentence(finding!)).toBe('D3 shows #REF! where the most likely (m) of B should be.');
    expect(finding).not.toHaveProperty('fix');
  });

  it('blocks where the ID shows an error, and the row is not said to have no ID as well', () => {
    const row = { id: '', idError: '#REF!', idContent: '#REF!' };
    const received = withError(
      withActivity(list('A 1 2 3', '_ 1 2 3 <- A', 'C 1 2 3 <- A'), 1, () => row),
      'id',
      0,
    );
    expect(found('error-cell', received)).toMatchObject([{ weight: 'blocks', activityId: null, cell: 'A3' }]);
    expect(keys(received)).toEqual(['error-cell|Activity _|id'].map((key) => key.replace('|A', '||A')));
  });

  it('distorts elsewhere, and no open end is made of a predecessor cell that shows one', () => {
    const cell = { sheet: 'Activities', row: 3, column: 5 };
    const broken = {
      owner: 1,
      gives: 'predecessors',
      cell,
      text: '#REF!',
      content: '#REF!',
      items: [],
      separator: '',
      error: '#REF!',
    } as const;
    const { linkCells, links } = list('A 1 2 3', 'B 4 5 6', 'C 1 2 3 <- A, B');
    const received = withError(
      { ...list('A 1 2 3', 'B 4 5 6', 'C 1 2 3 <- A, B'), linkCells: [...linkCells, broken], links },
      'predecessors',
      5,
    );
    expect(keys(received)).toEqual(['error-cell|B|predecessors']);
    expect(found('error-cell', received)).toMatchObject([{ weight: 'distorts', cell: 'F3' }]);
  });

  it('finds one in a row that is no activity', () => {
    const [finding] = found('error-cell', withError(clean, 'name', 1, -1));
    expect(finding).toMatchObject({ weight: 'distorts', activityId: null, cell: 'B1' });
    expect(sentence(finding!)).toBe('B1 shows #REF! where a value of “name” should be.');
  });

  it('does not take a name that shows an error for a missing one', () => {
    const received = withError(
      withActivity(clean, 1, () => ({ name: '' })),
      'name',
      1,
    );
    expect(keys(received)).toEqual(['error-cell|B|name']);
  });
});
