'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { DropZone } from '@/components/intake/drop-zone';
import { handOver } from '@/components/intake/handover';
import { Crumbs } from '@/components/shell/crumbs';
import { useMay, useOfficeView } from '@/components/shell/office-context';
import { Page } from '@/components/shell/page';
import { Caution } from '@/components/ui/caution';
import { Panel } from '@/components/ui/panel';
import { EmptyState, ErrorState, Loading } from '@/components/ui/states';
import { useProject, useRevisions } from '@/lib/client/projects';
import type { ProjectView } from '@/lib/contract/project';
import { ProjectSettings } from './project-settings';
import { RevisionTable } from './revision-table';
import { RevisionTrend } from './revision-trend';

/** A project: its revisions in order, how findings and finish moved over them, calendar and target. */
export function ProjectPage({ id }: { id: string }) {
  const { slug } = useOfficeView();
  const project = useProject(slug, id);
  const trail = [
    { label: 'Projects', href: `/${slug}/projects` },
    { label: project.data?.name ?? 'Project' },
  ];
  return (
    <Page
      title={project.data?.name ?? 'Project'}
      sub={project.data && `${project.data.code} · ${project.data.contractor.name}`}
    >
      <Crumbs trail={trail} />
      {project.isPending && <Loading label="Fetching the project" rows={5} />}
      {project.error && !project.data && (
        <ErrorState error={project.error} retry={() => void project.refetch()} />
      )}
      {project.data && <ProjectBody project={project.data} />}
    </Page>
  );
}

function ProjectBody({ project }: { project: ProjectView }) {
  const may = useMay();
  return (
    <div className="grid gap-5 lg:grid-cols-[minmax(0,1fr)_372px]">
      <div className="flex min-w-0 flex-col gap-5">
        <Revisions project={project} />
      </div>
      <div className="flex min-w-0 flex-col gap-5">
        {may('submissions:create') && <HandIn project={project} />}
        <ProjectSettings project={project} />
      </div>
    </div>
  );
}

function Revisions({ project }: { project: ProjectView }) {
  const { slug } = useOfficeView();
  const revisions = useRevisions(slug, project.id);
  if (revisions.data && revisions.data.length > 0) {
    return (
      <>
        <Panel title="Revisions" sub="In the order they came in." bench>
          <RevisionTable revisions={revisions.data} />
        </Panel>
        {revisions.data.length > 1 && <RevisionTrend revisions={revisions.data} />}
        <Caution />
      </>
    );
  }
  return (
    <Panel title="Revisions" bench>
      {revisions.isPending && <Loading label="Fetching the revisions" />}
      {revisions.error && !revisions.data && (
        <ErrorState error={revisions.error} retry={() => void revisions.refetch()} />
      )}
      {revisions.data && (
        <EmptyState title="No activity list has been handed in yet.">
          The first one becomes Rev 0. What is wrong with it, what sets its finish and how sure the date is
          are shown at once.
        </EmptyState>
      )}
    </Panel>
  );
}

function HandIn({ project }: { project: ProjectView }) {
  const { slug } = useOfficeView();
  const router = useRouter();
  const [refused, setRefused] = useState<string | null>(null);
  const next = project.latest ? project.latest.revision + 1 : 0;
  const take = (file: File) => {
    handOver(project.id, file, 'take');
    router.push(`/${slug}/projects/${project.id}/intake`);
  };
  return (
    <Panel title={`Hand in Rev ${String(next)}`}>
      {refused && (
        <p role="alert" className="mb-3 border-l-4 border-umber py-1 pl-3 font-semibold">
          {refused}
        </p>
      )}
      <DropZone compact onFile={take} onRefused={setRefused} />
    </Panel>
  );
}
