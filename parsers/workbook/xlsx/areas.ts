import { parseAddress } from '@/lib/schedule/cell';

/** A range of cells; rows from 1, columns from 0, both ends included. */
export interface Area {
  readonly top: number;
  readonly left: number;
  readonly bottom: number;
  readonly right: number;
}

export interface SheetArea extends Area {
  readonly sheet: string;
}

export const covers = (area: Area, row: number, column: number) =>
  row >= area.top && row <= area.bottom && column >= area.left && column <= area.right;

export const cellCount = (area: Area) => (area.bottom - area.top + 1) * (area.right - area.left + 1);

/** Reads `B2` or `B2:D9`, fixed or not; null where it is neither. */
export function parseArea(text: string): Area | null {
  const [first = '', second = first] = text.replaceAll('$', '').split(':');
  const [a, b] = [parseAddress(first), parseAddress(second)];
  if (!a || !b) return null;
  return {
    top: Math.min(a.row, b.row),
    left: Math.min(a.column, b.column),
    bottom: Math.max(a.row, b.row),
    right: Math.max(a.column, b.column),
  };
}
