import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, keys, sentence, withActivity, withEstimate, writes } from '../helpers';

const ALLOWED = { 'missing-estimate': { limits: { levelAllowed: 1 } } };

describe('missing-estimate', () => {
  it.each([
    ['- 2 3', 'distorts', 'C3', 'B has no optimistic estimate.'],
    ['1 - 3', 'blocks', 'D3', 'B has no most likely estimate.'],
    ['1 2 -', 'distorts', 'E3', 'B has no pessimistic estimate.'],
    ['- 2 -', 'distorts', 'C3', 'B has no optimistic and pessimistic estimates.'],
    ['- - 3', 'blocks', 'D3', 'B has no optimistic and most likely estimates.'],
    ['- - -', 'blocks', 'D3', 'B has links, and none of the three estimates.'],
  ])('finds %s: %s', (numbers, weight, cell, text) => {
    const received = list('A 1 2 3', `B ${numbers} <- A`);
    const [finding] = found('missing-estimate', received);
    expect(finding).toMatchObject({ weight, cell, activityId: 'B', key: 'missing-estimate|B' });
    expect(sentence(finding!)).toBe(text);
    expect(finding).not.toHaveProperty('fix');
    expect(keys(received)).toEqual(['missing-estimate|B']);
  });

  it('fills the gap so that a = m = b where the office allows it', () => {
    const received = list('A 1 2 3', 'B - 2 - <- A', 'C - - 4 <- B', 'D 3 - 4 <- C', 'E 3 - 3 <- D');
    expect(
      found('missing-estimate', received, ALLOWED).map(({ activityId, fix }) => [activityId, writes(fix)]),
    ).toEqual([
      [
        'C',
        [
          ['C4', null, 4],
          ['D4', null, 4],
        ],
      ],
      ['D', undefined],
      ['E', [['D6', null, 3]]],
      [
        'B',
        [
          ['C3', null, 2],
          ['E3', null, 2],
        ],
      ],
    ]);
    expect(found('missing-estimate', received, ALLOWED)[3]!.fix?.changes).toEqual([
      { kind: 'estimates', activity: 1, optimistic: 2, likely: 2, pessimistic: 2 },
    ]);
  });

  it('is one finding where a single duration is missing', () => {
    const received = list('A 1', 'B - <- A', 'C 2 <- B');
    const [finding, ...more] = found('missing-estimate', received);
    expect(more).toEqual([]);
    expect(finding).toMatchObject({ weight: 'blocks', cell: 'C3' });
    expect(sentence(finding!)).toBe('B has no duration.');
  });

  it('is one finding where the list has no column for one of the three', () => {
    const without = { cell: null, problem: 'empty', days: null, content: null, text: '' } as const;
    const received = [0, 1].reduce(
      (audited, index) => withEstimate(audited, index, 'optimistic', without),
      list('A 1 2 3', 'B 1 2 3 <- A'),
    );
    const [finding, ...more] = found('missing-estimate', received);
    expect(more).toEqual([]);
    expect(finding).toMatchObject({ weight: 'distorts', cell: null, row: null, activityId: null });
    expect(sentence(finding!)).toBe('Sheet “Activities” has no column for the optimistic estimate.');
  });

  it('leaves a cell that holds something to the rules for that', () => {
    expect(found('missing-estimate', list('A 1 2 3', 'B 1 x 3 <- A'))).toEqual([]);
    const received = withEstimate(list('A 1 2 3', 'B 1 2 - <- A'), 1, 'likely', {
      days: null,
      problem: 'error',
    });
    expect(found('missing-estimate', received)).toMatchObject([{ weight: 'distorts', cell: 'E3' }]);
  });

  it('names a row without ID by its name', () => {
    const [finding] = found(
      'missing-estimate',
      withActivity(list('A 1 2 3', '_ "Test" - 2 3 <- A'), 1, () => ({})),
    );
    expect(sentence(finding!)).toBe('“Test” in row 3 has no optimistic estimate.');
  });
});
