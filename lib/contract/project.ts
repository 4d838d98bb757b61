import { z } from 'zod';
import { calendar, calendarGiven } from './office';
import { isoDate, nameOf, unit, unitGiven, uuid } from './shared';
import { figures, submissionStatus } from './submission';

export const projectCreate = z.object({
  code: nameOf('Give the project a code.', 40),
  name: nameOf('Give the project a name.', 160),
  contractor: z.uuid('Choose the contractor.'),
  start: isoDate,
  targetFinish: isoDate.nullable().optional(),
  /** What a duration without a unit means; absent: not settled, working days are assumed. */
  unit: unitGiven.nullable().optional(),
  hoursPerDay: z
    .number('Give the hours as a number.')
    .min(0.1, 'A working day has more than 0 hours.')
    .max(24, 'A day has at most 24 hours.')
    .optional(),
  calendar: calendarGiven.optional(),
});
export const projectUpdate = projectCreate.omit({ contractor: true }).partial();

export const projectView = z.object({
  id: uuid,
  code: z.string(),
  name: z.string(),
  contractor: z.object({ id: uuid, name: z.string() }),
  start: isoDate,
  targetFinish: isoDate.nullable(),
  unit: unit.nullable(),
  hoursPerDay: z.number(),
  calendar,
  /** The latest revision; null before the first. */
  latest: z
    .object({
      id: uuid,
      revision: z.int(),
      status: submissionStatus,
      receivedAt: z.iso.datetime(),
      open: z.object({ blocks: z.int(), distorts: z.int(), query: z.int() }),
      /** As corrected; as received where nothing is corrected. */
      figures,
    })
    .nullable(),
});
export type ProjectView = z.infer<typeof projectView>;
