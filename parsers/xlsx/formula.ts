import { columnIndex, columnLetters } from '@/lib/schedule/cell';

/** A quoted text or sheet name, or a cell reference that no letter, digit or bracket touches. */
const PIECES = /"(?:[^"]|"")*"|'(?:[^']|'')*'|(?<![\w.$\]])(\$?)([A-Za-z]{1,3})(\$?)(\d{1,7})(?![\w.(!])/g;

/** The formula as it reads when moved by rows and columns: relative references move along. */
export function shiftFormula(text: string, rows: number, columns: number): string {
  return text.replace(
    PIECES,
    (whole, fixedColumn?: string, letters?: string, fixedRow?: string, row?: string) => {
      if (letters === undefined || row === undefined) return whole;
      const column = fixedColumn ? letters : columnLetters(columnIndex(letters) + columns);
      const number = fixedRow ? Number(row) : Number(row) + rows;
      return number < 1 || column === '' ? '#REF!' : `${fixedColumn}${column}${fixedRow}${number}`;
    },
  );
}
