/** What a column of an activity list can hold, with the plain name shown for it. */
export const FIELDS = {
  id: 'ID',
  name: 'Name',
  optimistic: 'Optimistic (a)',
  likely: 'Most likely (m)',
  pessimistic: 'Pessimistic (b)',
  duration: 'Duration',
  predecessors: 'Predecessors',
  successors: 'Successors',
  relation: 'Relation',
  lag: 'Lag',
  wbs: 'WBS',
  calendar: 'Calendar',
  resource: 'Resource',
  responsible: 'Responsible',
  start: 'Stated start',
  finish: 'Stated finish',
  totalFloat: 'Stated float',
  critical: 'Stated critical',
  percentComplete: 'Percent complete',
  actualStart: 'Actual start',
  actualFinish: 'Actual finish',
  remaining: 'Remaining duration',
  constraintKind: 'Constraint',
  constraintDate: 'Constraint date',
  notes: 'Notes',
} as const;

export type Field = keyof typeof FIELDS;

/** Which column (0 = A) holds which field, and where the header stands. */
export interface SheetMatching {
  readonly sheet: string;
  /** Row number of the header, from 1; of the last one where the header has two rows; 0 where there is none. */
  readonly headerRow: number;
  readonly columns: Readonly<Partial<Record<Field, number>>>;
}

/** The sheets that make up the list, in order. */
export type Matching = readonly SheetMatching[];
