import { expect, it } from 'vitest';
import { countByFinding, threadOf, withComment } from '@/lib/client/comments';
import { comment, id } from '@/tests/support/findings';

const early = comment(1, { finding: id(50), at: '2027-03-09T10:12:00.000Z' });
const late = comment(2, { finding: id(50), at: '2027-03-09T10:40:00.000Z' });
const other = comment(3, { finding: id(51) });
const loose = comment(4);

it('gives a finding its own thread, oldest first', () => {
  expect(threadOf([late, other, early, loose], id(50))).toEqual([early, late]);
});

it('counts by finding, and leaves out what is about no finding', () => {
  expect(countByFinding([late, other, early, loose])).toEqual(
    new Map([
      [id(50), 2],
      [id(51), 1],
    ]),
  );
});

it('takes a comment in once, though both the answer and the event bring it', () => {
  const once = withComment({ items: [early] }, late);
  expect(once.items).toEqual([early, late]);
  expect(withComment(once, late)).toBe(once);
});
