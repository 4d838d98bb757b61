import { describe, expect, it } from 'vitest';
import { list } from '@/tests/support/networks';
import { found, sentence } from '../helpers';

/** So many rows with a = 0.8 m and b = 1.25 m, then so many with spreads of their own. */
function rows(copied: number, own: number): string[] {
  const of = (i: number, a: number, m: number, b: number) =>
    `T${i} ${a} ${m} ${b}${i === 1 ? '' : ` <- T${i - 1}`}`;
  return [
    ...Array.from({ length: copied }, (_, i) => of(i + 1, 0.8 * (i + 4), i + 4, 1.25 * (i + 4))),
    ...Array.from({ length: own }, (_, i) => of(copied + i + 1, 1, i + 3, 2 * i + 17)),
  ];
}

describe('copied-spread', () => {
  it('is one finding where 80 % of the rows have the same pair', () => {
    const [finding, ...more] = found('copied-spread', list(...rows(8, 2)));
    expect(more).toEqual([]);
    expect(finding).toMatchObject({ weight: 'query', key: 'copied-spread|list', row: null });
    expect(sentence(finding!)).toBe(
      'a is 80 % and b is 125 % of m on 8 of 10 rows; these are not separate judgements.',
    );
    expect(finding).not.toHaveProperty('fix');
  });

  it('says nothing below the limits', () => {
    expect(found('copied-spread', list(...rows(7, 3)))).toEqual([]);
    expect(found('copied-spread', list(...rows(9, 0)))).toEqual([]);
    expect(found('copied-spread', list(...rows(10, 0)))).toHaveLength(1);
  });

  it('holds a list to the limits of the rule book', () => {
    const book = { 'copied-spread': { limits: { share: 60, activities: 5 } } };
    expect(found('copied-spread', list(...rows(3, 2)), book)).toHaveLength(1);
  });

  it('says nothing where m is the same on every row', () => {
    const same = Array.from({ length: 12 }, (_, i) => `T${i} 4 5 7`);
    expect(found('copied-spread', list(...same))).toEqual([]);
  });

  it('leaves rows without a spread to that rule, and milestones out of the share', () => {
    const level = Array.from({ length: 12 }, (_, i) => `T${i} ${i + 1} ${i + 1} ${i + 1}`);
    expect(found('copied-spread', list(...level))).toEqual([]);
    const milestones = Array.from({ length: 20 }, (_, i) => `M${i} 0 0 0`);
    expect(found('copied-spread', list(...rows(10, 0), ...milestones))).toHaveLength(1);
  });
});
