import { columnIndex, columnLetters } from '@/lib/schedule/cell';

/** A quoted text or sheet name; a cell, a run of columns or of rows that no letter, digit or bracket touches. */
const PIECES =
  /"(?:[^"]|"")*"|'(?:[^']|'')*'|(?<![\w.$\]])(?:(\$?[A-Za-z]{1,3})(\$?\d{1,7})|(\$?[A-Za-z]{1,3}):(\$?[A-Za-z]{1,3})|(\$?\d{1,7}):(\$?\d{1,7}))(?![\w.(!])/g;
const GONE = '#REF!';

/** A column's letters, or a row's number, moved; null where that leads off the sheet. */
function shiftColumn(text: string, by: number): string | null {
  return text.startsWith('$') ? text : columnLetters(columnIndex(text) + by) || null;
}

function shiftRow(text: string, by: number): string | null {
  if (text.startsWith('$')) return text;
  return Number(text) + by < 1 ? null : String(Number(text) + by);
}

/** The formula as it reads when moved by rows and columns: relative references move along. */
export function shiftFormula(text: string, rows: number, columns: number): string {
  const both = (first: string | null, second: string | null, between: string) =>
    first === null || second === null ? GONE : first + between + second;
  return text.replace(
    PIECES,
    (whole, column?: string, row?: string, left?: string, right?: string, top?: string, bottom?: string) => {
      if (column && row) return both(shiftColumn(column, columns), shiftRow(row, rows), '');
      if (left && right) return both(shiftColumn(left, columns), shiftColumn(right, columns), ':');
      return top && bottom ? both(shiftRow(top, rows), shiftRow(bottom, rows), ':') : whole;
    },
  );
}
