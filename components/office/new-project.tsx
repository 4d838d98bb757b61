'use client';

import { useRouter } from 'next/navigation';
import { useState, type FormEvent } from 'react';
import { Crumbs } from '@/components/shell/crumbs';
import { useMay, useOfficeView } from '@/components/shell/office-context';
import { Page } from '@/components/shell/page';
import { Button, ButtonLink } from '@/components/ui/button';
import { Field, Input, Select } from '@/components/ui/field';
import { Panel } from '@/components/ui/panel';
import { EmptyState } from '@/components/ui/states';
import { useContractors } from '@/lib/client/contractors';
import { useCreateProject } from '@/lib/client/projects';
import { FormTrouble, fieldErrorsOf } from './form-trouble';
import { EMPTY_DRAFT, PROJECT_FIELDS, toInput, type ProjectDraft } from './project-draft';
import { ScheduleFields } from './schedule-fields';

export function NewProjectPage() {
  const { slug } = useOfficeView();
  const may = useMay();
  return (
    <Page title="New project" sub="Its activity list comes in afterwards, revision by revision." narrow>
      <Crumbs trail={[{ label: 'Projects', href: `/${slug}/projects` }, { label: 'New' }]} />
      {may('projects:create') ? (
        <NewProjectForm />
      ) : (
        <EmptyState title="Your role does not make projects.">
          An analyst or the administrator does.
        </EmptyState>
      )}
    </Page>
  );
}

function NewProjectForm() {
  const { slug } = useOfficeView();
  const router = useRouter();
  const create = useCreateProject(slug);
  const contractors = useContractors(slug);
  const [draft, setDraft] = useState<ProjectDraft>(EMPTY_DRAFT);
  const errors = fieldErrorsOf(create.error);
  const set = (part: Partial<ProjectDraft>) => setDraft((before) => ({ ...before, ...part }));
  const busy = create.isPending || create.isSuccess;

  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (busy) return;
    create.mutate(toInput(draft), { onSuccess: ({ id }) => router.push(`/${slug}/projects/${id}`) });
  };

  return (
    <Panel bench>
      <form onSubmit={submit} noValidate className="grid gap-4 sm:grid-cols-2">
        <div className="empty:hidden sm:col-span-2">
          <FormTrouble error={create.error} fields={PROJECT_FIELDS} />
        </div>
        <Field
          label="Contractor"
          hint={
            contractors.data?.length === 0
              ? 'There is none yet; an administrator adds contractors.'
              : 'Whose activity list it is.'
          }
          error={errors.contractor}
          required
          className="sm:col-span-2"
        >
          {(aria) => (
            <Select {...aria} value={draft.contractor} onChange={(e) => set({ contractor: e.target.value })}>
              <option value="">Choose one</option>
              {contractors.data?.map(({ id, name }) => (
                <option key={id} value={id}>
                  {name}
                </option>
              ))}
            </Select>
          )}
        </Field>
        <Field label="Code" hint="Short, as your office writes it." error={errors.code} required>
          {(aria) => (
            <Input
              {...aria}
              value={draft.code}
              maxLength={40}
              onChange={(e) => set({ code: e.target.value })}
            />
          )}
        </Field>
        <Field label="Name" hint="As it is spoken of." error={errors.name} required>
          {(aria) => (
            <Input
              {...aria}
              value={draft.name}
              maxLength={160}
              onChange={(e) => set({ name: e.target.value })}
            />
          )}
        </Field>
        <ScheduleFields draft={draft} errors={errors} onChange={set} />
        <div className="flex flex-wrap gap-2 sm:col-span-2">
          <Button type="submit" busy={busy}>
            {busy ? 'Making the project …' : 'Make the project'}
          </Button>
          <ButtonLink href={`/${slug}/projects`} variant="quiet">
            Back to the projects
          </ButtonLink>
        </div>
      </form>
    </Panel>
  );
}
