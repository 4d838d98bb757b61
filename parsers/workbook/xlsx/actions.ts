import type { CellContent } from '@/lib/schedule/sheet';
import { cellAddress, columnLetters } from '@/lib/schedule/cell';
import type { ChangedCell } from '../types';
import { type Area, cellCount, covers } from './areas';
import type { FormulaCell } from './formulas';

/** What is done to one cell of a sheet. */
export interface CellAction {
  /** Its new content, in place of value and formula. */
  readonly set?: { readonly to: CellContent };
  /** Its formula, written out where it was shared; null: no formula any more, the result stays. */
  readonly formula?: string | null;
  /** Its stored result goes: it is to be computed when the file is opened. */
  readonly dropResult?: boolean;
  /** What its formula comes to now, in place of the stored result. */
  readonly result?: number;
}

export type SheetActions = Map<number, Map<number, CellAction>>;

export interface Planned {
  readonly actions: SheetActions;
  readonly remarks: readonly string[];
  /** Formulas whose results are dropped. */
  readonly stale: number;
}

const addressOf = ({ top, left, bottom, right }: Area) =>
  `${columnLetters(left)}${top}:${columnLetters(right)}${bottom}`;

/** What has to be done to the cells of one sheet for its corrections and for what depends on any of them. */
export function planSheet(
  sheet: string,
  cells: readonly ChangedCell[],
  formulas: readonly FormulaCell[],
  stale: ReadonlySet<FormulaCell>,
  results: ReadonlyMap<string, number> = new Map(),
): Planned {
  const actions: SheetActions = new Map();
  const remarks: string[] = [];
  const act = (row: number, column: number, action: CellAction) => {
    const there = actions.get(row) ?? new Map<number, CellAction>();
    actions.set(row, there.set(column, { ...there.get(column), ...action }));
  };
  const isSet = (row: number, column: number) => actions.get(row)?.get(column)?.set !== undefined;
  for (const { row, column, to } of cells) act(row, column, { set: { to } });

  const expanded = new Set<string>();
  let dropped = 0;
  for (const formula of formulas) {
    const { row, column, kind, group, area } = formula;
    if (kind === 'shared' && formula.leads) {
      // A group whose text goes is written out in the cells that shared it.
      if (isSet(row, column)) expanded.add(group);
      else expanded.delete(group);
    }
    const several = cellCount(area) > 1;
    if (several && cells.some((cell) => covers(area, cell.row, cell.column))) {
      if (!isSet(row, column)) act(row, column, { formula: null });
      const what = kind === 'array' ? 'one formula' : 'a data table';
      remarks.push(
        `On “${sheet}”, ${addressOf(area)} were filled by ${what}; as a cell of them was corrected, the others keep their last values.`,
      );
      continue;
    }
    if (isSet(row, column)) continue;
    if (expanded.has(group) && kind === 'shared') act(row, column, { formula: formula.text });
    if (!stale.has(formula)) continue;
    const result = several ? undefined : results.get(cellAddress({ row, column }));
    if (result !== undefined) {
      act(row, column, { result });
      continue;
    }
    dropped += 1;
    for (let r = area.top; r <= area.bottom; r += 1)
      for (let c = area.left; c <= area.right; c += 1) act(r, c, { dropResult: true });
  }
  return { actions, remarks, stale: dropped };
}
