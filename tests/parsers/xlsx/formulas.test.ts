import { describe, expect, it } from 'vitest';
import { readXlsx } from '@/parsers/xlsx';
import { shiftFormula } from '@/parsers/xlsx/formula';
import { handMade, valuesOf } from '../../support/xlsx';

const read = (...sheets: string[]) =>
  readXlsx(
    handMade({ sheets: sheets.map((rows, i) => ({ name: i === 0 ? 'Works' : `Sheet ${i + 1}`, rows })) }),
  );
/** The value of B1 where it holds the formula and A1 … A4 hold 2, 3, a text and an error. */
const result = (formula: string) => {
  const rows =
    `<row r="1"><c r="A1"><v>2</v></c><c r="B1"><f>${formula}</f></c></row><row r="2"><c r="A2"><v>3</v></c></row>` +
    '<row r="3"><c r="A3" t="inlineStr"><is><t>3 d</t></is></c></row><row r="4"><c r="A4" t="e"><v>#N/A</v></c></row>';
  return valuesOf(read(rows)[0]).B1;
};

describe('a formula with a stored result', () => {
  it('is read by it', () => {
    const [sheet] = read(
      '<row r="1"><c r="A1"><f>VLOOKUP(1,B:C,2)</f><v>12</v></c><c r="B1" t="str"><f>C1</f><v></v></c></row>',
    );
    expect(valuesOf(sheet)).toEqual({ A1: 12 });
    expect(sheet?.formulas.get('A1')).toEqual({ text: 'VLOOKUP(1,B:C,2)', hasResult: true });
    expect(sheet?.formulas.get('B1')).toEqual({ text: 'C1', hasResult: true });
  });

  it('shared with other cells, reads there as if it were written there', () => {
    const [sheet] = read(
      '<row r="1"><c r="B1"><f t="shared" ref="B1:B2" si="0">$A1+A$1*2</f><v>1</v></c></row>' +
        '<row r="2"><c r="B2"><f t="shared" si="0"/><v>2</v></c></row>',
    );
    expect(sheet?.formulas.get('B2')?.text).toBe('$A2+A$1*2');
  });
});

describe('a formula without a stored result', () => {
  it('is worked out where it is plain arithmetic on cells that can be read', () => {
    expect(result('A1+4*A2')).toBe(14);
    expect(result('(A1+4*$A$2+10)/6')).toBe(4);
    expect(result('-A1--A2')).toBe(1);
    expect(result('SUM(A1:A2)')).toBe(5);
    expect(result('SUM(A1:A3,1)')).toBe(6);
    expect(result('A1+C9')).toBe(2);
    expect(result('1.5e1*2')).toBe(30);
  });

  it('gives the error that a cell it rests on shows', () => {
    expect(result('A4+1')).toBe('#N/A');
    expect(result('SUM(A1:A4)')).toBe('#N/A');
    expect(result('1/0')).toBe('#DIV/0!');
  });

  it('stays empty where it is anything else', () => {
    for (const formula of [
      'A3+1',
      'VLOOKUP(1,A1:A2,1)',
      'A1&amp;A2',
      'IF(A1,1,2)',
      'A1^2',
      '',
      '(A1',
      'A1)',
      'A1 A2',
      'B1+1',
      '[1]X!A1',
      'Nowhere!A1',
      'LOG10(A1)',
      'a_name',
    ]) {
      expect([formula, result(formula)]).toEqual([formula, undefined]);
    }
  });

  it('is marked as such, and its row kept', () => {
    const [sheet] = read(
      '<row r="1"><c r="A1"><v>1</v></c></row><row r="3"><c r="C3"><f>NOW()</f></c></row>',
    );
    expect(sheet?.formulas.get('C3')).toEqual({ text: 'NOW()', hasResult: false });
    expect(sheet?.rows.map(({ number, cells }) => [number, cells])).toEqual([
      [1, [1]],
      [3, [null, null, null]],
    ]);
  });

  it('is worked out through others, down, up and over sheets, and not round in a circle', () => {
    const down = Array.from(
      { length: 3000 },
      (_, i) => `<row r="${i + 1}"><c r="A${i + 1}"><f>${i === 0 ? '1' : `A${i}+1`}</f></c></row>`,
    );
    const up = Array.from(
      { length: 3000 },
      (_, i) => `<row r="${i + 1}"><c r="A${i + 1}"><f>${i === 2999 ? '1' : `A${i + 2}+1`}</f></c></row>`,
    );
    expect(valuesOf(read(down.join(''))[0]).A3000).toBe(3000);
    expect(valuesOf(read(up.join(''))[0]).A1).toBe(3000);
    const [first] = read(
      '<row r="1"><c r="A1"><f>\'Sheet 2\'!A1*2</f></c></row>',
      '<row r="1"><c r="A1"><f>20+1</f></c></row>',
    );
    expect(valuesOf(first).A1).toBe(42);
    const [circle] = read(
      '<row r="1"><c r="A1"><f>B1+1</f></c><c r="B1"><f>A1+1</f></c><c r="C1"><f>A1+B1</f></c><c r="D1"><f>1+1</f></c></row>',
    );
    expect(valuesOf(circle)).toEqual({ D1: 2 });
  });
});

describe('moving a formula', () => {
  it('moves relative references and leaves texts, names and functions', () => {
    expect(shiftFormula('A1+$B$2*C$3+"A1"&LOG10(D4)', 2, 1)).toBe('B3+$B$2*D$3+"A1"&LOG10(E6)');
    expect(shiftFormula("'A1 old'!A1+Sheet2!B2+A1_name", 1, 0)).toBe("'A1 old'!A2+Sheet2!B3+A1_name");
    expect(shiftFormula('A1', -1, 0)).toBe('#REF!');
  });
});
