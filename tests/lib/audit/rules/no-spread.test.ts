import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, sentence, withEstimate } from '../helpers';

describe('no-spread', () => {
  it('finds each row with one value three times, and proposes nothing', () => {
    const findings = found('no-spread', list('A 5 5 5', 'B 1 5 5 <- A', 'C 2 2 2 <- B'));
    expect(findings.map(({ key }) => key)).toEqual(['no-spread|A', 'no-spread|C']);
    expect(findings[0]).toMatchObject({ weight: 'query', cell: 'D2' });
    expect(findings[0]).not.toHaveProperty('fix');
    expect(sentence(findings[0]!)).toBe(
      'A is estimated at 5 days in the best, the likely and the worst case.',
    );
  });

  it('is one finding for a list with a single duration column', () => {
    const [finding, ...more] = found('no-spread', list('A 5', 'B 0 <- A', 'C 3 <- B'));
    expect(more).toEqual([]);
    expect(finding).toMatchObject({
      key: 'no-spread|list',
      sheet: null,
      row: null,
      cell: null,
      activityId: null,
    });
    expect(sentence(finding!)).toBe(
      'The list gives one duration for each activity (2 activities), so no finish can be given a spread.',
    );
  });

  it('leaves milestones alone, and rows of which one estimate is not known', () => {
    expect(found('no-spread', list('A 0 0 0', 'B 5 5 - <- A'))).toEqual([]);
    expect(found('no-spread', list('A 0', 'B 0 <- A'))).toEqual([]);
    const doubtful = withEstimate(list('A 5 5 5'), 0, 'pessimistic', { problem: 'ambiguous' });
    expect(found('no-spread', doubtful)).toEqual([]);
  });
});
