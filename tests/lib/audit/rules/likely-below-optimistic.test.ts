import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, keys, keysAfter, sentence, withEstimate, writes } from '../helpers';

const numbersOf = (numbers: string) => list('A 1 2 3', `B ${numbers} <- A`);

describe('likely-below-optimistic', () => {
  it('exchanges a and m where that puts the three in order', () => {
    const received = numbersOf('6 4 11');
    const [finding] = found('likely-below-optimistic', received);
    expect(keys(received)).toEqual(['likely-below-optimistic|B']);
    expect(finding).toMatchObject({ weight: 'distorts', cell: 'C3', activityId: 'B' });
    expect(sentence(finding!)).toBe(
      'B: a = 6 days is over m = 4 days; the best case is longer than the likely one.',
    );
    expect(writes(finding!.fix)).toEqual([
      ['C3', 6, 4],
      ['D3', 4, 6],
    ]);
    expect(finding!.fix?.reason).toBe('a and m exchanged: a = 4 days, m = 6 days and b = 11 days.');
    expect(finding!.fix?.changes).toEqual([
      { kind: 'estimates', activity: 1, optimistic: 4, likely: 6, pessimistic: 11 },
    ]);
    expect(keysAfter(received, finding!.fix)).toEqual([]);
  });

  it.each([
    ['60 5 60', 'exchanged', [5, 60, 60]],
    ['40 6 9', 'a is ten times too large', [4, 6, 9]],
    ['5 0.4 9', 'exchanged', [0.4, 5, 9]],
    ['12 8 10', 'sorted', [8, 10, 12]],
    ['90 5 8', 'sorted', [5, 8, 90]],
    ['9 5 5', 'sorted', [5, 5, 9]],
  ])('puts %s in order: %s', (numbers, how, ordered) => {
    const received = numbersOf(numbers);
    const [finding] = found('likely-below-optimistic', received);
    expect(finding!.fix?.reason).toContain(how);
    const [change] = finding!.fix?.changes ?? [];
    expect(change?.kind === 'estimates' && [change.optimistic, change.likely, change.pessimistic]).toEqual(
      ordered,
    );
    for (const fix of [finding!.fix, ...(finding!.alternatives ?? [])]) {
      expect(keysAfter(received, fix).filter((key) => !key.startsWith('no-spread'))).toEqual([]);
    }
  });

  it('offers what else would put them in order', () => {
    const [finding] = found('likely-below-optimistic', numbersOf('40 6 9'));
    expect(finding!.alternatives?.map(({ reason }) => reason)).toEqual([
      'The three sorted: a = 6 days, m = 9 days and b = 40 days.',
    ]);
  });

  it('looks for a ten-fold slip from the limit on', () => {
    const book = { 'likely-below-optimistic': { limits: { slip: 1 } } };
    expect(found('likely-below-optimistic', numbersOf('12 8 10'), book)[0]!.fix?.reason).toContain(
      'ten times',
    );
  });

  it('does without b where there is none', () => {
    const [finding] = found('likely-below-optimistic', numbersOf('6 4 -'));
    expect(writes(finding!.fix)).toEqual([
      ['C3', 6, 4],
      ['D3', 4, 6],
    ]);
    expect(keys(numbersOf('6 4 -'))).toEqual(['likely-below-optimistic|B', 'missing-estimate|B']);
  });

  it('writes each value in the unit and the notation of its cell', () => {
    const hours = withEstimate(numbersOf('2 1 3'), 1, 'optimistic', {
      text: '16 h',
      content: '16 h',
      unit: 'hour',
    });
    const mixed = withEstimate(hours, 1, 'likely', { text: '1,0 d', content: '1,0 d', unit: 'day' });
    const [finding] = found('likely-below-optimistic', mixed);
    expect(sentence(finding!)).toContain('a = 16 h is over m = 1,0 d');
    expect(writes(finding!.fix)).toEqual([
      ['C3', '16 h', '8 h'],
      ['D3', '1,0 d', '2 d'],
    ]);
    expect(finding!.fix?.reason).toBe('a and m exchanged: a = 8 hours, m = 2 days and b = 3 days.');
  });

  it('says nothing where a sign, a gap or an unread cell is the trouble, nor where all is in order', () => {
    for (const numbers of ['4 -1 6', '- 4 6', '6 x 9', 'x 4 6', '4 4 4', '0 0 0', '1 2 3']) {
      expect(found('likely-below-optimistic', numbersOf(numbers))).toEqual([]);
    }
  });

  it('leaves three that run downwards to the other rule', () => {
    expect(found('likely-below-optimistic', numbersOf('9 6 3'))).toEqual([]);
  });
});
