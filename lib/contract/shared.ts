import { z } from 'zod';

/** Shapes that several entities use. */
export const uuid = z.uuid();
/** A calendar date, YYYY-MM-DD, from the year 1 on. */
export const isoDate = z.iso
  .date('Write a date as 2027-03-12.')
  .refine((date) => !date.startsWith('0000'), 'There is no year 0.');
// Control characters, and those that turn the direction of what is written after them.
const UNSEEN = /[\p{Cc}\u202A-\u202E\u2066-\u2069]/gu;
/** A name of one line: what could not be seen in it is left out, and so are the blanks around it. */
export const nameOf = (missing: string, most: number) =>
  z
    .string()
    .overwrite((text) =>
      text
        .replace(UNSEEN, '')
        .replace(/\p{Surrogate}/gu, '\uFFFD')
        .trim(),
    )
    .min(1, missing)
    .max(most, `Use at most ${most} characters.`);
export const unit = z.enum(['day', 'hour', 'week']);
const UNIT_WORDS = ['day', 'hour', 'week', 'days', 'hours', 'weeks', 'working day', 'working days'] as const;
/** A unit as sent, in the singular or the plural. */
export const unitGiven = z
  .enum(UNIT_WORDS, 'This must be one of day, hour, week.')
  .transform((word) => (word.includes('day') ? 'day' : word.startsWith('hour') ? 'hour' : 'week'))
  .pipe(unit);
export const scheduleState = z.enum(['received', 'corrected', 'proposed']);
export const weight = z.enum(['blocks', 'distorts', 'query']);
export const ROLES = ['administrator', 'analyst', 'reviewer', 'scheduler'] as const;
export const role = z.enum(ROLES);
export type Role = z.infer<typeof role>;

/** RFC 9457. */
export const problem = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string().optional(),
  errors: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
});
export type Problem = z.infer<typeof problem>;

export const items = <T extends z.ZodType>(item: T) => z.object({ items: z.array(item) });
