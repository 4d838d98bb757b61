import type { CellValue, Sheet } from '@/lib/schedule/sheet';

/** A sheet whose rows are given from row 1 on; `null` stands for a row that is missing. */
export function sheetOf(rows: readonly (readonly CellValue[] | null)[], more: Partial<Sheet> = {}): Sheet {
  return {
    name: 'List',
    hidden: false,
    rows: rows.flatMap((cells, index) =>
      cells ? [{ number: index + 1, hidden: false, outline: 0, cells }] : [],
    ),
    columnCount: Math.max(0, ...rows.map((cells) => cells?.length ?? 0)),
    hiddenColumns: new Set(),
    formulas: new Map(),
    formatCodes: ['General'],
    merges: [],
    date1904: false,
    ...more,
  };
}

export function deepFreeze<T>(value: T): T {
  if (typeof value === 'object' && value !== null && !Object.isFrozen(value)) {
    Object.freeze(value);
    for (const inner of Object.values(value)) deepFreeze(inner);
  }
  return value;
}
