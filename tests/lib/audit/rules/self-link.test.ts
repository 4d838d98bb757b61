import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, keys, keysAfter, sentence, writes } from '../helpers';

describe('self-link', () => {
  it('removes the entry and nothing else of the cell', () => {
    const received = list('A 1 2 3', 'B 1 2 3 <- A, B SS+1');
    const [finding, ...more] = found('self-link', received);
    expect(more).toEqual([]);
    expect(finding).toMatchObject({ weight: 'blocks', activityId: 'B', cell: 'F3' });
    expect(sentence(finding!)).toBe('B waits for itself.');
    expect(writes(finding!.fix)).toEqual([['F3', 'A, B SS+1', 'A']]);
    expect(finding!.fix?.changes).toEqual([{ kind: 'remove-link', link: 1 }]);
    expect(keysAfter(received, finding!.fix)).toEqual([]);
  });

  it('is no loop', () => {
    expect(found('loop', list('A 1', 'B 1 <- B, A'))).toEqual([]);
  });

  it('empties a cell that says nothing else', () => {
    const [finding] = found('self-link', list('A 1 2 3', 'B 1 2 3 <- B'));
    expect(sentence(finding!)).toBe('B waits for itself, and for nothing else.');
    expect(writes(finding!.fix)).toEqual([['F3', 'B', null]]);
  });

  it('does not take it for a predecessor: the start may be the one that waits for itself', () => {
    expect(keys(list('A 1 2 3 <- A', 'B 1 2 3 <- A'))).toEqual(['self-link|A']);
    expect(keys(list('A 1 2 3', 'B 1 2 3 <- B', 'C 1 2 3 <- A, B'))).toEqual(['self-link|B', 'open-start|B']);
  });

  it('finds it among successors', () => {
    expect(writes(found('self-link', list('A 1 -> A, B', 'B 1'))[0]!.fix)).toEqual([['G2', 'A, B', 'B']]);
  });
});
