import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { isOneEdit, lessOne } from '@/lib/audit/support/edit-distance';

/** The distance by its definition: deletions, insertions, substitutions, exchanges of neighbours. */
function distance(one: string, other: string): number {
  const rows = Array.from({ length: one.length + 1 }, () => new Array<number>(other.length + 1).fill(0));
  const at = (i: number, j: number) => rows[i]?.[j] ?? Infinity;
  for (let i = 0; i <= one.length; i++) {
    for (let j = 0; j <= other.length; j++) {
      const same = one[i - 1] === other[j - 1] ? 0 : 1;
      const exchanged = i > 1 && j > 1 && one[i - 1] === other[j - 2] && one[i - 2] === other[j - 1];
      rows[i]![j] =
        i === 0 || j === 0
          ? i + j
          : Math.min(
              at(i - 1, j) + 1,
              at(i, j - 1) + 1,
              at(i - 1, j - 1) + same,
              exchanged ? at(i - 2, j - 2) + 1 : Infinity,
            );
    }
  }
  return at(one.length, other.length);
}

const word = fc.string({ unit: fc.constantFrom('a', 'b', '1', '-'), maxLength: 6 });

describe('isOneEdit', () => {
  it('agrees with the distance by its definition', () => {
    fc.assert(
      fc.property(word, word, (one, other) => isOneEdit(one, other) === (distance(one, other) === 1)),
      { numRuns: 2000 },
    );
  });

  it('of two texts one edit apart, both lack one character to the same text', () => {
    fc.assert(
      fc.property(word, word, (one, other) => {
        fc.pre(isOneEdit(one, other));
        return [...lessOne(one)].some((text) => lessOne(other).has(text));
      }),
      { numRuns: 2000 },
    );
  });

  it('is not the text itself', () => {
    expect(isOneEdit('A1', 'A1')).toBe(false);
    expect(isOneEdit('', 'A')).toBe(true);
  });
});
