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
export const sheetColumnView = z.object({
  /** 0 = column A. */
  index: z.int(),
  letters: z.string(),
  /** The plain name of what it holds, such as "Optimistic (a)". */
  title: z.string(),
  field: z.string(),
});

export const sheetRowsView = z.object({
  sheet: z.string(),
  columns: z.array(sheetColumnView),
  rows: z.array(
    z.object({
      row: z.int(),
      /** As the sheet has them, by position in `columns`; '' where empty. */
      received: z.array(z.string()),
      corrected: z.array(z.string()),
    }),
  ),
});
export type SheetRowsView = z.infer<typeof sheetRowsView>;
