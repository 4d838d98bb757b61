import { expect, it } from 'vitest';
import { isoDate, nameOf } from '@/lib/contract/shared';

const name = nameOf('Give it a name.', 10);

it('keeps of a name what can be seen', () => {
  expect(name.parse('  North\u0000\u001b bay\t')).toBe('North bay');
  expect(name.parse('\u202Egpj.exe')).toBe('gpj.exe');
  expect(name.parse('a\uD800b')).toBe('a\uFFFDb');
  expect(name.parse('القناة')).toBe('القناة');
});

it('refuses a name in which nothing can be seen, and one that is too long', () => {
  const messageOf = (text: string) => name.safeParse(text).error?.issues.map(({ message }) => message);
  expect(messageOf(' \u0000 ')).toEqual(['Give it a name.']);
  expect(messageOf('x'.repeat(11))).toEqual(['Use at most 10 characters.']);
});

it('takes dates that the calendar has', () => {
  expect(isoDate.safeParse('0001-01-01').success).toBe(true);
  for (const none of ['0000-01-01', '2027-02-29', '2027-1-1', '12/03/2027']) {
    expect(isoDate.safeParse(none).success, none).toBe(false);
  }
});
