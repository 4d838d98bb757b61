import { describe, expect, it } from 'vitest';
import { parseAddress } from '@/lib/schedule/cell';
import { staleFormulas } from '@/parsers/workbook/xlsx/dependents';
import type { FormulaCell } from '@/parsers/workbook/xlsx/formulas';

const at = (address: string) => parseAddress(address) ?? { row: 0, column: 0 };
const formula = (address: string, text: string): FormulaCell => {
  const { row, column } = at(address);
  const area = { top: row, bottom: row, left: column, right: column };
  return { row, column, text, kind: 'own', group: '', leads: false, area };
};
const book = { names: new Map<string, string[]>(), tables: [] };

function stale(formulas: Record<string, string>, ...changed: string[]): string[] {
  const all = Object.entries(formulas).map(([address, text]) => [address, formula(address, text)] as const);
  const sheets = [{ sheet: 'List', formulas: all.map(([, each]) => each) }];
  const found = staleFormulas(
    sheets,
    changed.map((address) => ({ sheet: 'List', ...at(address) })),
    book,
  ).get('List');
  return all.filter(([, each]) => found?.has(each)).map(([address]) => address);
}

describe('formulas whose results no longer hold', () => {
  it('follows formulas that read formulas', () => {
    expect(stale({ B1: 'A1', C1: 'B1*2', D1: 'C1', E1: 'A2' }, 'A1')).toEqual(['B1', 'C1', 'D1']);
  });

  it('finds small and large ranges, other sheets not', () => {
    expect(stale({ B1: 'SUM(A1:A3)', B2: 'SUM(A1:A900)', B3: 'SUM(A4:A900)', B4: 'Other!A2' }, 'A2')).toEqual(
      ['B1', 'B2'],
    );
  });

  it('ends where formulas read one another in a ring', () => {
    expect(stale({ A1: 'B1+C1', B1: 'A1' }, 'C1')).toEqual(['A1', 'B1']);
  });

  it('counts those in whose text the cells do not show', () => {
    expect(stale({ A1: 'INDIRECT("B"&1)', A2: 'A1+1', A3: 'B9' }, 'C1')).toEqual(['A1', 'A2']);
  });

  it('takes a running total over thousands of rows', () => {
    const totals = Object.fromEntries(
      Array.from({ length: 4000 }, (_, i) => [`B${i + 1}`, `SUM(A$1:A${i + 1})`]),
    );
    expect(stale(totals, 'A3999')).toEqual(['B3999', 'B4000']);
  });
});
