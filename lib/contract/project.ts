import { z } from 'zod';
import { calendar } from './office';
import { isoDate, unit, uuid } from './shared';
import { figures, submissionStatus } from './submission';

export const projectCreate = z.object({
  code: z.string().trim().min(1, 'Give the project a code.').max(40, 'Use at most 40 characters.'),
  name: z.string().trim().min(1, 'Give the project a name.').max(160, 'Use at most 160 characters.'),
  contractor: z.uuid('Choose the contractor.'),
  start: isoDate,
  targetFinish: isoDate.nullable().optional(),
  /** What a duration without a unit means; absent: not settled, working days are assumed. */
  unit: unit.nullable().optional(),
  hoursPerDay: z
    .number('Give the hours as a number.')
    .positive('A working day has more than 0 hours.')
    .max(24, 'A day has at most 24 hours.')
    .optional(),
  calendar: calendar.optional(),
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
