import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, keys, keysAfter, sentence, writes } from '../helpers';

describe('open-finish', () => {
  it('finds each that leads nowhere but the last, and links it to there', () => {
    const received = list('A 1 2 3', 'B 1 2 3 <- A', 'C 1 2 3 <- A');
    const [finding, ...more] = found('open-finish', received);
    expect(more).toEqual([]);
    expect(finding).toMatchObject({ weight: 'query', activityId: 'B', row: 3 });
    expect(sentence(finding!)).toBe(
      'Nothing waits for B. The list ends with C; only a finish should lead nowhere.',
    );
    expect(writes(finding!.fix)).toEqual([['F4', 'A', 'A, B']]);
    expect(finding!.fix?.edits[0]).toMatchObject({ items: [{ op: 'add', item: 'B' }], separator: ', ' });
    expect(finding!.fix?.changes).toEqual([{ kind: 'add-link', from: 1, to: 2, type: 'FS', lag: 0 }]);
    expect(keysAfter(received, finding!.fix)).toEqual([]);
  });

  it('takes a milestone for the finish, the last of several', () => {
    const received = list('A 1 2 3', 'M1 0 0 0 <- A', 'M2 0 0 0 <- A', 'B 1 2 3 <- A');
    expect(found('open-finish', received).map(({ fix }) => writes(fix))).toEqual([
      [['F4', 'A', 'A, M1']],
      [['F4', 'A', 'A, B']],
    ]);
  });

  it('seeks the finish outside a group that has no link to the rest', () => {
    const received = list('A 1 2 3', 'B 1 2 3 <- A', 'C 1 2 3 <- B', 'X 1 2 3', 'Y 1 2 3 <- X');
    expect(found('open-finish', received).map(({ fix }) => writes(fix))).toEqual([[['F4', 'B', 'B, Y']]]);
  });

  it('writes among the successors where the list gives those', () => {
    const matching = { sheet: 'Activities', headerRow: 1, columns: { id: 0, likely: 3, successors: 6 } };
    const received = { ...list('A 1 2 3 -> B, C', 'B 1 2 3', 'C 1 2 3'), matching: [matching] };
    expect(writes(found('open-finish', received)[0]!.fix)).toEqual([['G3', null, 'C']]);
  });

  it('reckons with a link that is meant and wrongly written', () => {
    expect(keys(list('A1 1 2 3', 'B1 1 2 3 <- A1', 'C1 1 2 3 <- b1'))).toEqual(['unknown-predecessor|C1|b1']);
  });

  it('proposes one link for an activity alone at each of its ends, and adopting one clears both', () => {
    const received = list('A 1 2 3', 'B 1 2 3');
    expect(keys(received)).toEqual(['open-finish|A', 'open-start|B']);
    expect(keysAfter(received, found('open-finish', received)[0]!.fix)).toEqual([]);
  });

  it('finds nothing in a ring, which has no end', () => {
    expect(found('open-finish', list('A 1 <- B', 'B 1 <- A'))).toEqual([]);
  });
});
