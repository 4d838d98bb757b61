import type { ProjectInput } from '@/lib/client/projects';
import type { CalendarView } from '@/lib/contract/office';
import type { ProjectView } from '@/lib/contract/project';
import { UNITS, type Unit } from '@/lib/schedule/activity';

/** A project's form as it stands in its fields: all text, as typed. */
export interface ProjectDraft {
  readonly contractor: string;
  readonly code: string;
  readonly name: string;
  readonly start: string;
  readonly targetFinish: string;
  /** '' where what a bare number means is not settled. */
  readonly unit: string;
  readonly hoursPerDay: string;
  readonly workingDays: readonly number[];
  /** One date a line, YYYY-MM-DD. */
  readonly holidays: string;
}

export const PROJECT_FIELDS = [
  'contractor',
  'code',
  'name',
  'start',
  'targetFinish',
  'unit',
  'hoursPerDay',
  'calendar',
];

export const EMPTY_DRAFT: ProjectDraft = {
  contractor: '',
  code: '',
  name: '',
  start: '',
  targetFinish: '',
  unit: '',
  hoursPerDay: '8',
  workingDays: [1, 2, 3, 4, 5],
  holidays: '',
};

export function draftOf(project: ProjectView): ProjectDraft {
  return {
    contractor: project.contractor.id,
    code: project.code,
    name: project.name,
    start: project.start,
    targetFinish: project.targetFinish ?? '',
    unit: project.unit ?? '',
    hoursPerDay: String(project.hoursPerDay),
    workingDays: project.calendar.workingDays,
    holidays: project.calendar.holidays.join('\n'),
  };
}

/** The form as the server takes it. What is no number or no date goes as it is and comes back with a sentence. */
export function toInput(draft: ProjectDraft): ProjectInput {
  return {
    contractor: draft.contractor,
    code: draft.code.trim(),
    name: draft.name.trim(),
    start: draft.start,
    targetFinish: draft.targetFinish === '' ? null : draft.targetFinish,
    unit: unitOf(draft.unit),
    hoursPerDay: Number(draft.hoursPerDay.trim().replace(',', '.')),
    calendar: calendarOf(draft),
  };
}

export function unitOf(text: string): Unit | null {
  return UNITS.find((unit) => unit === text) ?? null;
}

function calendarOf(draft: ProjectDraft): CalendarView {
  const holidays = draft.holidays
    .split(/[\n,;]+/)
    .map((date) => date.trim())
    .filter((date) => date !== '');
  return {
    workingDays: [...draft.workingDays].sort((a, b) => a - b),
    holidays: [...new Set(holidays)].sort(),
  };
}

/** The holidays' faults come back by position; they all stand at one field. */
export function holidayError(
  errors: Readonly<Record<string, string>>,
  draft: ProjectDraft,
): string | undefined {
  const holidays = calendarOf(draft).holidays;
  for (const path of Object.keys(errors)) {
    const position = /^calendar\.holidays\.(\d+)$/.exec(path)?.[1];
    if (position !== undefined)
      return `“${holidays[Number(position)] ?? ''}” is no date; write it as 2027-12-24.`;
  }
  return errors['calendar.holidays'];
}
