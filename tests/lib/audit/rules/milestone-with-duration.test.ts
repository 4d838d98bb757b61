import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, keysAfter, sentence, writes } from '../helpers';

const named = (name: string, numbers = '1 2 3') => list('A 1 2 3', `B "${name}" ${numbers} <- A`);

describe('milestone-with-duration', () => {
  it('proposes no time for a milestone', () => {
    const received = named('Milestone: roof tight');
    const [finding, ...more] = found('milestone-with-duration', received);
    expect(more).toEqual([]);
    expect(finding).toMatchObject({ weight: 'distorts', activityId: 'B', cell: 'D3' });
    expect(sentence(finding!)).toBe('B is named a milestone (“Milestone: roof tight”), and takes 2 days.');
    expect(writes(finding!.fix)).toEqual([
      ['C3', 1, 0],
      ['D3', 2, 0],
      ['E3', 3, 0],
    ]);
    expect(keysAfter(received, finding!.fix)).toEqual([]);
  });

  it.each([
    'Roof tight (milestone)',
    'Contract milestone',
    'MILESTONE 3',
    'Milestone – quay handed over',
    'Payment milestone 2',
  ])('takes “%s” for a milestone', (name) =>
    expect(found('milestone-with-duration', named(name))).toHaveLength(1),
  );

  it.each([
    'Write the milestone report',
    'Milestones of the year painted on the wall',
    'Set milestone stones',
  ])('does not take “%s” for one', (name) =>
    expect(found('milestone-with-duration', named(name))).toEqual([]),
  );

  it('leaves one alone that takes no time, or whose duration is not known', () => {
    expect(found('milestone-with-duration', named('Milestone: start', '0 0 0'))).toEqual([]);
    expect(found('milestone-with-duration', named('Milestone: start', '0 - 0'))).toEqual([]);
  });
});
