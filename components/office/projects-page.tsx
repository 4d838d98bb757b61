'use client';

import Link from 'next/link';
import { OpenCounts } from '@/components/desk/open-counts';
import { Crumbs } from '@/components/shell/crumbs';
import { useMay, useOfficeView } from '@/components/shell/office-context';
import { Page } from '@/components/shell/page';
import { ButtonLink } from '@/components/ui/button';
import { Caution } from '@/components/ui/caution';
import { DateText } from '@/components/ui/date-text';
import { useFormat } from '@/components/ui/locale';
import { StateWord } from '@/components/ui/state-word';
import { EmptyState, ErrorState, Loading } from '@/components/ui/states';
import { Table, Td, Th } from '@/components/ui/table';
import { useProjects } from '@/lib/client/projects';
import type { ProjectView } from '@/lib/contract/project';

export function ProjectsPage() {
  const { slug } = useOfficeView();
  const may = useMay();
  const projects = useProjects(slug);
  return (
    <Page
      title="Projects"
      sub="Each belongs to one contractor and holds the revisions of its activity list."
      aside={may('projects:create') && <ButtonLink href={`/${slug}/projects/new`}>New project</ButtonLink>}
    >
      <Crumbs trail={[{ label: 'Projects' }]} />
      {projects.isPending && <Loading label="Fetching the projects" rows={5} />}
      {projects.error && !projects.data && (
        <ErrorState error={projects.error} retry={() => void projects.refetch()} />
      )}
      {projects.data?.length === 0 && (
        <EmptyState title="There is no project yet.">
          {may('projects:create')
            ? 'Make one with the button above.'
            : 'An analyst of the office can make one.'}
        </EmptyState>
      )}
      {projects.data && projects.data.length > 0 && (
        <>
          <ProjectTable projects={projects.data} />
          <Caution />
        </>
      )}
    </Page>
  );
}

function ProjectTable({ projects }: { projects: readonly ProjectView[] }) {
  return (
    <Table label="Projects" className="border border-hair">
      <thead>
        <tr>
          <Th>Code</Th>
          <Th>Project</Th>
          <Th>Contractor</Th>
          <Th>Latest revision</Th>
          <Th>Findings open</Th>
          <Th numeric>Expected finish</Th>
          <Th numeric>Target</Th>
          <Th numeric>Chance</Th>
        </tr>
      </thead>
      <tbody>
        {projects.map((project) => (
          <ProjectRow key={project.id} project={project} />
        ))}
      </tbody>
    </Table>
  );
}

function ProjectRow({ project }: { project: ProjectView }) {
  const { slug } = useOfficeView();
  const format = useFormat();
  const { latest } = project;
  const chance = latest?.figures.chanceOfTarget;
  return (
    <tr>
      <Td className="whitespace-nowrap text-slate">{project.code}</Td>
      <Td className="min-w-44">
        <Link href={`/${slug}/projects/${project.id}`} className="font-semibold">
          {project.name}
        </Link>
      </Td>
      <Td>{project.contractor.name}</Td>
      <Td>
        {latest ? (
          <>
            <Link href={`/${slug}/submissions/${latest.id}`} className="whitespace-nowrap">
              Rev {latest.revision}
            </Link>{' '}
            <StateWord state={latest.status} />
          </>
        ) : (
          <span className="text-slate">none yet</span>
        )}
      </Td>
      <Td>{latest ? <OpenCounts open={latest.open} /> : '–'}</Td>
      <Td numeric>{latest ? <Finish latest={latest} /> : '–'}</Td>
      <Td numeric>{project.targetFinish ? <DateText value={project.targetFinish} /> : '–'}</Td>
      <Td numeric>{chance === null || chance === undefined ? '–' : format.percent(chance)}</Td>
    </tr>
  );
}

function Finish({ latest }: { latest: NonNullable<ProjectView['latest']> }) {
  const format = useFormat();
  const { finish, expectedDuration } = latest.figures;
  if (expectedDuration === null || finish === null) return <>not computable</>;
  return (
    <>
      <DateText value={finish} />
      <span className="block text-slate">{format.days(expectedDuration)}</span>
    </>
  );
}
