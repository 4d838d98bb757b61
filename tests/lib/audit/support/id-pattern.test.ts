import { describe, expect, it } from 'vitest';
import { memberOf, seriesOf } from '@/lib/audit/support/id-pattern';

const after = (...ids: string[]) =>
  [...seriesOf(ids).values()].map(({ last, step, width, write }) => write(last + step, width));

describe('the pattern of IDs', () => {
  it.each([
    [['A1', 'A2'], ['A3']],
    [['T-008', 'T-009'], ['T-010']],
    [['T-009', 'T-100'], ['T-191']],
    [['10', '20', '40'], ['50']],
    [
      ['1.1', '1.2', '2.1'],
      ['1.3', '2.2'],
    ],
    [['A1b', 'A2b'], ['A3b']],
    [['A', 'B', 'C'], ['D']],
    [['y', 'z'], ['aa']],
    [['7'], ['8']],
    [['START', 'END'], []],
  ])('goes on from %j with %j', (ids, next) => expect(after(...ids)).toEqual(next));

  it('reads letters as numbers and back', () => {
    for (const id of ['A', 'Z', 'AA', 'AZ', 'ZZ']) {
      const member = memberOf(id);
      expect(member?.write(member.number, 0)).toBe(id);
    }
  });

  it('counts digits that no number holds exactly by their last fifteen', () => {
    expect(after('1234567890123456789')).toEqual(['1234567890123456790']);
  });
});
