import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { compareRevisions, linksText, type ComparedActivity } from '@/lib/comparison/revisions';

function activity(id: string, given: Partial<ComparedActivity> = {}): ComparedActivity {
  return { id, name: `Work ${id}`, optimistic: 2, likely: 4, pessimistic: 9, predecessors: [], ...given };
}
const after = (id: string, lag = 0, type = 'FS') => ({ id, type, lag });

describe('what was asked of a revision', () => {
  const received = [
    activity('A', { optimistic: 6 }),
    activity('B', { predecessors: [after('A2')] }),
    activity('C'),
  ];
  const corrected = [
    activity('A', { optimistic: 3 }),
    activity('B', { predecessors: [after('A')] }),
    activity('C'),
  ];
  const outcomes = (later: readonly ComparedActivity[]) =>
    compareRevisions(received, corrected, later).asked.map(({ id, outcome }) => `${id} ${outcome}`);

  it('is done where the later one has it', () => {
    const { asked, unasked, same } = compareRevisions(received, corrected, corrected);
    expect(asked.map(({ field, outcome }) => [field, outcome])).toEqual([
      ['optimistic', 'done'],
      ['predecessors', 'done'],
    ]);
    expect(unasked).toEqual([]);
    expect(same).toBe(1);
  });

  it('is not done where the old value came back', () => {
    expect(outcomes(received)).toEqual(['A not done', 'B not done']);
  });

  it('is done otherwise where a third value came, and gone with its activity', () => {
    expect(outcomes([activity('A', { optimistic: 1 })])).toEqual(['A otherwise', 'B gone']);
  });
});

describe('what was not asked', () => {
  const earlier = [activity('A'), activity('B', { predecessors: [after('A')] })];

  it('is told by field', () => {
    const later = [
      activity('A', { pessimistic: 12 }),
      activity('B', { predecessors: [after('A', 2, 'SS')] }),
    ];
    expect(compareRevisions(earlier, earlier, later).unasked).toEqual([
      { id: 'A', name: 'Work A', field: 'pessimistic', was: 9, now: 12 },
      { id: 'B', name: 'Work B', field: 'predecessors', was: 'A', now: 'A SS+2' },
    ]);
  });

  it('counts what is added and removed', () => {
    const { added, removed } = compareRevisions(earlier, earlier, [activity('A'), activity('D')]);
    expect([added.map(({ id }) => id), removed.map(({ id }) => id)]).toEqual([['D'], ['B']]);
  });

  it('does not mind the order of rows or of links', () => {
    const links = [after('X'), after('Y', -1), after('Z', 0, 'FF')];
    const one = [activity('A', { predecessors: links }), activity('B')];
    fc.assert(
      fc.property(fc.shuffledSubarray(links, { minLength: 3 }), fc.boolean(), (shuffled, flip) => {
        const two = [activity('A', { predecessors: shuffled }), activity('B')];
        const { unasked, same } = compareRevisions(one, one, flip ? two.reverse() : two);
        expect([unasked.length, same]).toEqual([0, 2]);
      }),
    );
  });

  it('takes the first of two rows with one ID', () => {
    const twice = [...earlier, activity('A', { likely: 99 })];
    expect(compareRevisions(earlier, earlier, twice).unasked).toEqual([]);
  });
});

it('writes links in the trade’s notation', () => {
  expect(linksText([after('B', -2, 'FF'), after('A'), after('C', 1.5)])).toBe('A, B FF−2, C FS+1.5');
});
