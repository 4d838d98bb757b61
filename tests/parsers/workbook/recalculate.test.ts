import { describe, expect, it } from 'vitest';
import { applyCorrections, contentAt } from '@/lib/corrections';
import type { CellContent } from '@/lib/schedule/sheet';
import { detectMatching, readActivityList, readSheets } from '@/parsers';
import { giveBack, recalculate } from '@/parsers/workbook';
import { handMade } from '../../support/xlsx';

/** D and E rest on C in several ways; G3 rests on nothing. */
const FORMULAS: Readonly<Record<string, readonly [formula: string, stored: number]>> = {
  D3: ['ROUND(C3*1.5,0)', 6],
  E3: ['D3+2', 8],
  C4: ['MAX(C3,2)', 4],
  D4: ['SUM(C3:D3)', 7],
  E4: ['IF(C3>3,20,12)', 20],
  G3: ['1+1', 99],
};
const VALUES: readonly (readonly CellContent[])[] = [
  ['ID', 'Activity', 'a', 'm', 'b', 'Predecessors', 'Rank'],
  ['A', 'Dig', 1, 2, 4, null, null],
  ['B', 'Pour', 4, null, null, 'A', null],
  ['C', 'Cure', null, null, null, 'B', null],
];

function workbook(): Uint8Array {
  const rows = VALUES.map((cells, i) => {
    const markup = cells.map((value, column) => {
      const address = `${'ABCDEFG'.charAt(column)}${i + 1}`;
      const [formula, stored] = FORMULAS[address] ?? [];
      if (formula) return `<c r="${address}"><f>${formula.replace('>', '&gt;')}</f><v>${stored}</v></c>`;
      if (typeof value === 'number') return `<c r="${address}"><v>${value}</v></c>`;
      return value === null ? '' : `<c r="${address}" t="inlineStr"><is><t>${value}</t></is></c>`;
    });
    return `<row r="${i + 1}">${markup.join('')}</row>`;
  });
  return handMade({ sheets: [{ name: 'Works', rows: rows.join('') }] });
}

const edit = { sheet: 'Works', cell: 'C3', from: 4, to: 3 };

describe('formulas that rest on a corrected cell', () => {
  const received = readSheets(workbook(), 'works.xlsx');
  const corrected = applyCorrections(received, [edit]);
  const { sheets, results } = recalculate(received, corrected);
  const at = (cell: string) => contentAt(sheets, 'Works', cell);

  it('are worked out anew, one after the other', () => {
    expect(['D3', 'E3', 'C4', 'D4'].map(at)).toEqual([5, 7, 3, 8]);
  });

  it('keep the result they had where they are more than arithmetic, as do those that rest on other cells', () => {
    expect(['E4', 'G3'].map(at)).toEqual([20, 99]);
    expect([...(results.get('Works')?.keys() ?? [])].sort()).toEqual(['C4', 'D3', 'D4', 'E3']);
  });

  it('leave what was received as it was, and every sheet where nothing changed', () => {
    expect(contentAt(received, 'Works', 'D3')).toBe(6);
    expect(recalculate(received, received).sheets[0]).toBe(received[0]);
  });

  it('are worked out again when the correction is withdrawn', () => {
    const back = applyCorrections(sheets, [{ ...edit, from: 3, to: 4 }]);
    expect(
      ['D3', 'E3', 'C4', 'D4'].map((cell) => contentAt(recalculate(sheets, back).sheets, 'Works', cell)),
    ).toEqual([6, 8, 4, 10]);
  });

  it('hold their new results in the workbook given back, which then reads as the list does here', () => {
    const given = giveBack({ bytes: workbook(), fileName: 'works.xlsx', corrections: [edit], changes: [] });
    const again = readSheets(given.bytes, 'works.xlsx');
    const { matching } = detectMatching(received);
    const estimates = (from: typeof again) =>
      readActivityList(from, matching).activities.map(({ id, optimistic, likely, pessimistic }) => [
        id,
        ...[optimistic, likely, pessimistic].map(({ days }) => days),
      ]);
    const [first, second] = [estimates(sheets), estimates(again)];
    expect(second.slice(0, 2)).toEqual(first.slice(0, 2));
    // What could not be worked out here is left to the spreadsheet, and says so until it is opened there.
    expect(first[2]).toEqual(['C', 3, 8, 20]);
    expect(second[2]).toEqual(['C', 3, 8, null]);
  });
});
