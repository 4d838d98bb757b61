import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, keys, keysAfter, sentence, withEstimate, writes } from '../helpers';

const received = list('A 1 2 3', 'B 4 about5 6 <- A');
const read = (readings: readonly number[], more = {}) =>
  found('unreadable-estimate', withEstimate(received, 1, 'likely', { readings, ...more }))[0]!;

describe('unreadable-estimate', () => {
  it('finds a cell that is no duration, and nothing else with it', () => {
    const [finding, ...more] = found('unreadable-estimate', received);
    expect(more).toEqual([]);
    expect(finding).toMatchObject({ weight: 'blocks', cell: 'D3', key: 'unreadable-estimate|B|m' });
    expect(sentence(finding!)).toBe(
      '“about5” in D3 is no duration, so the most likely duration of B is not known.',
    );
    expect(finding).not.toHaveProperty('fix');
    expect(keys(received)).toEqual([finding!.key]);
  });

  it('proposes the number in it where only one reading fits', () => {
    const finding = read([5]);
    expect(sentence(finding)).toBe(
      '“about5” in D3, the most likely duration of B, cannot be read as it stands; 5 days seems to be meant.',
    );
    expect(writes(finding.fix)).toEqual([['D3', 'about5', 5]]);
    expect(finding.fix?.reason).toBe('“about5” can only mean 5 days.');
    expect(finding.fix?.changes).toEqual([
      { kind: 'estimates', activity: 1, optimistic: 4, likely: 5, pessimistic: 6 },
    ]);
    expect(keysAfter(received, finding.fix)).toEqual([]);
  });

  it('lets the other two estimates choose between readings', () => {
    const finding = read([50, 5, 0.5]);
    expect(writes(finding.fix)).toEqual([['D3', 'about5', 5]]);
    expect(finding.fix?.reason).toBe('Read as 5 days: no other reading keeps a ≤ m ≤ b.');
  });

  it('offers each reading and prefers none where several fit', () => {
    const finding = read([5, 6]);
    expect(sentence(finding)).toBe(
      '“about5” in D3, the most likely duration of B, can be read as 5 days or 6 days.',
    );
    expect(finding).not.toHaveProperty('fix');
    expect(finding.alternatives?.map((fix) => writes(fix))).toEqual([
      [['D3', 'about5', 5]],
      [['D3', 'about5', 6]],
    ]);
  });

  it('proposes no reading below zero', () => {
    expect(read([-5]).fix).toBeUndefined();
  });

  it('writes in the unit that the cell states', () => {
    const finding = read([5], { unit: 'week', content: 'ca. 1 wk', text: 'ca. 1 wk' });
    expect(writes(finding.fix)).toEqual([['D3', 'ca. 1 wk', '1 w']]);
    expect(writes(read([5], { unit: 'hour', content: '~40', text: '~40' }).fix)).toEqual([['D3', '~40', 40]]);
  });

  it('says of a formula that it has no result', () => {
    expect(sentence(read([], { text: '', content: null }))).toBe(
      'The formula in D3 has no stored result, so the most likely duration of B is not known.',
    );
  });

  it('is one finding in a list with a single duration column', () => {
    const [finding, ...more] = found('unreadable-estimate', list('A 1', 'B tbd <- A'));
    expect(more).toEqual([]);
    expect(sentence(finding!)).toBe('“tbd” in C3 is no duration, so the duration of B is not known.');
  });
});
