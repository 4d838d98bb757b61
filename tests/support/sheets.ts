import type { CellValue, Sheet } from '@/lib/schedule/sheet';

type Merge = Sheet['merges'][number];

/** A sheet from rows of values, row 1 first; an empty array is a row that is not there. */
export function sheetOf(rows: readonly (readonly CellValue[])[], given: Partial<Sheet> = {}): Sheet {
  return {
    name: 'Works',
    hidden: false,
    rows: rows.flatMap((cells, i) =>
      cells.length === 0 ? [] : [{ number: i + 1, hidden: false, outline: 0, cells }],
    ),
    columnCount: rows.reduce((most, cells) => Math.max(most, cells.length), 0),
    hiddenColumns: new Set(),
    formulas: new Map(),
    formatCodes: ['General'],
    merges: [],
    date1904: false,
    ...given,
  };
}

/** A sheet from text, cells separated by `|`; numbers become numbers, an empty cell null. */
export function drawn(text: string, given: Partial<Sheet> = {}): Sheet {
  const rows = text
    .split('\n')
    .map((line) => line.trim())
    .filter((line) => line !== '')
    .map((line) =>
      line === '.'
        ? []
        : line.split('|').map((cell) => {
            const held = cell.trim();
            if (held === '') return null;
            return /^-?\d+(\.\d+)?$/.test(held) ? Number(held) : held;
          }),
    );
  return sheetOf(rows, given);
}

/** A merged range by its first and last column and row. */
export function merge(left: number, top: number, right: number, bottom = top): Merge {
  return { top, left, bottom, right };
}
