import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, keys, sentence, withEstimate, writes } from '../helpers';

const estimate = {
  days: null,
  text: '1,234',
  content: '1,234',
  problem: 'ambiguous',
  readings: [1.234, 1234],
} as const;
const wide = list('A 1 2 3', 'B 1 2 2000 <- A');

describe('ambiguous-number', () => {
  it('offers each reading, in a way that cannot be taken for the other', () => {
    const received = withEstimate(wide, 1, 'likely', { ...estimate, days: 1.234 });
    const [finding] = found('ambiguous-number', received);
    expect(finding).toMatchObject({ weight: 'distorts', cell: 'D3', activityId: 'B' });
    expect(sentence(finding!)).toBe(
      '“1,234” in D3, the most likely duration of B, can be read as 1.2 days or 1234 days.',
    );
    expect(finding).not.toHaveProperty('fix');
    expect(finding!.alternatives?.map((fix) => fix.edits[0]?.to)).toEqual(['1.2340', '1234']);
    expect(keys(received)).toEqual([finding!.key]);
  });

  it('blocks where the likely estimate is left without a value', () => {
    expect(found('ambiguous-number', withEstimate(wide, 1, 'likely', estimate))[0]?.weight).toBe('blocks');
    expect(found('ambiguous-number', withEstimate(wide, 1, 'pessimistic', estimate))[0]?.weight).toBe(
      'distorts',
    );
  });

  it('proposes the reading that alone keeps a ≤ m ≤ b', () => {
    const narrow = withEstimate(list('A 1 2 3', 'B 1 2 3 <- A'), 1, 'likely', estimate);
    const [finding] = found('ambiguous-number', narrow);
    expect(writes(finding!.fix)).toEqual([['D3', '1,234', '1.2340']]);
    expect(sentence(finding!)).toContain('can be read as 1.2 days or 1234 days');
    expect(finding!.alternatives?.map((fix) => writes(fix))).toEqual([[['D3', '1,234', '1234']]]);
  });

  it('keeps the decimal comma and the unit of the column', () => {
    const written = { ...estimate, text: '1,234 d', content: '1,234 d', unit: 'day' } as const;
    const comma = withEstimate(wide, 0, 'likely', { text: '2,5', content: '2,5', days: 2.5 });
    const [finding] = found('ambiguous-number', withEstimate(comma, 1, 'likely', written));
    expect(finding!.alternatives?.map((fix) => fix.edits[0]?.to)).toEqual(['1,2340 d', '1234 d']);
  });
});
