import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { linesOf, remembering } from '@/components/findings/row-height';

/** A typeface in which every letter is 10 px wide. */
const tenEach = (text: string) => text.length * 10;

describe('how many lines a text takes', () => {
  it('breaks between words', () => {
    expect(linesOf('one two', 70, tenEach)).toBe(1);
    expect(linesOf('one two', 69, tenEach)).toBe(2);
    expect(linesOf('one two three four', 80, tenEach)).toBe(3);
    expect(linesOf('', 80, tenEach)).toBe(1);
  });

  it('breaks inside a word that is wider than the column', () => {
    expect(linesOf('abcdefghij', 40, tenEach)).toBe(3);
    expect(linesOf('ab cdefghijkl', 40, tenEach)).toBe(4);
  });

  it('never takes fewer lines in a narrower column', () => {
    const words = fc.array(fc.string({ minLength: 1, maxLength: 9 }), { minLength: 1, maxLength: 12 });
    fc.assert(
      fc.property(
        words,
        fc.integer({ min: 90, max: 300 }),
        fc.integer({ min: 0, max: 200 }),
        (text, width, more) => {
          const joined = text.join(' ');
          expect(linesOf(joined, width, tenEach)).toBeGreaterThanOrEqual(
            linesOf(joined, width + more, tenEach),
          );
        },
      ),
    );
  });
});

it('measures each text once', () => {
  let asked = 0;
  const measure = remembering((text) => {
    asked += 1;
    return text.length;
  });
  expect([measure('pile'), measure('pile'), measure('cap')]).toEqual([4, 4, 3]);
  expect(asked).toBe(2);
});
