'use client';

import { useState, type FormEvent } from 'react';
import { useOfficeView } from '@/components/shell/office-context';
import { Button } from '@/components/ui/button';
import { Field, Input, Select } from '@/components/ui/field';
import { Panel } from '@/components/ui/panel';
import { useContractors } from '@/lib/client/contractors';
import { useCreateMember } from '@/lib/client/members';
import type { InvitationView } from '@/lib/contract/office';
import type { Role } from '@/lib/contract/shared';
import { FormTrouble, fieldErrorsOf } from './form-trouble';
import { ROLE_LINES } from './roles';

const ROLES = Object.keys(ROLE_LINES) as Role[];
const EMPTY = { name: '', email: '', role: 'analyst' as Role, contractor: '' };

export function NewMember({ onInvited }: { onInvited: (invitation: InvitationView) => void }) {
  const { slug } = useOfficeView();
  const create = useCreateMember(slug);
  const contractors = useContractors(slug);
  const [draft, setDraft] = useState(EMPTY);
  const errors = fieldErrorsOf(create.error);
  const scheduler = draft.role === 'scheduler';
  const set = (part: Partial<typeof EMPTY>) => setDraft((before) => ({ ...before, ...part }));

  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (create.isPending) return;
    const contractor = scheduler && draft.contractor !== '' ? draft.contractor : null;
    create.mutate(
      { name: draft.name.trim(), email: draft.email.trim(), role: draft.role, contractor },
      {
        onSuccess: (invitation) => {
          setDraft(EMPTY);
          onInvited(invitation);
        },
      },
    );
  };

  return (
    <Panel title="Add a person" sub="They get a one-time link to set a password of their own." bench>
      <form onSubmit={submit} noValidate className="grid gap-4 sm:grid-cols-2">
        <div className="empty:hidden sm:col-span-2">
          <FormTrouble error={create.error} fields={['name', 'email', 'role', 'contractor']} />
        </div>
        <Field label="Name" error={errors.name} required>
          {(aria) => (
            <Input
              {...aria}
              value={draft.name}
              maxLength={120}
              autoComplete="off"
              onChange={(e) => set({ name: e.target.value })}
            />
          )}
        </Field>
        <Field label="E-mail address" error={errors.email} required>
          {(aria) => (
            <Input
              {...aria}
              type="email"
              autoComplete="off"
              value={draft.email}
              onChange={(e) => set({ email: e.target.value })}
            />
          )}
        </Field>
        <Field label="Role" hint={ROLE_LINES[draft.role]} error={errors.role} required>
          {(aria) => (
            <Select {...aria} value={draft.role} onChange={(e) => set({ role: e.target.value as Role })}>
              {ROLES.map((role) => (
                <option key={role} value={role}>
                  {role}
                </option>
              ))}
            </Select>
          )}
        </Field>
        {scheduler && (
          <Field
            label="Contractor"
            hint={
              contractors.data?.length === 0
                ? 'Add the contractor first, under Contractors.'
                : 'The firm the person works for.'
            }
            error={errors.contractor}
            required
          >
            {(aria) => (
              <Select
                {...aria}
                value={draft.contractor}
                onChange={(e) => set({ contractor: e.target.value })}
              >
                <option value="">Choose one</option>
                {contractors.data?.map(({ id, name }) => (
                  <option key={id} value={id}>
                    {name}
                  </option>
                ))}
              </Select>
            )}
          </Field>
        )}
        <Button type="submit" busy={create.isPending} className="justify-self-start sm:col-span-2">
          Add and make the link
        </Button>
      </form>
    </Panel>
  );
}
