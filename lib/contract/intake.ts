import { z } from 'zod';

const field = z.string();
export const detectedColumn = z.object({
  /** 0 = column A. */
  index: z.int(),
  header: z.string(),
  field: field.nullable(),
  /** 0 … 1. */
  confidence: z.number(),
  /** Why it was taken for that. */
  reason: z.string(),
  /** The unit its header states; null where it states none. */
  unit: z.string().nullable(),
});
/** POST /intake: what was detected; nothing is kept. */
export const intakeView = z.object({
  sheets: z.array(
    z.object({
      name: z.string(),
      hidden: z.boolean(),
      /** From 1; 0 where no header was found. */
      headerRow: z.int(),
      columns: z.array(detectedColumn),
      /** Rows below the header to the last that holds anything. */
      rows: z.int(),
    }),
  ),
  /** The sheet proposed, and whether it can go straight through. */
  proposed: z.string().nullable(),
  sure: z.boolean(),
  /** What is still missing or contradictory, in plain sentences. */
  problems: z.array(z.string()),
  /** The first rows of the proposed sheet as they will be read. */
  sample: z.array(
    z.object({
      row: z.int(),
      kind: z.enum(['activity', 'heading', 'continued', 'blank', 'note', 'refused']),
      id: z.string(),
      name: z.string(),
      optimistic: z.number().nullable(),
      likely: z.number().nullable(),
      pessimistic: z.number().nullable(),
      predecessors: z.string(),
      reason: z.string().nullable(),
    }),
  ),
  /** The cells around the header as the sheet shows them, from the first row on: `cells` by column index. */
  preview: z.array(z.object({ row: z.int(), cells: z.array(z.string()) })),
});
export type IntakeView = z.infer<typeof intakeView>;

/** The form fields beside `file`, for POST /intake and POST …/submissions alike. */
export const matchingForm = z.object({
  sheet: z.array(z.string()).max(1000).optional(),
  /** { field: column index }. */
  columns: z.record(z.string(), z.int().min(0)).optional(),
  headerRow: z.int().min(0).optional(),
});
export type MatchingForm = z.infer<typeof matchingForm>;
