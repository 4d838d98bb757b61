'use client';

import { useState, type FormEvent } from 'react';
import { Crumbs } from '@/components/shell/crumbs';
import { useMay, useOfficeView } from '@/components/shell/office-context';
import { Page } from '@/components/shell/page';
import { Button } from '@/components/ui/button';
import { Field, Input } from '@/components/ui/field';
import { useFormat } from '@/components/ui/locale';
import { Panel } from '@/components/ui/panel';
import { EmptyState, ErrorState, Loading } from '@/components/ui/states';
import { Table, Td, Th } from '@/components/ui/table';
import { toast } from '@/components/ui/toast';
import { useContractors, useCreateContractor } from '@/lib/client/contractors';
import { FormTrouble, fieldErrorsOf } from './form-trouble';

export function ContractorsPage() {
  const { slug } = useOfficeView();
  const may = useMay();
  const contractors = useContractors(slug);
  return (
    <Page
      title="Contractors"
      sub="The firms whose activity lists come in. A scheduler sees only its own firm’s projects."
      narrow
    >
      <Crumbs trail={[{ label: 'Contractors' }]} />
      <div className="flex flex-col gap-5">
        {contractors.isPending && <Loading label="Fetching the contractors" />}
        {contractors.error && !contractors.data && (
          <ErrorState error={contractors.error} retry={() => void contractors.refetch()} />
        )}
        {contractors.data?.length === 0 && (
          <EmptyState title="There is no contractor yet.">
            {may('contractors:create')
              ? 'Add the first below; projects and schedulers belong to one.'
              : 'An administrator can add one.'}
          </EmptyState>
        )}
        {contractors.data && contractors.data.length > 0 && (
          <ContractorTable contractors={contractors.data} />
        )}
        {may('contractors:create') && <NewContractor />}
      </div>
    </Page>
  );
}

function ContractorTable({
  contractors,
}: {
  contractors: readonly { id: string; name: string; projects: number }[];
}) {
  const format = useFormat();
  return (
    <Table label="Contractors" className="border border-hair">
      <thead>
        <tr>
          <Th>Contractor</Th>
          <Th numeric>Projects</Th>
        </tr>
      </thead>
      <tbody>
        {contractors.map(({ id, name, projects }) => (
          <tr key={id}>
            <Td className="font-semibold">{name}</Td>
            <Td numeric>{format.count(projects)}</Td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}

function NewContractor() {
  const { slug } = useOfficeView();
  const create = useCreateContractor(slug);
  const [name, setName] = useState('');
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (create.isPending) return;
    create.mutate(
      { name: name.trim() },
      {
        onSuccess: (made) => {
          setName('');
          toast(`${made.name} was added.`);
        },
      },
    );
  };
  return (
    <Panel title="Add a contractor" bench>
      <form onSubmit={submit} noValidate className="flex flex-col gap-3">
        <FormTrouble error={create.error} fields={['name']} />
        <Field label="Name of the firm" error={fieldErrorsOf(create.error).name} required>
          {(aria) => (
            <Input {...aria} value={name} maxLength={120} onChange={(event) => setName(event.target.value)} />
          )}
        </Field>
        <Button type="submit" busy={create.isPending} className="self-start">
          Add the contractor
        </Button>
      </form>
    </Panel>
  );
}
