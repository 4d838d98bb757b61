import { z } from 'zod';

/** GET /submissions/{id}/rows?sheet=&rows=23,41: a piece of the sheet, as received and as corrected. */
export const sheetRowsQuery = z.object({
  sheet: z.string().min(1),
  /** Row numbers, separated by commas; at most 40. */
  rows: z
    .string()
    .regex(/^[1-9]\d{0,6}(,[1-9]\d{0,6}){0,39}$/, 'Give up to 40 row numbers, separated by commas.'),
});

/** One column that holds a field of the list, in the sheet's order. */
const sheetColumnView = z.object({
  /** 0 = column A. */
  index: z.int(),
  letters: z.string(),
  field: z.string(),
  /** The plain name of what it holds, such as "Optimistic (a)". */
  title: z.string(),
});
export type SheetColumnView = z.infer<typeof sheetColumnView>;

/** The three estimates of the activity that a row begins, in working days; null where a cell gives none. */
const rowEstimates = z.object({
  optimistic: z.number().nullable(),
  likely: z.number().nullable(),
  pessimistic: z.number().nullable(),
});
export type RowEstimates = z.infer<typeof rowEstimates>;

const rowState = z.object({
  /** As the sheet has them, by position in `columns`; '' where empty. */
  cells: z.array(z.string()),
  /** Null where no activity begins in this row. */
  estimates: rowEstimates.nullable(),
});

export const sheetRowsView = z.object({
  sheet: z.string(),
  columns: z.array(sheetColumnView),
  rows: z.array(z.object({ row: z.int(), received: rowState, corrected: rowState })),
});
export type SheetRowsView = z.infer<typeof sheetRowsView>;
