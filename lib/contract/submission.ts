import { z } from 'zod';
import { calendar } from './office';
import { isoDate, scheduleState, uuid, weight } from './shared';

export const submissionStatus = z.enum(['received', 'under review', 'returned', 'accepted', 'superseded']);

/** The figures of a schedule in one of its states; nulls where it cannot be computed. */
export const figures = z.object({
  state: scheduleState,
  computable: z.boolean(),
  /** Working days. */
  expectedDuration: z.number().nullable(),
  finish: isoDate.nullable(),
  variance: z.number().nullable(),
  standardDeviation: z.number().nullable(),
  /** Chance of finishing by the end of the target date, 0 … 1; null without a target. */
  chanceOfTarget: z.number().nullable(),
});
export type Figures = z.infer<typeof figures>;

const counts = z.object({ blocks: z.int(), distorts: z.int(), query: z.int() });

export const submissionView = z.object({
  id: uuid,
  project: z.object({
    id: uuid,
    code: z.string(),
    name: z.string(),
    contractor: z.object({ id: uuid, name: z.string() }),
    start: isoDate,
    targetFinish: isoDate.nullable(),
    unit: z.enum(['day', 'hour', 'week']).nullable(),
    hoursPerDay: z.number(),
  }),
  revision: z.int(),
  status: submissionStatus,
  receivedAt: z.iso.datetime(),
  receivedBy: z.string(),
  file: z.object({ name: z.string(), sha256: z.string(), bytes: z.int() }),
  rows: z.object({
    read: z.int(),
    activities: z.int(),
    headings: z.int(),
    continued: z.int(),
    blank: z.int(),
    notes: z.int(),
    refused: z.int(),
  }),
  refusedRows: z.array(z.object({ sheet: z.string(), row: z.int(), reason: z.string() })),
  /** All findings by weight, whatever their state. */
  findings: counts,
  /** Those still open. */
  open: counts,
  corrections: z.int(),
  comments: z.int(),
  record: z.int(),
  figures: z.object({
    received: figures,
    corrected: figures,
    /** Where the corrected state cannot be computed: with the blocking findings' proposed fixes adopted. */
    proposed: figures.nullable(),
  }),
  /** Goes up with each change; send it with a correction. */
  version: z.int(),
});
export type SubmissionView = z.infer<typeof submissionView>;

export const activitiesQuery = z.object({ state: scheduleState.default('corrected') });
export const workbookQuery = z.object({ state: z.enum(['received', 'corrected']).default('corrected') });

export const linkView = z.object({ id: z.string(), type: z.enum(['FS', 'SS', 'FF', 'SF']), lag: z.number() });
export const activityView = z.object({
  id: z.string(),
  name: z.string(),
  sheet: z.string(),
  row: z.int(),
  /** Working days; null where the cell gives none. */
  optimistic: z.number().nullable(),
  likely: z.number().nullable(),
  pessimistic: z.number().nullable(),
  predecessors: z.array(linkView),
  /** Addresses of the cells it was read from. */
  cells: z.record(z.string(), z.string()),
});
export type ActivityView = z.infer<typeof activityView>;

const cellContent = z.union([z.string(), z.number(), z.null()]);
export const cellEdit = z.object({ sheet: z.string(), cell: z.string(), from: cellContent, to: cellContent });
export type CellEditView = z.infer<typeof cellEdit>;

export const effect = z.object({ expectedDuration: z.number(), variance: z.number() });
export const fixView = z.object({
  id: uuid,
  state: z.enum(['proposed', 'adopted', 'declined']),
  reason: z.string(),
  edits: z.array(cellEdit),
  /** What adopting it alone does to the expected finish and to the variance; null where that cannot be computed. */
  effect: effect.nullable(),
});
export type FixView = z.infer<typeof fixView>;

export const findingView = z.object({
  id: uuid,
  rule: z.string(),
  title: z.string(),
  weight,
  activityId: z.string().nullable(),
  activityName: z.string().nullable(),
  sheet: z.string().nullable(),
  row: z.int().nullable(),
  cell: z.string().nullable(),
  message: z.string(),
  source: z.string(),
  state: z.enum(['open', 'corrected', 'waived', 'answered']),
  /** Whether the list had it when it came, or a correction made it. */
  origin: z.enum(['received', 'correction']),
  fix: fixView.nullable(),
  alternatives: z.array(fixView),
  comments: z.int(),
});
export type FindingView = z.infer<typeof findingView>;

export const correctionCreate = z
  .object({
    version: z.int().min(0),
    fixes: z.array(uuid).min(1).max(200_000).optional(),
    edits: z
      .array(
        z.object({
          sheet: z.string(),
          cell: z.string().regex(/^[A-Za-z]{1,3}[1-9]\d{0,6}$/),
          to: cellContent,
        }),
      )
      .min(1)
      .max(1000)
      .optional(),
    /** The finding an edit by hand answers, if any. */
    finding: uuid.optional(),
  })
  .refine((body) => Boolean(body.fixes) !== Boolean(body.edits), { message: 'Send either fixes or edits.' });
export const correctionView = z.object({
  id: uuid,
  /** What was adopted in one step bears one batch. */
  batch: uuid,
  fix: uuid.nullable(),
  finding: uuid.nullable(),
  edits: z.array(cellEdit),
  by: z.string(),
  at: z.iso.datetime(),
});
export type CorrectionView = z.infer<typeof correctionView>;
/** 201 of POST /corrections, 200 of DELETE /corrections/{correction or batch}. */
export const correctionResult = z.object({
  batch: uuid.nullable(),
  items: z.array(correctionView),
  /** Fixes asked for that could not be adopted, and why. */
  skipped: z.array(z.object({ fix: uuid, reason: z.string() })),
  /** Corrections that hold, but of which an edit finds nothing to change any more after an undoing. */
  inapplicable: z.array(z.object({ correction: uuid, reason: z.string() })),
  version: z.int(),
  submission: submissionView,
  /** Findings whose state or fix changed, new ones included; `gone` are those a correction had made and that vanished. */
  changed: z.array(findingView),
  gone: z.array(uuid),
});
export type CorrectionResult = z.infer<typeof correctionResult>;

/** DELETE /corrections/{correction}: with the version, it is refused where someone else was first. */
export const undoQuery = z.object({ version: z.coerce.number().int().min(0).optional() });

/** PATCH /submissions/{id}/fixes/{fix}: decline, or propose again; answers as a correction does. */
export const fixUpdate = z.object({ state: z.enum(['declined', 'proposed']), version: z.int().min(0) });

export const analysisQuery = z.object({ state: scheduleState.default('corrected') });
export const analysedActivity = z.object({
  id: z.string(),
  name: z.string(),
  row: z.int(),
  /** Estimates as used, working days. */
  optimistic: z.number(),
  likely: z.number(),
  pessimistic: z.number(),
  expected: z.number(),
  variance: z.number(),
  earlyStart: z.number(),
  earlyFinish: z.number(),
  lateStart: z.number(),
  lateFinish: z.number(),
  totalFloat: z.number(),
  freeFloat: z.number(),
  critical: z.boolean(),
  startDate: isoDate,
  finishDate: isoDate,
  predecessors: z.array(linkView),
});
export type AnalysedActivity = z.infer<typeof analysedActivity>;
export const analysisView = z.discriminatedUnion('computable', [
  z.object({
    computable: z.literal(true),
    state: scheduleState,
    unit: z.literal('working day'),
    /** Turns working days into dates: time 0 is the beginning of its first working day from `start` on. */
    calendar,
    start: isoDate,
    finish: isoDate,
    expectedDuration: z.number(),
    variance: z.number(),
    standardDeviation: z.number(),
    criticalPaths: z.array(z.array(z.string())),
    criticalPathCount: z.number(),
    activities: z.array(analysedActivity),
  }),
  z.object({
    computable: z.literal(false),
    state: scheduleState,
    loops: z.array(z.array(z.string())),
    because: z.array(uuid),
  }),
]);
export type AnalysisView = z.infer<typeof analysisView>;

const BETWEEN = 'Give a confidence between 0 and 1, such as 0.8.';
export const chanceQuery = z.object({
  state: scheduleState.default('corrected'),
  days: z.coerce.number().optional(),
  date: isoDate.optional(),
  confidence: z.coerce.number().gt(0, BETWEEN).lt(1, BETWEEN).optional(),
});
export const chanceView = z.object({
  days: z.number(),
  date: isoDate,
  /** Null where the deviation is 0. */
  z: z.number().nullable(),
  before: z.number(),
  after: z.number(),
  /** Φ of z rounded to two decimals, to four decimals, as the printed table has it. */
  table: z.object({ z: z.number(), before: z.number() }).nullable(),
  expectedDuration: z.number(),
  standardDeviation: z.number(),
});
export type ChanceView = z.infer<typeof chanceView>;

export const commentCreate = z.object({
  body: z.string().trim().min(1, 'Write something first.').max(5000, 'At most 5 000 characters.'),
  finding: uuid.nullable().optional(),
  /** A sheet's row, where it is not about a finding. */
  sheet: z.string().nullable().optional(),
  row: z.int().min(1).max(1_048_576).nullable().optional(),
  /** Inside the office, or shared with the contractor. A scheduler's are always shared. */
  audience: z.enum(['inside', 'shared']).default('inside'),
});
export const commentView = z.object({
  id: uuid,
  finding: uuid.nullable(),
  sheet: z.string().nullable(),
  row: z.int().nullable(),
  audience: z.enum(['inside', 'shared']),
  body: z.string(),
  by: z.object({ id: uuid, name: z.string(), role: z.string() }),
  at: z.iso.datetime(),
});
export type CommentView = z.infer<typeof commentView>;

export const recordEntryView = z.object({
  sequence: z.int(),
  at: z.iso.datetime(),
  by: z.string(),
  verb: z.string(),
  /** A plain sentence. */
  summary: z.string(),
  hash: z.string(),
});
export type RecordEntryView = z.infer<typeof recordEntryView>;

/** One event of GET /submissions/{id}/events (server-sent). */
export const submissionEvent = z.object({
  kind: z.enum(['comment', 'correction', 'fix', 'status']),
  version: z.int().optional(),
  id: uuid.optional(),
});
