import { expect, it } from 'vitest';
import { rowsSentence } from '@/components/cord/rows-sentence';

it('names each kind of row there is, and always the refused', () => {
  const rows = { read: 214, activities: 196, headings: 15, continued: 0, blank: 3, notes: 0, refused: 0 };
  expect(rowsSentence(rows, 'en-GB')).toBe(
    '214 rows read = 196 activities + 15 headings + 3 blank + 0 refused',
  );
});

it('writes one of a kind as one', () => {
  const rows = { read: 6, activities: 1, headings: 1, continued: 1, blank: 1, notes: 1, refused: 1 };
  expect(rowsSentence(rows, 'en-GB')).toBe(
    '6 rows read = 1 activity + 1 heading + 1 continued + 1 blank + 1 note + 1 refused',
  );
  expect(
    rowsSentence({ ...rows, read: 1, headings: 0, continued: 0, blank: 0, notes: 0, refused: 0 }, 'en-GB'),
  ).toBe('1 row read = 1 activity + 0 refused');
});
