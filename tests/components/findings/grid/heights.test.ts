import { describe, expect, it } from 'vitest';
import { makeHeights, sameWidths } from '@/components/findings/grid/heights';
import { finding, fix } from '@/tests/support/findings';

const tenEach = (text: string) => text.length * 10;
const widths = { about: 322, message: 322, fix: 222, card: 322 };
const long = 'A sentence of words that go on and on. '.repeat(6).trim();

describe('the height of a row', () => {
  const heightOf = makeHeights('wide', widths, tenEach, 20);

  it('is that of its longest cell, and at most three lines', () => {
    const short = heightOf(finding(1, { message: 'Short.' }));
    expect(short).toBe(35);
    expect(heightOf(finding(1, { message: `Two lines ${'x'.repeat(25)}` }))).toBe(short + 20);
    expect(heightOf(finding(1, { message: long }))).toBe(short + 40);
  });

  it('has room for the notes under the state', () => {
    expect(heightOf(finding(1, { message: 'Short.', comments: 2 }))).toBe(55);
    expect(heightOf(finding(1, { message: 'Short.', comments: 2, fix: fix(2, { state: 'declined' }) }))).toBe(
      75,
    );
  });

  it('counts the activity as a line where it stands above the message, and all of it in a card', () => {
    const fair = makeHeights('fair', widths, tenEach, 20);
    const cards = makeHeights('cards', widths, tenEach, 20);
    expect(fair(finding(1, { message: 'Short.' }))).toBe(55);
    expect(cards(finding(1, { message: 'Short.' }))).toBe(104);
  });
});

it('keeps the widths it has where nothing differs', () => {
  expect(sameWidths(widths, { ...widths })).toBe(widths);
  expect(sameWidths(widths, { ...widths, fix: 1 })).not.toBe(widths);
  expect(sameWidths({}, widths)).toBe(widths);
});
