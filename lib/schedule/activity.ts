import type { CellRef } from './cell';
import type { Relation } from './relation';
import type { CellContent } from './sheet';

export const UNITS = ['day', 'hour', 'week'] as const;
export type Unit = (typeof UNITS)[number];

/** Why an estimate cell gives no number of days. */
export type EstimateProblem = 'empty' | 'unreadable' | 'error' | 'ambiguous';

/** One of the three estimates, in working days. */
export interface Estimate {
  /** Working days; null where the cell gives none. */
  readonly days: number | null;
  /** As written, '' where empty. */
  readonly text: string;
  /** What the cell holds, as a correction's `from` says it: a number where it keeps one, null where empty. */
  readonly content: CellContent;
  /** Null where the list has no column for it. */
  readonly cell: CellRef | null;
  readonly problem: EstimateProblem | null;
  /** The unit the cell, its number format or the column's header states; null where none does. */
  readonly unit: Unit | null;
  /** Working days of each way in which an unreadable or ambiguous cell could be meant, likeliest first. */
  readonly readings: readonly number[];
}

export interface Activity {
  /** Position among the list's activities, from 0. */
  readonly index: number;
  /** Trimmed, `7.0` written `7`; '' where missing. */
  readonly id: string;
  readonly idCell: CellRef | null;
  /** What the ID cell holds, as a correction's `from` says it. */
  readonly idContent: CellContent;
  /** The code where the ID cell holds an error value. */
  readonly idError: string | null;
  readonly name: string;
  readonly nameCell: CellRef | null;
  readonly wbs: string;
  readonly sheet: string;
  /** The first of its rows. */
  readonly row: number;
  readonly hidden: boolean;
  readonly optimistic: Estimate;
  readonly likely: Estimate;
  readonly pessimistic: Estimate;
}

/** One entry of a predecessor (or successor) cell, as written between two separators. */
export interface LinkItem {
  readonly text: string;
  /** Null where it could not be read. */
  readonly link: {
    /** The ID of the other activity: literally one of the list where it can be, else as written. */
    readonly id: string;
    readonly type: Relation;
    /** Working days; negative for a lead. */
    readonly lag: number;
  } | null;
  /** Ways of writing it that could be read, likeliest first, where it could not. */
  readonly readings: readonly string[];
}

/** A predecessor or successor cell with its entries, in the order written. */
export interface LinkCell {
  /** The activity whose row it stands in, by index. */
  readonly owner: number;
  readonly gives: 'predecessors' | 'successors';
  readonly cell: CellRef;
  readonly text: string;
  /** What the cell holds, as a correction's `from` says it: a number where it keeps one. */
  readonly content: CellContent;
  readonly items: readonly LinkItem[];
  /** What stands between entries in this cell, or in most cells of the column where it has one entry. */
  readonly separator: string;
  /** Cells of its row that hold the relation or the lag of its entries in a column of their own; absent without. */
  readonly ties?: readonly { readonly cell: CellRef; readonly content: CellContent }[];
  /** The code where the cell holds an error value. */
  readonly error: string | null;
}

/** A link as the network uses it. */
export interface Link {
  /** IDs as in the list; `from` is the predecessor. */
  readonly from: string;
  readonly to: string;
  /** Index of the activity; −1 where no activity of the list bears that ID (the network goes without it). */
  readonly fromIndex: number;
  readonly toIndex: number;
  readonly type: Relation;
  /** Working days. */
  readonly lag: number;
  /** Where it is written: index into `linkCells` and into that cell's items. */
  readonly linkCell: number;
  readonly item: number;
}
