import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, keys, keysAfter, sentence, writes } from '../helpers';

describe('negative-estimate', () => {
  it.each([
    ['-2 5 8', 'C3', 'The optimistic duration of B is -2 days, and no activity takes less than no time.', 2],
    ['2 -5 8', 'D3', 'The most likely duration of B is -5 days, and no activity takes less than no time.', 5],
    ['2 5 -8', 'E3', 'The pessimistic duration of B is -8 days, and no activity takes less than no time.', 8],
  ])('proposes the positive value for %s, and finds nothing else', (numbers, cell, text, to) => {
    const received = list('A 1 2 3', `B ${numbers} <- A`);
    const [finding] = found('negative-estimate', received);
    expect(keys(received)).toEqual([finding!.key]);
    expect(finding).toMatchObject({ weight: 'distorts', cell });
    expect(sentence(finding!)).toBe(text);
    expect(writes(finding!.fix)).toEqual([[cell, -to, to]]);
    expect(keysAfter(received, finding!.fix)).toEqual([]);
  });

  it('finds each of several, with a fix of its own', () => {
    const received = list('A 1 2 3', 'B -1 -2 -3 <- A');
    const findings = found('negative-estimate', received);
    expect(findings.map(({ key }) => key)).toEqual(
      ['a', 'm', 'b'].map((part) => `negative-estimate|B|${part}`),
    );
    const all = { reason: '', changes: [], edits: findings.flatMap(({ fix }) => fix?.edits ?? []) };
    expect(keysAfter(received, all)).toEqual([]);
  });

  it('offers the positive value and does not propose it where a ≤ m ≤ b would not hold', () => {
    const [finding] = found('negative-estimate', list('A 1 2 3', 'B -9 5 8 <- A'));
    expect(finding).not.toHaveProperty('fix');
    expect(finding!.alternatives?.map((fix) => writes(fix))).toEqual([[['C3', -9, 9]]]);
  });

  it('is one finding in a list with a single duration column, and changes all three', () => {
    const [finding, ...more] = found('negative-estimate', list('A 1', 'B -4 <- A'));
    expect(more).toEqual([]);
    expect(sentence(finding!)).toBe('The duration of B is -4 days, and no activity takes less than no time.');
    expect(finding!.fix?.changes).toEqual([
      { kind: 'estimates', activity: 1, optimistic: 4, likely: 4, pessimistic: 4 },
    ]);
  });

  it('leaves zero alone', () => {
    expect(found('negative-estimate', list('A 0 0 0', 'B 0 1 2 <- A'))).toEqual([]);
  });
});
