import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, keys, keysAfter, sentence, writes } from '../helpers';

describe('open-start', () => {
  it('finds each that waits for nothing but the first, and links it from there', () => {
    const received = list('A 1 2 3', 'B 1 2 3', 'C 1 2 3 <- A, B');
    const [finding, ...more] = found('open-start', received);
    expect(more).toEqual([]);
    expect(finding).toMatchObject({ weight: 'query', activityId: 'B', row: 3, cell: 'F3' });
    expect(sentence(finding!)).toBe('B waits for nothing. The list starts with A; only a start should.');
    expect(writes(finding!.fix)).toEqual([['F3', null, 'A']]);
    expect(finding!.fix?.edits[0]?.items).toEqual([{ op: 'add', item: 'A' }]);
    expect(finding!.fix?.changes).toEqual([{ kind: 'add-link', from: 0, to: 1, type: 'FS', lag: 0 }]);
    expect(keysAfter(received, finding!.fix)).toEqual([]);
  });

  it('takes a milestone for the start, wherever it stands', () => {
    const received = list('A 1 2 3', 'B 1 2 3', 'Go 0 0 0', 'C 1 2 3 <- A, B, Go');
    expect(found('open-start', received).map(({ fix }) => writes(fix))).toEqual([
      [['F2', null, 'Go']],
      [['F3', null, 'Go']],
    ]);
  });

  it('takes a milestone without any link for a start above, and for a finish below', () => {
    const above = list('Go 0 0 0', 'A 1 2 3', 'B 1 2 3 <- A', 'C 1 2 3 <- B');
    expect(keys(above)).toEqual(['open-finish|Go', 'open-start|A']);
    const below = list('A 1 2 3', 'B 1 2 3 <- A', 'C 1 2 3 <- B', 'Done 0 0 0');
    expect(keys(below)).toEqual(['open-finish|C', 'open-start|Done']);
  });

  it('finds nothing where one activity alone waits for none', () => {
    expect(found('open-start', list('A 1 2 3', 'B 1 2 3 <- A'))).toEqual([]);
  });

  it('writes among the successors of the start where the list gives those', () => {
    const matching = { sheet: 'Activities', headerRow: 1, columns: { id: 0, likely: 3, successors: 6 } };
    const received = { ...list('A 1 2 3 -> C', 'B 1 2 3 -> C', 'C 1 2 3'), matching: [matching] };
    expect(writes(found('open-start', received)[0]!.fix)).toEqual([['G2', 'C', 'C, B']]);
  });

  it('proposes nothing where the list has no column for links', () => {
    const matching = { sheet: 'Activities', headerRow: 1, columns: { id: 0, likely: 3 } };
    const received = { ...list('A 1 2 3', 'B 1 2 3'), matching: [matching] };
    const [finding] = found('open-start', received);
    expect(finding).toMatchObject({ cell: null, row: 3 });
    expect(finding).not.toHaveProperty('fix');
  });

  it('writes the relation where the sheet has a column of its own for it', () => {
    const columns = { id: 0, likely: 3, predecessors: 5, relation: 7 };
    const received = list('A 1 2 3', 'B 1 2 3', 'C 1 2 3 <- A, B');
    const matching = [{ sheet: 'Activities', headerRow: 1, columns }];
    expect(writes(found('open-start', { ...received, matching })[0]!.fix)).toEqual([['F3', null, 'A FS']]);
  });

  it('leaves one to another rule whose predecessors are there and wrong', () => {
    const received = list('A 1 2 3', 'B 1 2 3 <- X9', 'C 1 2 3 <- after A', 'D 1 2 3 <- A, B, C');
    expect(found('open-start', received)).toEqual([]);
    const [cell] = list('A 1', 'B 1 <- A').linkCells;
    const withError = {
      ...list('A 1', 'B 1', 'C 1 <- A, B'),
      linkCells: [{ ...cell!, items: [], error: '#REF!' }],
    };
    expect(found('open-start', { ...withError, links: withError.links.slice(1) })).toEqual([]);
  });
});
