import { describe, expect, it } from 'vitest';
import { linkEdit, withId } from '@/lib/audit/support/link-edits';
import { removeLinks } from '@/lib/audit/support/link-fixes';
import type { LinkCell } from '@/lib/schedule/activity';
import { list } from '@/tests/support/networks';

const cell = (text: string, items: string[], more: Partial<LinkCell> = {}): LinkCell => ({
  owner: 0,
  gives: 'predecessors',
  cell: { sheet: 'Plan', row: 4, column: 6 },
  text,
  content: text,
  items: items.map((item) => ({ text: item, link: null, readings: [] })),
  separator: ', ',
  error: null,
  ...more,
});

describe('linkEdit', () => {
  it('says the change entry by entry, and as the new text', () => {
    expect(linkEdit(cell('A; B  SS', ['A', 'B  SS']), [{ op: 'replace', item: 'A', with: 'C' }])).toEqual({
      sheet: 'Plan',
      cell: 'G4',
      from: 'A; B  SS',
      to: 'C; B  SS',
      items: [{ op: 'replace', item: 'A', with: 'C' }],
    });
  });

  it('adds with what stands between the others', () => {
    const edit = linkEdit(cell('A; B', ['A', 'B'], { separator: '; ' }), [{ op: 'add', item: 'C' }]);
    expect(edit).toMatchObject({ to: 'A; B; C', separator: '; ' });
    const lines = linkEdit(cell('A\nB', ['A', 'B'], { separator: '\n' }), [{ op: 'add', item: 'C' }]);
    expect(lines.to).toBe('A\nB\nC');
  });

  it.each(['-', '–', 'none', 'n/a', 'nil', ''])('puts the first entry in place of “%s”', (text) => {
    expect(linkEdit(cell(text, []), [{ op: 'add', item: 'A' }]).to).toBe('A');
  });

  it('keeps a number a number, and empties the cell with its last entry', () => {
    const number = cell('7', ['7'], { content: 7 });
    expect(linkEdit(number, [{ op: 'replace', item: '7', with: '8' }])).toMatchObject({ from: 7, to: 8 });
    expect(linkEdit(number, [{ op: 'replace', item: '7', with: '007' }]).to).toBe('007');
    expect(linkEdit(number, [{ op: 'remove', item: '7' }]).to).toBeNull();
  });

  it('writes a cell anew whose entries nothing but blanks divide', () => {
    const blanks = cell('A B C', ['A', 'B', 'C'], { separator: ' ' });
    const edit = linkEdit(blanks, [{ op: 'remove', item: 'B' }]);
    expect(edit).toEqual({ sheet: 'Plan', cell: 'G4', from: 'A B C', to: 'A, C' });
    expect(linkEdit(blanks, [{ op: 'replace', item: 'C', with: 'D' }]).to).toBe('A, B, D');
  });
});

describe('removeLinks', () => {
  it('makes one edit a cell', () => {
    const fix = removeLinks(list('A 1', 'B 1 <- A, C, D', 'E 1 <- A'), [0, 2, 3], 'Because.');
    expect(fix?.edits.map(({ cell: address, to }) => [address, to])).toEqual([
      ['F3', 'C'],
      ['F4', null],
    ]);
    expect(fix?.changes).toHaveLength(3);
  });
});

describe('withId', () => {
  it('keeps the relation and the lag as written', () => {
    expect(withId(cell('', []), 'Z9 : SS + 2d', 'Z9', 'Z6')).toBe('Z6 : SS + 2d');
    expect(withId(cell('', []), 'z 9', 'Z9', 'Z6')).toBe('Z6');
  });
});
