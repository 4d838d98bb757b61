import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { applyItems, itemsOf } from '@/lib/schedule/link-items';

describe('itemsOf', () => {
  it.each([
    ['A, B;C', ['A', 'B', 'C']],
    ['A\nB\r\nC', ['A', 'B', 'C']],
    ['A and B & C', ['A', 'B', 'C']],
    ['sand-1, band', ['sand-1', 'band']],
    ['  A SS+3 ,, B ; ', ['A SS+3', 'B']],
    ['', []],
    ['–', []],
    ['None', []],
    ['n/a', []],
  ])('%j has the entries %j', (text, items) => {
    expect(itemsOf(text)).toEqual(items);
  });
});

describe('applyItems', () => {
  it.each([
    ['A, Z9, C', { op: 'replace', item: 'Z9', with: 'Z6' }, 'A, Z6, C'],
    ['A;Z9 SS+2;C', { op: 'replace', item: 'Z9 SS+2', with: 'Z6 SS+2' }, 'A;Z6 SS+2;C'],
    ['A and B', { op: 'remove', item: 'A' }, 'B'],
    ['A, B and C', { op: 'remove', item: 'B' }, 'A and C'],
    ['A\nB\nC', { op: 'remove', item: 'C' }, 'A\nB'],
    ['A, A', { op: 'remove', item: 'A' }, 'A'],
    [' A ', { op: 'remove', item: 'A' }, ''],
    ['A,', { op: 'remove', item: 'A' }, ''],
    ['A1, A', { op: 'replace', item: 'A', with: 'B' }, 'A1, B'],
    ['R&D, B', { op: 'remove', item: 'R&D' }, 'B'],
    ['B, R&D & C', { op: 'replace', item: 'R&D', with: 'X' }, 'B, X & C'],
    ['A  1, B', { op: 'remove', item: 'A 1' }, 'B'],
  ] as const)('%j with %j is %j', (text, change, expected) => {
    expect(applyItems(text, [change])).toEqual({ text: expected, unmet: [] });
  });

  it.each([
    ['A; B', undefined, 'A; B; C'],
    ['A,B', undefined, 'A,B,C'],
    ['A\nB', undefined, 'A\nB\nC'],
    ['A and B', undefined, 'A and B and C'],
    ['A', undefined, 'A, C'],
    ['A', '; ', 'A; C'],
    ['', '; ', 'C'],
    ['none', undefined, 'C'],
    ['A,', undefined, 'A, C,'],
  ])('adds C to %j with the separator %j: %j', (text, separator, expected) => {
    expect(applyItems(text, [{ op: 'add', item: 'C' }], separator).text).toBe(expected);
  });

  it('takes the separator of the proposed text where the cell has none', () => {
    expect(applyItems('A', [{ op: 'add', item: 'C' }], undefined, 'A / B; C').text).toBe('A; C');
  });

  it('tells which entries it did not find, and does the rest', () => {
    const gone = { op: 'remove', item: 'X' } as const;
    const there = { op: 'add', item: 'A' } as const;
    const result = applyItems('A, B', [gone, there, { op: 'remove', item: 'B' }]);
    expect(result).toEqual({ text: 'A', unmet: [gone, there] });
  });

  const id = fc.stringMatching(/^[A-Z]{1,2}\d{1,3}$/);
  const separator = fc.constantFrom(', ', ',', '; ', '\n', ' and ', ' & ');

  it('removes exactly the entry named, in any list', () => {
    fc.assert(
      fc.property(fc.uniqueArray(id, { minLength: 1 }), separator, fc.nat(), (ids, between, pick) => {
        const gone = ids[pick % ids.length] ?? '';
        const { text } = applyItems(ids.join(between), [{ op: 'remove', item: gone }]);
        expect(text).toBe(ids.filter((each) => each !== gone).join(between));
      }),
    );
  });

  it('changes of different entries give the same in either order', () => {
    fc.assert(
      fc.property(fc.uniqueArray(id, { minLength: 3 }), separator, ([a = '', b = '', ...rest], between) => {
        const text = [a, b, ...rest].join(between);
        const changes = [
          { op: 'replace', item: a, with: 'new' },
          { op: 'remove', item: b },
        ] as const;
        expect(applyItems(text, changes).text).toBe(applyItems(text, [...changes].reverse()).text);
      }),
    );
  });
});
