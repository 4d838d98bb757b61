import { describe, expect, it } from 'vitest';
import { shiftFormula } from '@/parsers/xlsx/formula';

describe('shiftFormula', () => {
  it.each([
    ['A1+$B$2+C$3+$D4', 1, 2, 'C2+$B$2+E$3+$D5'],
    ['SUM(A:A,$B:C)', 0, 1, 'SUM(B:B,$B:D)'],
    ['SUM(1:2,$3:4)', 2, 0, 'SUM(3:4,$3:6)'],
    ['"A1"&\'A1 B2\'!A1', 1, 0, '"A1"&\'A1 B2\'!A2'],
    ['LOG10(A1)+Rate1x', 1, 0, 'LOG10(A2)+Rate1x'],
    ['A1', -1, 0, '#REF!'],
    ['A1', 0, -1, '#REF!'],
    ['A:A', 0, -1, '#REF!'],
  ])('%s by %i rows and %i columns: %s', (text, rows, columns, expected) => {
    expect(shiftFormula(text, rows, columns)).toBe(expected);
  });
});
