import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, keys, keysAfter, sentence, withActivity, writes } from '../helpers';

describe('missing-id', () => {
  it('proposes the ID that is missing between the rows around it', () => {
    const received = list('A4 1 2 3', '_ "Cure the slab" 1 2 3 <- A4', 'A6 1 2 3 <- A5');
    const [finding] = found('missing-id', received);
    expect(finding).toMatchObject({ weight: 'blocks', activityId: null, row: 3, cell: 'A3' });
    expect(sentence(finding!)).toBe('Row 3, “Cure the slab”, has no ID, so nothing can wait for it.');
    expect(writes(finding!.fix)).toEqual([['A3', null, 'A5']]);
    expect(finding!.fix?.reason).toBe(
      'A5 is free, and lies between A4 and A6. The links of A6 name it already.',
    );
    expect(finding!.fix?.changes).toEqual([{ kind: 'add-link', from: 1, to: 2, type: 'FS', lag: 0 }]);
    expect(keysAfter(received, finding!.fix)).toEqual([]);
  });

  it('takes an ID halfway where the list counts in tens', () => {
    const received = list('A10 1', 'A20 1', '_ 1', 'A30 1');
    expect(writes(found('missing-id', received)[0]!.fix)).toEqual([['A4', null, 'A25']]);
  });

  it('goes on after the last where there is no gap, padded as the list pads', () => {
    const received = list('T-008 1', 'T-009 1', '_ 1', '_ 1');
    expect(found('missing-id', received).flatMap(({ fix }) => writes(fix))).toEqual([
      ['A4', null, 'T-010'],
      ['A5', null, 'T-011'],
    ]);
  });

  it('leaves alone an ID that a link elsewhere names already', () => {
    const received = list('A1 1', 'A2 1', '_ 1', 'A3 1', 'B7 1 <- A4');
    expect(writes(found('missing-id', received)[0]!.fix)).toEqual([['A4', null, 'A5']]);
  });

  it('counts back from the row below for the first row', () => {
    const [finding] = found('missing-id', list('_ 1', 'A2 1 <- A1', 'A3 1 <- A2'));
    expect(writes(finding!.fix)).toEqual([['A2', null, 'A1']]);
    expect(finding!.fix?.reason).toBe(
      "A1 is free, and comes before A2 in the list's pattern. The links of A2 name it already.",
    );
    expect(writes(found('missing-id', list('_ 1', 'A1 1', 'A2 1'))[0]!.fix)).toEqual([['A2', null, 'A3']]);
  });

  it('begins a series where no row has an ID', () => {
    const received = list('_ 1', '_ 2');
    expect(found('missing-id', received).flatMap(({ fix }) => writes(fix))).toEqual([
      ['A2', null, '1'],
      ['A3', null, '2'],
    ]);
  });

  it('writes a number where the IDs around it are numbers', () => {
    const received = withActivity(list('1 1', '_ 1', '3 1'), 0, () => ({ idContent: 1 }));
    expect(writes(found('missing-id', received)[0]!.fix)).toEqual([['A3', null, 2]]);
  });

  it('speaks of a row without a name by its number', () => {
    const [finding] = found('missing-id', list('A 1', '_ "" 1'));
    expect(sentence(finding!)).toBe('Row 3 has estimates and no ID, so nothing can wait for it.');
  });

  it('does not cascade into open ends, nor into a missing name', () => {
    expect(keys(list('A 1 2 3', 'B 1 2 3 <- A', '_ "" 1 2 3'))).toEqual(['missing-id||']);
  });

  it('leaves a row whose ID cell shows an error to that rule', () => {
    const received = withActivity(list('A 1', '_ 1'), 1, () => ({ idError: '#REF!' }));
    expect(found('missing-id', received)).toEqual([]);
  });
});
