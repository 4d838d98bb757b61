import { z } from 'zod';
import { isoDate, nameOf, role, uuid } from './shared';

/** GET /api/offices/{office}: the office and who is asking. */
export const officeView = z.object({
  id: uuid,
  slug: z.string(),
  name: z.string(),
  locale: z.string(),
  me: z.object({
    id: uuid,
    name: z.string(),
    email: z.string(),
    role,
    contractor: uuid.nullable(),
    permissions: z.array(z.string()),
  }),
});
export type OfficeView = z.infer<typeof officeView>;

/** GET /api/me: the offices of the signed-in person. */
export const meView = z.object({
  id: uuid,
  name: z.string(),
  email: z.string(),
  offices: z.array(z.object({ slug: z.string(), name: z.string(), role })),
});
export type MeView = z.infer<typeof meView>;

export const contractorView = z.object({ id: uuid, name: z.string(), projects: z.int() });
export type ContractorView = z.infer<typeof contractorView>;
export const contractorCreate = z.object({
  name: nameOf('Give the contractor a name.', 120),
});

/** GET /members, POST /members. */
export const memberView = z.object({
  id: uuid,
  name: z.string(),
  email: z.string(),
  role,
  contractor: z.object({ id: uuid, name: z.string() }).nullable(),
  /** False until the person has set a password. */
  active: z.boolean(),
  /** True where the membership was taken away; what the person did stays. */
  disabled: z.boolean(),
});
export type MemberView = z.infer<typeof memberView>;
export const memberCreate = z
  .object({
    name: nameOf('Give the person a name.', 120),
    email: z.email('This is no e-mail address.').max(254),
    role,
    contractor: uuid.nullable().optional(),
  })
  .refine((member) => (member.role === 'scheduler') === Boolean(member.contractor), {
    path: ['contractor'],
    message: 'A scheduler works for one contractor; the other roles for none.',
  });
/** PATCH /members/{member}: takes the membership away, or gives it back. */
export const memberUpdate = z.object({ disabled: z.boolean() });
/** The answer to POST /members and POST /members/{id}/invitation: the link is shown once. */
export const invitationView = z.object({ member: memberView, link: z.string(), expires: z.iso.datetime() });
export type InvitationView = z.infer<typeof invitationView>;

/** GET and POST /api/invitations/{token}. */
export const invitationCheck = z.object({ name: z.string(), email: z.string(), office: z.string() });
export const passwordSet = z.object({
  password: z.string().min(12, 'Use at least 12 characters.').max(200, 'Use at most 200 characters.'),
});

export const calendar = z.object({
  /** Working weekdays, 1 = Monday … 7 = Sunday. */
  workingDays: z.array(z.int().min(1).max(7)).min(1, 'A week needs a working day.').max(7),
  holidays: z.array(isoDate).max(2000),
});
export type CalendarView = z.infer<typeof calendar>;
/** A calendar as sent: what is left out is Monday to Friday, and no holidays. */
export const calendarGiven = z.object({
  workingDays: calendar.shape.workingDays.default([1, 2, 3, 4, 5]),
  holidays: calendar.shape.holidays.default([]),
});
