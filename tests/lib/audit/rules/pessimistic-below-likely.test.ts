import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, keys, keysAfter, sentence, writes } from '../helpers';

const numbersOf = (numbers: string) => list('A 1 2 3', `B ${numbers} <- A`);

describe('pessimistic-below-likely', () => {
  it('exchanges m and b where that puts the three in order', () => {
    const received = numbersOf('4 25 20');
    const [finding] = found('pessimistic-below-likely', received);
    expect(keys(received)).toEqual(['pessimistic-below-likely|B']);
    expect(finding).toMatchObject({ weight: 'distorts', cell: 'E3', activityId: 'B' });
    expect(sentence(finding!)).toBe(
      'B: m = 25 days is over b = 20 days; the worst case is shorter than the likely one.',
    );
    expect(writes(finding!.fix)).toEqual([
      ['D3', 25, 20],
      ['E3', 20, 25],
    ]);
    expect(keysAfter(received, finding!.fix)).toEqual([]);
  });

  it('sorts three that run downwards, as one finding', () => {
    const received = numbersOf('9 6 3');
    expect(keys(received)).toEqual(['pessimistic-below-likely|B']);
    const [finding] = found('pessimistic-below-likely', received);
    expect(sentence(finding!)).toBe('B: a = 9 days, m = 6 days and b = 3 days run downwards.');
    expect(writes(finding!.fix)).toEqual([
      ['C3', 9, 3],
      ['E3', 3, 9],
    ]);
    expect(keysAfter(received, finding!.fix)).toEqual([]);
  });

  it.each([
    ['4 6 0.9', 'b is ten times too small', [4, 6, 9]],
    ['4 60 9', 'exchanged', [4, 9, 60]],
    ['5 5 4', 'sorted', [4, 5, 5]],
    ['5 7 4', 'sorted', [4, 5, 7]],
    ['0 5 0', 'exchanged', [0, 0, 5]],
    ['40 60 3', 'sorted', [3, 40, 60]],
  ])('puts %s in order: %s', (numbers, how, ordered) => {
    const received = numbersOf(numbers);
    const [finding] = found('pessimistic-below-likely', received);
    expect(finding!.fix?.reason).toContain(how);
    const [change] = finding!.fix?.changes ?? [];
    expect(change?.kind === 'estimates' && [change.optimistic, change.likely, change.pessimistic]).toEqual(
      ordered,
    );
    expect(keysAfter(received, finding!.fix)).toEqual([]);
  });

  it('offers the ten-fold slip beside an exchange', () => {
    const [finding] = found('pessimistic-below-likely', numbersOf('4 60 9'));
    expect(finding!.alternatives?.map((fix) => writes(fix))).toEqual([[['D3', 60, 6]], [['E3', 9, 90]]]);
  });

  it('has one finding for every order of three that is not a ≤ m ≤ b', () => {
    const orders = ['1 3 2', '2 1 3', '2 3 1', '3 1 2', '3 2 1', '1 2 1', '2 1 1', '2 2 1', '2 1 2'];
    for (const order of orders) {
      const ordering = keys(numbersOf(order)).filter((key) => key.includes('below'));
      expect([order, ordering.length]).toEqual([order, 1]);
    }
  });

  it('compares m and b where there is no a', () => {
    expect(writes(found('pessimistic-below-likely', numbersOf('- 8 5'))[0]!.fix)).toEqual([
      ['D3', 8, 5],
      ['E3', 5, 8],
    ]);
  });

  it('says nothing of a list with one duration, a sign, or a cell not read', () => {
    expect(found('pessimistic-below-likely', list('A 5', 'B 4 <- A'))).toEqual([]);
    for (const numbers of ['1 5 -2', '1 x 2', '1 5 x', '-9 5 3']) {
      expect(found('pessimistic-below-likely', numbersOf(numbers))).toEqual([]);
    }
  });
});
