import type { Activity, Link, LinkCell, Unit } from './activity';
import type { CellRef } from './cell';
import type { Matching } from './field';

/** Rows below the header to the last that holds anything; `read` is the sum of the others. */
export interface RowCounts {
  readonly read: number;
  readonly activities: number;
  readonly headings: number;
  readonly continued: number;
  readonly blank: number;
  readonly notes: number;
  readonly refused: number;
}

export interface HeadingRow {
  readonly id: string;
  readonly name: string;
  readonly sheet: string;
  readonly row: number;
  readonly outline: number;
}

export interface RefusedRow {
  readonly sheet: string;
  readonly row: number;
  /** A plain sentence. */
  readonly reason: string;
}

/** A cell of a used column that shows an error value. */
export interface ErrorCell {
  readonly cell: CellRef;
  readonly field: string;
  readonly code: string;
  /** Index of the activity in whose row it stands; −1 where in none. */
  readonly owner: number;
}

/** What was received, read: the input of the audit and of the network. */
export interface ActivityList {
  readonly matching: Matching;
  readonly activities: readonly Activity[];
  readonly headings: readonly HeadingRow[];
  readonly refused: readonly RefusedRow[];
  readonly rows: RowCounts;
  readonly linkCells: readonly LinkCell[];
  readonly links: readonly Link[];
  readonly errorCells: readonly ErrorCell[];
  /** Index of the first activity that bears an ID (keys as `Activity.id`). */
  readonly indexOf: ReadonlyMap<string, number>;
  /** True where the list has one duration column in place of three. */
  readonly singleDuration: boolean;
  /** The unit a duration without one was read in, and whether header, project setting or nothing but habit gave it. */
  readonly unit: { readonly value: Unit; readonly from: 'header' | 'project' | 'assumed' };
  /** The options it was read with; what a fix writes into a cell in hours or weeks is turned back by them. */
  readonly reading: ReadingOptions;
}

/** How durations without a unit are read, and how long a day and a week are. */
export interface ReadingOptions {
  /** Null where the project sets none: working days are assumed. */
  readonly unit: Unit | null;
  readonly hoursPerDay: number;
  readonly daysPerWeek: number;
}

export const DEFAULT_READING: ReadingOptions = { unit: null, hoursPerDay: 8, daysPerWeek: 5 };
