import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, keys, keysAfter, sentence, withReadings, writes } from '../helpers';

const received = list('A 1 2 3', 'B 1 2 3 <- A', 'C 1 2 3 <- B, A +3 after all');

describe('unreadable-predecessor', () => {
  it('finds the entry and leaves the rest of the cell as it is', () => {
    const [finding, ...more] = found('unreadable-predecessor', received);
    expect(more).toEqual([]);
    expect(finding).toMatchObject({ weight: 'distorts', activityId: 'C', cell: 'F4' });
    expect(sentence(finding!)).toBe(
      '“A +3 after all” among the predecessors of C cannot be read as an ID with a relation and a lag.',
    );
    expect(finding!.fix).toBeUndefined();
  });

  it('proposes the reading where only one fits', () => {
    const [finding] = found('unreadable-predecessor', withReadings(received, 'A +3 after all', ['A FS+3']));
    expect(sentence(finding!)).toBe(
      '“A +3 after all” among the predecessors of C cannot be read as it stands; “A FS+3” seems to be meant.',
    );
    expect(writes(finding!.fix)).toEqual([['F4', 'B, A +3 after all', 'B, A FS+3']]);
    expect(finding!.fix?.changes).toEqual([{ kind: 'add-link', from: 0, to: 2, type: 'FS', lag: 3 }]);
    expect(keysAfter(received, finding!.fix)).toEqual([]);
  });

  it('offers each reading and prefers none where several fit', () => {
    const readings = ['A FS+3', 'A SS+3'];
    const [finding] = found('unreadable-predecessor', withReadings(received, 'A +3 after all', readings));
    expect(sentence(finding!)).toBe(
      'C has “A +3 after all” among its predecessors, which may mean “A FS+3” or “A SS+3”.',
    );
    expect(finding!.fix).toBeUndefined();
    expect(finding!.alternatives?.map((fix) => fix.edits[0]?.to)).toEqual(['B, A FS+3', 'B, A SS+3']);
  });

  it('leaves out a reading that names no activity, the activity itself, or would close a loop', () => {
    const ring = list('A 1 2 3 <- C later', 'B 1 2 3 <- A', 'C 1 2 3 <- B');
    const [finding] = found(
      'unreadable-predecessor',
      withReadings(ring, 'C later', ['X FS', 'A SS', 'C FS']),
    );
    expect(finding!.fix).toBeUndefined();
    expect(finding!.alternatives).toBeUndefined();
  });

  it('reads a lag in the unit it is given in', () => {
    const [finding] = found('unreadable-predecessor', withReadings(received, 'A +3 after all', ['A SS-2w']));
    expect(finding!.fix?.changes).toEqual([{ kind: 'add-link', from: 0, to: 2, type: 'SS', lag: -10 }]);
  });

  it('reads an ID that holds a hyphen and digits before a relation', () => {
    const hyphens = list('M-010 1 2 3', 'M-020 1 2 3 <- M-010 FS+ 1 2');
    const [finding] = found('unreadable-predecessor', withReadings(hyphens, 'M-010 FS+ 1 2', ['M-010 FS']));
    expect(finding!.fix?.edits[0]?.to).toBe('M-010 FS');
  });

  it('puts several entries in place of one where that is what is meant', () => {
    const range = list('A 1 2 3', 'B 1 2 3 <- A', 'C 1 2 3 <- all of A and B');
    const several = withReadings(range, 'all of A and B', ['A, B']);
    const [finding] = found('unreadable-predecessor', several);
    expect(finding!.fix?.edits[0]?.to).toBe('A, B');
    expect(finding!.fix?.changes).toHaveLength(2);
  });

  it('is the only finding: what the entry speaks of is no open end', () => {
    expect(keys(list('A 1 2 3', 'B 1 2 3 <- A (by crane)', 'C 1 2 3 <- B'))).toEqual([
      'unreadable-predecessor|B|A (by crane)',
    ]);
  });
});
