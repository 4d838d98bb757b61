import { describe, expect, it } from 'vitest';
import { applyCorrections, contentAt } from '@/lib/corrections';
import type { CellContent } from '@/lib/schedule/sheet';
import { ErrorValue } from '@/lib/schedule/sheet';
import { deepFreeze, sheetOf } from './sheets';

const edit = (cell: string, to: CellContent, sheet = 'List') => ({ sheet, cell, from: null, to });

describe('applyCorrections', () => {
  const list = deepFreeze(
    sheetOf([
      ['ID', 'm', 'After'],
      ['A', 4, null],
      ['B', 5, 'A; Z9; Z8'],
      null,
      ['C', '6,5', 7],
      ['D', 'ten', new ErrorValue('#REF!')],
    ]),
  );

  it('copies only what it writes to', () => {
    const other = sheetOf([['x']], { name: 'Other' });
    const [corrected, same] = applyCorrections([list, other], [edit('B3', 8)]);
    expect(same).toBe(other);
    expect(corrected?.rows[0]).toBe(list.rows[0]);
    expect(corrected?.rows[2]?.cells).toEqual(['B', 8, 'A; Z9; Z8']);
    expect(list.rows[2]?.cells[1]).toBe(5);
    expect(applyCorrections([list], [])[0]).toBe(list);
  });

  it('applies the entries of one cell one after the other', () => {
    const first = { ...edit('C3', 'x'), items: [{ op: 'replace', item: 'Z9', with: 'A2' }] } as const;
    const second = { ...edit('C3', 'y'), items: [{ op: 'remove', item: 'Z8' }] } as const;
    expect(contentAt(applyCorrections([list], [first, second]), 'List', 'C3')).toBe('A; A2');
    expect(contentAt(applyCorrections([list], [{ edits: [second] }]), 'List', 'C3')).toBe('A; Z9');
  });

  it('leaves an empty cell where the last entry goes', () => {
    const gone = { ...edit('C5', null), items: [{ op: 'remove', item: '7' }] } as const;
    expect(contentAt(applyCorrections([list], [gone]), 'List', 'C5')).toBeNull();
  });

  it('keeps a predecessor that is a number a number', () => {
    const other = { ...edit('C5', '8'), items: [{ op: 'replace', item: '7', with: '8' }] } as const;
    const more = { ...edit('C5', '7, 8'), items: [{ op: 'add', item: '8' }] } as const;
    expect(contentAt(applyCorrections([list], [other]), 'List', 'C5')).toBe(8);
    expect(contentAt(applyCorrections([list], [more]), 'List', 'C5')).toBe('7, 8');
  });

  it.each([
    ['B3', '12', 12],
    ['B3', '007', '007'],
    ['B5', 3.5, '3,5'],
    ['B6', 10, 10],
    ['A2', '5', '5'],
  ])('%s set to %j holds %j', (cell, to, held) => {
    expect(contentAt(applyCorrections([list], [edit(cell, to)]), 'List', cell)).toBe(held);
  });

  it('writes numbers as text where the column keeps them so', () => {
    const csv = sheetOf([['m'], ['1,5'], ['2'], [null]]);
    expect(contentAt(applyCorrections([csv], [edit('A4', 2.25)]), 'List', 'A4')).toBe('2,25');
  });

  it('adds columns and rows beyond what is there, in order', () => {
    const [corrected] = applyCorrections([list], [edit('E4', 'new'), edit('B9', 1), edit('E2', 'x')]);
    expect(corrected?.rows.map((row) => row.number)).toEqual([1, 2, 3, 4, 5, 6, 9]);
    expect(corrected?.rows[3]?.cells).toEqual([null, null, null, null, 'new']);
    expect(corrected?.rows[1]?.cells).toEqual(['A', 4, null, null, 'x']);
    expect(corrected?.columnCount).toBe(5);
  });

  it('drops the formula of a cell that it sets, and no other', () => {
    const formulas = new Map([
      ['B2', { text: 'A1*2', hasResult: true }],
      ['B3', { text: 'A1*3', hasResult: true }],
    ]);
    const [corrected] = applyCorrections([{ ...list, formulas }], [edit('B2', 8)]);
    expect([...(corrected?.formulas.keys() ?? [])]).toEqual(['B3']);
    expect(formulas.size).toBe(2);
  });

  it('leads a covered cell to the top-left one of its merged range', () => {
    const merges = [
      { top: 2, left: 0, bottom: 3, right: 1 },
      { top: 5, left: 2, bottom: 900, right: 2 },
    ];
    const [corrected] = applyCorrections([{ ...list, merges }], [edit('B3', 'x'), edit('C700', 'y')]);
    expect(corrected?.rows[1]?.cells[0]).toBe('x');
    expect(corrected?.rows[3]?.cells[2]).toBe('y');
  });

  it('passes over what is not there', () => {
    const strays = [edit('B3', 8, 'No such'), edit('nowhere', 8)];
    expect(applyCorrections([list], strays)[0]).toBe(list);
    expect(contentAt([list], 'List', 'C6')).toBe('#REF!');
    expect(contentAt([list], 'No such', 'C6')).toBeNull();
  });
});
