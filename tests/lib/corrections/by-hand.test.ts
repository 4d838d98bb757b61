import { describe, expect, it } from 'vitest';
import { checkHandEdits } from '@/lib/corrections';
import type { CellContent } from '@/lib/schedule/sheet';
import { sheetOf } from './sheets';

const list = sheetOf(
  [
    ['ID', 'm'],
    ['A', 4],
    ['B', null],
  ],
  { merges: [{ top: 5, left: 0, bottom: 6, right: 0 }] },
);
const check = (cell: string, to: CellContent, sheet = 'List') =>
  checkHandEdits([list], [{ sheet, cell, to }]);

describe('checkHandEdits', () => {
  it('says what the cell held, and keeps numbers numbers', () => {
    expect(check('b2', '6').edits).toEqual([{ sheet: 'List', cell: 'B2', from: 4, to: 6 }]);
    expect(check('B3', '6').edits[0]?.to).toBe(6);
    expect(check('A3', '6').edits[0]?.to).toBe('6');
    expect(check('B2', '').edits[0]?.to).toBeNull();
    expect(check('Z99', 'far out').edits[0]).toMatchObject({ cell: 'Z99', from: null });
  });

  it.each([
    ['B2', 1, 'No such', 'edits.0.sheet', 'There is no sheet “No such” in this file.'],
    ['2B', 1, 'List', 'edits.0.cell', '“2B” is no address of a cell, such as G23.'],
    ['B1048577', 1, 'List', 'edits.0.cell', 'B1048577 lies outside the sheet.'],
    ['XFE1', 1, 'List', 'edits.0.cell', 'XFE1 lies outside the sheet.'],
    ['A6', 1, 'List', 'edits.0.cell', 'A6 is covered by the merged cell A5; change that one.'],
    ['B2', Infinity, 'List', 'edits.0.to', 'A number must be finite.'],
    ['B2', 'x'.repeat(32_768), 'List', 'edits.0.to', 'A cell holds at most 32 767 characters.'],
    ['B2', 'bell\u0007', 'List', 'edits.0.to', 'This text has a character that a workbook cannot hold.'],
    ['B2', 'half \ud83d', 'List', 'edits.0.to', 'This text has a character that a workbook cannot hold.'],
    ['B2', 4, 'List', 'edits.0.to', 'B2 holds this already.'],
  ] as const)('refuses %s := %j on %s', (cell, to, sheet, path, message) => {
    expect(check(cell, to, sheet)).toEqual({ edits: [], problems: [{ path, message }] });
  });

  it('takes tabs, line breaks and characters beyond the basic plane', () => {
    expect(check('B2', 'a\tb\nc 🙂').problems).toEqual([]);
  });

  it('refuses all where one is wrong, and a cell sent twice', () => {
    const twice = [
      { sheet: 'List', cell: 'B2', to: 7 },
      { sheet: 'List', cell: 'b2', to: 8 },
    ];
    const { edits, problems } = checkHandEdits([list], twice);
    expect(edits).toEqual([]);
    expect(problems).toEqual([{ path: 'edits.1.cell', message: 'B2 is changed twice; send it once.' }]);
  });
});
