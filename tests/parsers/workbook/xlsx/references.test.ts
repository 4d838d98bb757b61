import { describe, expect, it } from 'vitest';
import { cellAddress } from '@/lib/schedule/cell';
import { referencesOf } from '@/parsers/workbook/xlsx/references';

const book = {
  names: new Map([
    ['rate', ['Costs!$B$1']],
    ['deep', ['Rate*2']],
    ['round', ['Round']],
    ['moving', ['OFFSET(A1,1,1)']],
  ]),
  tables: [{ name: 'Tasks', sheet: 'List', top: 1, left: 0, bottom: 9, right: 4 }],
};
const read = (text: string) => {
  const { areas, unsure } = referencesOf(text, { sheet: 'List', row: 5, column: 7 }, book);
  const shown = areas.map((area) => {
    const first = cellAddress({ row: area.top, column: area.left });
    const last = cellAddress({ row: area.bottom, column: area.right });
    return `${area.sheet === 'List' ? '' : `${area.sheet}!`}${first === last ? first : `${first}:${last}`}`;
  });
  return unsure ? [...shown, '?'] : shown;
};

describe('the cells that a formula reads', () => {
  it.each([
    ['A1+$B$2*C$3', ['A1', 'B2', 'C3']],
    ['SUM(B9:A1,D4)', ['A1:B9', 'D4']],
    ["'Yard''s days'!A1&Other!B2", ["Yard's days!A1", 'Other!B2']],
    ['Other!A1+A1', ['Other!A1', 'A1']],
    ['A:A', ['A1:A1048576']],
    ['$2:3', ['A2:XFD3']],
    ['"A1"&"x""B2"', []],
    ['LOG10(C5)+1.5E3+TRUE', ['C5']],
    ['_xlfn.MAXIFS(B:B,C:C,1)', ['B1:B1048576', 'C1:C1048576']],
    ['#REF!+A1', ['A1']],
    ['[2]Prices!A1', []],
    ["'[Book.xlsx]Prices'!A1+B1", ['B1']],
    ['Rate+1', ['Costs!B1']],
    ['DEEP', ['Costs!B1']],
    ['SUM(Tasks[Likely])+A20', ['A1:E9', 'A20']],
    ['Tasks[[#This Row],[a ]b]]', ['A5:E5']],
    ['SUM(Tasks[@[Min]:[Max]])', ['A5:E5']],
  ])('%s: %j', (text, expected) => {
    expect(read(text)).toEqual(expected);
  });

  it.each([
    'INDIRECT("A1")',
    'OFFSET(A1,1,0)',
    'Unknown+1',
    'A1:INDEX(B:B,3)',
    'Jan:Dec!A1',
    'A1#',
    'Other[x]',
    'Round',
    'Moving',
  ])('%s may read others too', (text) => {
    expect(read(text).at(-1)).toBe('?');
  });
});
