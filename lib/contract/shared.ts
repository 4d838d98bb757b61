import { z } from 'zod';

/** Shapes that several entities use. */
export const uuid = z.uuid();
/** A calendar date, YYYY-MM-DD. */
export const isoDate = z.iso.date('Write a date as 2027-03-12.');
export const unit = z.enum(['day', 'hour', 'week']);
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
