import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { DEFAULT_READING } from '@/lib/schedule/activity-list';
import { RELATIONS } from '@/lib/schedule/relation';
import { IdBook } from '@/parsers/cells/id-book';
import { type LinkContext, readLinks, SEPARATOR } from '@/parsers/cells/links';

function context(...ids: string[]): LinkContext {
  const book = new IdBook(SEPARATOR);
  for (const id of ids) book.add(id, `Work of ${id}`);
  return { ids: book, unit: 'day', options: DEFAULT_READING };
}
/** Each entry as `ID relation lag`, or `?` where it cannot be read. */
const read = (text: string, ...ids: string[]) =>
  readLinks(text, context(...(ids.length > 0 ? ids : ['A', 'B', 'C', '7', '10', 'D-1', 'D-2']))).items.map(
    ({ link }) => (link ? `${link.id} ${link.type} ${link.lag}` : '?'),
  );
const readings = (text: string, ...ids: string[]) =>
  readLinks(text, context(...(ids.length > 0 ? ids : ['A', 'B', 'C', 'D']))).items.map(
    (item) => item.readings,
  );

describe('entries and what separates them', () => {
  it.each([
    ['A,B', 'A FS 0|B FS 0'],
    ['A; B ;C', 'A FS 0|B FS 0|C FS 0'],
    ['A\nB\r\nC', 'A FS 0|B FS 0|C FS 0'],
    ['A and B', 'A FS 0|B FS 0'],
    ['A AND B & C', 'A FS 0|B FS 0|C FS 0'],
    ['A&B', 'A FS 0|B FS 0'],
    ['A, B, and C', 'A FS 0|B FS 0|C FS 0'],
    ['A,,B,', 'A FS 0|B FS 0'],
    ['A B', 'A FS 0|B FS 0'],
    ['A SS+2 B FF-1', 'A SS 2|B FF -1'],
    ['\u00a0A\u00a0,\u200bB ', 'A FS 0|B FS 0'],
    ['7.0', '7 FS 0'],
    ['7,10', '7 FS 0|10 FS 0'],
  ])('%j', (text, expected) => expect(read(text).join('|')).toBe(expected));

  it.each(['', ' ', '-', '\u2013', '\u2014', 'none', 'None', 'N/A', 'n/a', 'nil', '--'])(
    'nothing: %j',
    (text) => expect(read(text)).toEqual([]),
  );

  it('keeps each entry as written, and what stands between', () => {
    const { items, separator } = readLinks('A SS+2 ;  B', context('A', 'B'));
    expect(items.map(({ text }) => text)).toEqual(['A SS+2', 'B']);
    expect(separator).toBe(' ;  ');
    expect(readLinks('A B', context('A', 'B')).separator).toBe(' ');
    expect(readLinks('A', context('A', 'B')).separator).toBeNull();
  });
});

describe('relation and lag', () => {
  it.each([
    ['B SS', 'B SS 0'],
    ['B SS+3', 'B SS 3'],
    ['B FF-2', 'B FF -2'],
    ['B FS+1.5', 'B FS 1.5'],
    ['B FS+1,5', 'B FS 1.5'],
    ['BSS+3', 'B SS 3'],
    ['B:SS+3', 'B SS 3'],
    ['B: SS + 3', 'B SS 3'],
    ['B FS + 2 d', 'B FS 2'],
    ['B FS+2w', 'B FS 10'],
    ['B FS+16 hrs', 'B FS 2'],
    ['B+3', 'B FS 3'],
    ['B + 3d', 'B FS 3'],
    ['B ff\u22122', 'B FF -2'],
    ['B sf', 'B SF 0'],
    ['B (SS+3)', 'B SS 3'],
    ['B FS-0', 'B FS 0'],
    ['7FS', '7 FS 0'],
    ['7SS+1', '7 SS 1'],
    ['A FS+1,5, B', 'A FS 1.5|B FS 0'],
    ['A FS+1,7', 'A FS 1|7 FS 0'],
    ['A FS+1, 5', 'A FS 1|5 FS 0'],
  ])('%s', (text, expected) => expect(read(text).join('|')).toBe(expected));

  it('have the unit of the durations where they state none', () => {
    const hours = { ...context('A'), unit: 'hour' as const };
    expect(readLinks('A FS+16', hours).items[0]?.link?.lag).toBe(2);
    expect(readLinks('A FS+2 d', hours).items[0]?.link?.lag).toBe(2);
  });
});

describe('what is literally an ID is that ID', () => {
  it.each([
    ['Pour and cure', ['Pour and cure', 'Pour', 'cure'], 'Pour and cure FS 0'],
    ['Pour and cure SS+2, Pour', ['Pour and cure', 'Pour', 'cure'], 'Pour and cure SS 2|Pour FS 0'],
    ['A, B', ['A, B', 'A', 'B'], 'A, B FS 0'],
    ['A, B; A', ['A, B', 'A', 'B'], 'A, B FS 0|A FS 0'],
    ['B SS', ['B SS', 'B'], 'B SS FS 0'],
    ['BSS+3', ['BSS', 'B'], 'BSS FS 3'],
    ['B+3', ['B+3', 'B'], 'B+3 FS 0'],
    ['B-3', ['B-3', 'B'], 'B-3 FS 0'],
    ['B-3 FF-1', ['B-3', 'B'], 'B-3 FF -1'],
    ['None', ['None', 'A'], 'None FS 0'],
    ['-', ['-', 'A'], '- FS 0'],
    ['ACT 10 ACT 20', ['ACT 10', 'ACT 20'], 'ACT 10 FS 0|ACT 20 FS 0'],
    ['1.2 FS', ['1.2', '1'], '1.2 FS 0'],
    ['a & b', ['a & b', 'a', 'b'], 'a & b FS 0'],
  ])('%s among %j', (text, ids, expected) => expect(read(text, ...ids).join('|')).toBe(expected));
});

describe('an ID that is not in the list', () => {
  it.each([
    ['Z9', 'Z9 FS 0'],
    ['b', 'b FS 0'],
    ['Z9 SS+3', 'Z9 SS 3'],
    ['Z9:FF', 'Z9 FF 0'],
    ['Z9SS+3', 'Z9 SS 3'],
    ['Z9+2', 'Z9 FS 2'],
    ['D-9', 'D-9 FS 0'],
    ['D-9 FS-1', 'D-9 FS -1'],
    ['BOSS', 'BOSS FS 0'],
    ['1.5', '1.5 FS 0'],
    ['A, Z9 and B', 'A FS 0|Z9 FS 0|B FS 0'],
  ])('%s stays as written', (text, expected) => expect(read(text).join('|')).toBe(expected));

  it('may have blanks where the IDs of the list have', () => {
    expect(read('ACT 99', 'ACT 10', 'ACT 20')).toEqual(['ACT 99 FS 0']);
    expect(read('see note', 'ACT 10', 'ACT 20')).toEqual(['?']);
  });

  it('may be one of the list with a blank slipped in', () => {
    expect(read('z 9', 'Z9', 'Z8')).toEqual(['z 9 FS 0']);
    expect(read('Z 9 SS+1, Z8', 'Z9', 'Z8')).toEqual(['Z 9 SS 1', 'Z8 FS 0']);
    expect(read('note 4', 'Z9', 'Z8')).toEqual(['?']);
  });

  it('is told from a lead by how the IDs of the list are built', () => {
    expect(read('B-2', 'B', 'B-1', 'B-3')).toEqual(['B-2 FS 0']);
    expect(read('B-2', 'B', 'C')).toEqual(['B FS -2']);
  });
});

describe('what cannot be read', () => {
  it.each([
    ['B SX+3', ['B SS+3', 'B SF+3']],
    ['B SS+', ['B SS']],
    ['B SS 3', ['B SS+3']],
    ['B SS+3x', ['B SS+3']],
    ['B S.S.+3', ['B SS+3']],
    ['B FSS', ['B FS', 'B SS']],
    ['SS B', ['B SS']],
    ['B start-to-start + 3', ['B SS+3']],
    ['A-C', ['A, B, C', 'A, C']],
    ['A to C', ['A, B, C', 'A, C']],
    ['A/B', ['A, B']],
    ['A or B', ['A, B']],
    ['A+B', ['A, B']],
    ['work of c', ['C']],
    ['after B', ['B']],
    ['B FS+50%', []],
    ['B FS+2 mo', []],
    ['see note', []],
    ['all of the above works', []],
  ])('%s, with its readings', (text, expected) => {
    expect(read(text, 'A', 'B', 'C', 'D')).toEqual(['?']);
    expect(readings(text)).toEqual([expected]);
  });

  it('takes nothing else of the cell with it', () => {
    expect(read('A, B SX+3; C', 'A', 'B', 'C')).toEqual(['A FS 0', '?', 'C FS 0']);
  });

  it('costs no more than its length', () => {
    const prose = 'A '.repeat(15_000);
    const start = performance.now();
    readLinks(prose.replaceAll(' ', ', '), context('A', 'B, C, D'));
    readLinks(`x ${prose}`, context('A', 'B'));
    readLinks('A+'.repeat(10_000), context('A', 'B'));
    expect(performance.now() - start).toBeLessThan(2000);
  });
});

it('reads back whatever is written in the notation', () => {
  const ids = ['A', 'A1', 'A 2', 'B-3', '10', '007', 'SS', 'S and T', 'x+1', 'a.b', 'FS-1', 'P, Q'];
  const item = fc.record({
    id: fc.constantFrom(...ids),
    type: fc.constantFrom(...RELATIONS),
    lag: fc.constantFrom(0, 1, 2.5, -1, -12, 100),
  });
  const style = fc.record({
    separator: fc.constantFrom(', ', ';', '\n', ' and ', ' & ', ','),
    before: fc.constantFrom(' ', ':', ': ', ' : '),
    spaced: fc.boolean(),
    lower: fc.boolean(),
  });
  fc.assert(
    fc.property(
      fc.array(item, { minLength: 1, maxLength: 6 }),
      style,
      (items, { separator, before, spaced, lower }) => {
        const text = items
          .map(({ id, type, lag }) => {
            const relation = lower ? type.toLowerCase() : type;
            const sign = lag < 0 ? '-' : '+';
            const tail = lag === 0 ? '' : spaced ? ` ${sign} ${Math.abs(lag)}` : `${sign}${Math.abs(lag)}`;
            return `${id}${before}${relation}${tail}`;
          })
          .join(separator);
        const found = readLinks(text, context(...ids)).items.map(({ link }) => link);
        expect(found).toEqual(items);
      },
    ),
    { numRuns: 2000 },
  );
});
