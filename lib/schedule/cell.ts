/** A place in what was received. Rows count from 1 as the sheet shows them, columns from 0 (A = 0). */
export interface CellRef {
  readonly sheet: string;
  readonly row: number;
  readonly column: number;
}

/** Letters of a column: 0 → A, 25 → Z, 26 → AA. */
export function columnLetters(column: number): string {
  let letters = '';
  for (let n = column + 1; n > 0; n = Math.floor((n - 1) / 26)) {
    letters = String.fromCharCode(65 + ((n - 1) % 26)) + letters;
  }
  return letters;
}

/** Index of a column given by its letters: A → 0, AA → 26. */
export function columnIndex(letters: string): number {
  let index = 0;
  for (const letter of letters.toUpperCase()) index = index * 26 + (letter.charCodeAt(0) - 64);
  return index - 1;
}

/** Address within the sheet: row 23, column 6 → G23. */
export function cellAddress(cell: { row: number; column: number }): string {
  return columnLetters(cell.column) + String(cell.row);
}

/** Reads `G23`; null where the text is no address. */
export function parseAddress(address: string): { row: number; column: number } | null {
  const match = /^([A-Za-z]{1,3})([1-9]\d{0,6})$/.exec(address.trim());
  if (!match?.[1] || !match[2]) return null;
  return { row: Number(match[2]), column: columnIndex(match[1]) };
}
