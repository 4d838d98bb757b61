/** An error value such as #REF! or #N/A that a cell shows in place of a result. */
export class ErrorValue {
  constructor(readonly code: string) {}
  toString(): string {
    return this.code;
  }
}

/** What a cell holds. Dates stay serial numbers; the row's format tells that they are dates. */
export type CellValue = string | number | boolean | ErrorValue | null;

export interface SheetRow {
  /** Row number as the sheet shows it, from 1. */
  readonly number: number;
  readonly hidden: boolean;
  /** Outline level, 0 where the row is in no group. */
  readonly outline: number;
  /** By column index; shorter than the sheet is wide where the rest is empty. */
  readonly cells: readonly CellValue[];
  /** By column index, into the sheet's `formatCodes`; absent where every cell is General. */
  readonly formats?: readonly (number | undefined)[];
}

export interface SheetFormula {
  readonly text: string;
  /** False where the file keeps no result for it. */
  readonly hasResult: boolean;
}

/** One sheet of located cells. Rows are in ascending order; rows that hold nothing may be missing. */
export interface Sheet {
  readonly name: string;
  readonly hidden: boolean;
  readonly rows: readonly SheetRow[];
  readonly columnCount: number;
  readonly hiddenColumns: ReadonlySet<number>;
  /** By address (G23). */
  readonly formulas: ReadonlyMap<string, SheetFormula>;
  /** Number format codes; index 0 is General. */
  readonly formatCodes: readonly string[];
  readonly merges: readonly { top: number; left: number; bottom: number; right: number }[];
  /** True where serial dates count from 1904. */
  readonly date1904: boolean;
}

/** What a correction writes into a cell, and what the cell held. */
export type CellContent = string | number | null;
