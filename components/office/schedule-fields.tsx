'use client';

import type { ReactNode } from 'react';
import { DateText } from '@/components/ui/date-text';
import { Field, Input, Select, Textarea } from '@/components/ui/field';
import { holidayError, type ProjectDraft } from './project-draft';

interface Props {
  draft: ProjectDraft;
  errors: Readonly<Record<string, string>>;
  onChange: (part: Partial<ProjectDraft>) => void;
}

const WEEKDAYS = ['Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday', 'Sunday'];

/** Start, target, unit and working time: what turns estimates into dates. */
export function ScheduleFields({ draft, errors, onChange }: Props) {
  return (
    <>
      <Field
        label="Start"
        hint={<DateHint date={draft.start}>The first working day, time 0 of the schedule.</DateHint>}
        error={errors.start}
        required
      >
        {(aria) => (
          <Input
            {...aria}
            type="date"
            value={draft.start}
            onChange={(e) => onChange({ start: e.target.value })}
          />
        )}
      </Field>
      <Field
        label="Target finish"
        hint={<DateHint date={draft.targetFinish}>The date the chance is given for.</DateHint>}
        error={errors.targetFinish}
      >
        {(aria) => (
          <Input
            {...aria}
            type="date"
            value={draft.targetFinish}
            onChange={(e) => onChange({ targetFinish: e.target.value })}
          />
        )}
      </Field>
      <Field
        label="Unit of durations"
        hint="What a number without a unit means in the list."
        error={errors.unit}
      >
        {(aria) => (
          <Select {...aria} value={draft.unit} onChange={(e) => onChange({ unit: e.target.value })}>
            <option value="">Not settled: take working days, and ask</option>
            <option value="day">Working days</option>
            <option value="hour">Hours</option>
            <option value="week">Weeks</option>
          </Select>
        )}
      </Field>
      <Field
        label="Hours in a working day"
        error={errors.hoursPerDay}
        hint="For durations given in hours."
        required
      >
        {(aria) => (
          <Input
            {...aria}
            inputMode="decimal"
            value={draft.hoursPerDay}
            onChange={(e) => onChange({ hoursPerDay: e.target.value })}
          />
        )}
      </Field>
      <WorkingDays draft={draft} error={errors['calendar.workingDays']} onChange={onChange} />
      <Field
        label="Days off"
        hint="Dates on which nobody works, one a line: 2027-12-24."
        error={holidayError(errors, draft)}
        className="sm:col-span-2"
      >
        {(aria) => (
          <Textarea
            {...aria}
            rows={3}
            value={draft.holidays}
            onChange={(e) => onChange({ holidays: e.target.value })}
          />
        )}
      </Field>
    </>
  );
}

/** The browser writes dates in its own way; this says which day was meant. */
function DateHint({ date, children }: { date: string; children: ReactNode }) {
  return (
    <>
      {children}
      {date !== '' && (
        <>
          {' '}
          <DateText value={date} />
        </>
      )}
    </>
  );
}

function WorkingDays({
  draft,
  error,
  onChange,
}: {
  draft: ProjectDraft;
  error: string | undefined;
  onChange: Props['onChange'];
}) {
  const toggle = (day: number, on: boolean) =>
    onChange({
      workingDays: on ? [...draft.workingDays, day] : draft.workingDays.filter((other) => other !== day),
    });
  return (
    <fieldset className="sm:col-span-2" aria-describedby={error ? 'working-days-error' : undefined}>
      <legend className="mb-1 font-semibold">Working days</legend>
      <div className="flex flex-wrap gap-x-4 gap-y-1">
        {WEEKDAYS.map((name, index) => (
          <label key={name} className="flex min-h-6 items-center gap-1">
            <input
              type="checkbox"
              className="accent-cord"
              checked={draft.workingDays.includes(index + 1)}
              onChange={(e) => toggle(index + 1, e.target.checked)}
            />
            {name}
          </label>
        ))}
      </div>
      {error && (
        <p id="working-days-error" className="mt-1 border-l-2 border-umber pl-2 font-semibold text-umber">
          {error}
        </p>
      )}
    </fieldset>
  );
}
