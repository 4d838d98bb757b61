'use client';

import { useState, type FormEvent, type ReactNode } from 'react';
import { useMay, useOfficeView } from '@/components/shell/office-context';
import { Button } from '@/components/ui/button';
import { DateText } from '@/components/ui/date-text';
import { Dialog } from '@/components/ui/dialog';
import { Field, Input } from '@/components/ui/field';
import { useFormat } from '@/components/ui/locale';
import { Panel } from '@/components/ui/panel';
import { toast } from '@/components/ui/toast';
import { useUpdateProject } from '@/lib/client/projects';
import type { ProjectView } from '@/lib/contract/project';
import { FormTrouble, fieldErrorsOf } from './form-trouble';
import { draftOf, PROJECT_FIELDS, toInput, type ProjectDraft } from './project-draft';
import { ScheduleFields } from './schedule-fields';

const UNIT_WORDS = { day: 'working days', hour: 'hours', week: 'weeks' } as const;
const SHORT_DAYS = ['Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat', 'Sun'];

/** Start, target, unit and calendar, as they stand; the analyst can change them. */
export function ProjectSettings({ project }: { project: ProjectView }) {
  const may = useMay();
  const format = useFormat();
  const [editing, setEditing] = useState(false);
  const { calendar } = project;
  const change = may('projects:update') && (
    <Button variant="ghost" onClick={() => setEditing(true)}>
      Change
    </Button>
  );
  return (
    <Panel title="Calendar and target" aside={change}>
      <dl className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-4 gap-y-1">
        <Line term="Start">
          <DateText value={project.start} />
        </Line>
        <Line term="Target finish">
          {project.targetFinish ? <DateText value={project.targetFinish} /> : 'none set'}
        </Line>
        <Line term="Working days">{calendar.workingDays.map((day) => SHORT_DAYS[day - 1]).join(', ')}</Line>
        <Line term="Hours a day">
          {format.number(project.hoursPerDay, Number.isInteger(project.hoursPerDay) ? 0 : 1)}
        </Line>
        <Line term="Unit">
          {project.unit ? UNIT_WORDS[project.unit] : 'not settled, working days assumed'}
        </Line>
        <Line term="Days off">
          {calendar.holidays.length === 0 ? 'none' : <DaysOff dates={calendar.holidays} />}
        </Line>
      </dl>
      {editing && <SettingsDialog project={project} onClose={() => setEditing(false)} />}
    </Panel>
  );
}

function Line({ term, children }: { term: string; children: ReactNode }) {
  return (
    <>
      <dt className="text-slate">{term}</dt>
      <dd>{children}</dd>
    </>
  );
}

function DaysOff({ dates }: { dates: readonly string[] }) {
  return (
    <details>
      <summary className="text-cord">
        {dates.length === 1 ? 'one date' : `${String(dates.length)} dates`}
      </summary>
      <ul>
        {dates.map((date) => (
          <li key={date}>
            <DateText value={date} />
          </li>
        ))}
      </ul>
    </details>
  );
}

function SettingsDialog({ project, onClose }: { project: ProjectView; onClose: () => void }) {
  const { slug } = useOfficeView();
  const update = useUpdateProject(slug, project.id);
  const [draft, setDraft] = useState<ProjectDraft>(() => draftOf(project));
  const errors = fieldErrorsOf(update.error);
  const set = (part: Partial<ProjectDraft>) => setDraft((before) => ({ ...before, ...part }));
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (update.isPending) return;
    // A project keeps its contractor.
    const { code, name, start, targetFinish, unit, hoursPerDay, calendar } = toInput(draft);
    update.mutate(
      { code, name, start, targetFinish, unit, hoursPerDay, ...(calendar ? { calendar } : {}) },
      {
        onSuccess: () => {
          toast('The project was changed; its figures follow.');
          onClose();
        },
      },
    );
  };
  return (
    <Dialog
      open
      wide
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
      title="Change the project"
      description="A new start, target or calendar moves the dates and chances of every revision. The estimates stay as they are."
      footer={
        <>
          <Button type="submit" form="project-settings" busy={update.isPending}>
            Save
          </Button>
          <Button variant="quiet" onClick={onClose}>
            Leave it as it is
          </Button>
        </>
      }
    >
      <form id="project-settings" onSubmit={submit} noValidate className="grid gap-4 sm:grid-cols-2">
        <div className="empty:hidden sm:col-span-2">
          <FormTrouble error={update.error} fields={PROJECT_FIELDS} />
        </div>
        <Field label="Code" error={errors.code} required>
          {(aria) => <Input {...aria} value={draft.code} onChange={(e) => set({ code: e.target.value })} />}
        </Field>
        <Field label="Name" error={errors.name} required>
          {(aria) => <Input {...aria} value={draft.name} onChange={(e) => set({ name: e.target.value })} />}
        </Field>
        <ScheduleFields draft={draft} errors={errors} onChange={set} />
      </form>
    </Dialog>
  );
}
