import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { applyCorrections, composeAdoption, contentAt } from '@/lib/corrections';
import type { CellEdit } from '@/lib/schedule/edit';
import { deepFreeze, sheetOf } from './sheets';

const list = deepFreeze(
  sheetOf([
    ['ID', 'a', 'm', 'b', 'After'],
    ['A', 9, 5, 12, null],
    ['B', 1, 2, 3, 'A, Z9, Z8'],
  ]),
);
const set = (cell: string, to: CellEdit['to']): CellEdit => ({ sheet: 'List', cell, from: null, to });
const swap = { id: 'swap', edits: [set('B2', 5), set('C2', 9)] };
const cut = {
  id: 'cut',
  edits: [{ ...set('E3', 'A, Z8'), items: [{ op: 'remove', item: 'Z9' }] }],
} as const;
const rename = {
  id: 'rename',
  edits: [{ ...set('E3', 'A, Z9, B8'), items: [{ op: 'replace', item: 'Z8', with: 'B8' }] }],
} as const;

describe('composeAdoption', () => {
  it('merges fixes of one cell and says how the cell stood for each', () => {
    const { adopted, skipped, sheets } = composeAdoption([list], [swap, cut, rename]);
    expect(skipped).toEqual([]);
    expect(adopted.map(({ id }) => id)).toEqual(['swap', 'cut', 'rename']);
    expect(adopted[0]?.edits).toEqual([
      { ...set('B2', 5), from: 9 },
      { ...set('C2', 9), from: 5 },
    ]);
    expect(adopted[1]?.edits[0]).toMatchObject({ from: 'A, Z9, Z8', to: 'A, Z8' });
    expect(adopted[2]?.edits[0]).toMatchObject({ from: 'A, Z8', to: 'A, B8' });
    expect(contentAt(sheets, 'List', 'E3')).toBe('A, B8');
  });

  it('skips a fix that would overwrite, and keeps none of it', () => {
    const late = { id: 'late', edits: [set('D2', 20), set('C2', 7)] };
    const { adopted, skipped, sheets } = composeAdoption([list], [swap, late]);
    expect(adopted).toHaveLength(1);
    expect(skipped).toEqual([
      { id: 'late', reason: 'It would overwrite C2, which another of these corrections has just changed.' },
    ]);
    expect(contentAt(sheets, 'List', 'D2')).toBe(12);
  });

  it('skips a fix that sets a cell whose entries were just changed', () => {
    const { skipped } = composeAdoption([list], [cut, { id: 'set', edits: [set('E3', 'A')] }]);
    expect(skipped.map(({ id }) => id)).toEqual(['set']);
  });

  it.each([
    ['an entry that has gone', { ...cut, id: 'again' }, 'E3 no longer names “Z9”.'],
    ['what is so already', { id: 'again', edits: [set('C3', 2)] }, 'C3 holds “2” already.'],
    [
      'an unknown sheet',
      { id: 'again', edits: [{ ...set('C3', 2), sheet: 'X' }] },
      'There is no cell C3 on a sheet “X”.',
    ],
    ['nothing', { id: 'again', edits: [] }, 'It changes no cell.'],
  ])('skips a fix of %s', (_, fix, reason) => {
    expect(composeAdoption([list], [cut, fix]).skipped).toEqual([{ id: 'again', reason }]);
  });

  it('lets one fix change two entries of a cell', () => {
    const both = { id: 'both', edits: [cut.edits[0], rename.edits[0]] };
    expect(contentAt(composeAdoption([list], [both]).sheets, 'List', 'E3')).toBe('A, B8');
  });

  it('gives the sheets that applying what was adopted gives', () => {
    const cells = fc.constantFrom('B2', 'C2', 'E3', 'F7');
    const items = fc
      .subarray(['A', 'Z9', 'Z8'])
      .map((gone) => gone.map((item) => ({ op: 'remove' as const, item })));
    const edits = fc.oneof(
      fc.record({ cell: cells, to: fc.integer() }).map(({ cell, to }) => set(cell, to)),
      items.map((changes): CellEdit => ({ ...set('E3', null), items: changes })),
    );
    fc.assert(
      fc.property(fc.array(fc.array(edits, { maxLength: 3 }), { maxLength: 8 }), (fixes) => {
        const asked = fixes.map((each, index) => ({ id: String(index), edits: each }));
        const { adopted, skipped, sheets } = composeAdoption([list], asked);
        expect(adopted.length + skipped.length).toBe(fixes.length);
        expect(applyCorrections([list], adopted)).toEqual(sheets);
      }),
    );
  });

  it('takes thousands of fixes on many rows in linear time', () => {
    const rows = Array.from({ length: 20_000 }, (_, index) => [`A${index}`, 5, 'X; Y; Z']);
    const big = sheetOf(rows);
    const fixes = rows.flatMap((_, index) =>
      ['X', 'Y'].map((item) => ({
        id: `${index}${item}`,
        edits: [{ ...set(`C${index + 1}`, null), items: [{ op: 'remove' as const, item }] }],
      })),
    );
    const started = performance.now();
    const { adopted, sheets } = composeAdoption([big], fixes);
    expect(performance.now() - started).toBeLessThan(3000);
    expect(adopted).toHaveLength(40_000);
    expect(contentAt(sheets, 'List', 'C20000')).toBe('Z');
  });
});
