'use client';

import { useEffect, useRef } from 'react';
import { Crumbs } from '@/components/shell/crumbs';
import { useMay, useOfficeView } from '@/components/shell/office-context';
import { Page } from '@/components/shell/page';
import { EmptyState, ErrorState, Loading } from '@/components/ui/states';
import { useProject } from '@/lib/client/projects';
import type { ProjectView } from '@/lib/contract/project';
import { ChooseStage } from './choose-stage';
import { handedOver } from './handover';
import { MatchingStage } from './matching-stage';
import { TransferStage } from './transfer-stage';
import { useIntake } from './use-intake';

/** Drop, see what was detected, change it, confirm. `again`: read anew what has just gone straight through. */
export function IntakePage({ project: id, again }: { project: string; again: boolean }) {
  const { slug } = useOfficeView();
  const may = useMay();
  const project = useProject(slug, id);
  const name = project.data?.name ?? 'Project';
  const next = project.data?.latest ? project.data.latest.revision + 1 : 0;
  return (
    <Page
      title={project.data ? `Hand in Rev ${String(next)}` : 'Hand in a revision'}
      sub={project.data && `${project.data.name} · ${project.data.contractor.name}`}
    >
      <Crumbs
        trail={[
          { label: 'Projects', href: `/${slug}/projects` },
          { label: name, href: `/${slug}/projects/${id}` },
          { label: 'Hand in' },
        ]}
      />
      {project.isPending && <Loading label="Fetching the project" />}
      {project.error && !project.data && (
        <ErrorState error={project.error} retry={() => void project.refetch()} />
      )}
      {project.data && !may('submissions:create') && (
        <EmptyState title="Your role does not hand in activity lists.">
          The contractor’s scheduler does, or an analyst of the office.
        </EmptyState>
      )}
      {project.data && may('submissions:create') && <Intake project={project.data} again={again} />}
    </Page>
  );
}

function Intake({ project, again }: { project: ProjectView; again: boolean }) {
  const { slug } = useOfficeView();
  const intake = useIntake(slug, project.id);
  const { stage, take } = intake;
  const begun = useRef(false);

  useEffect(() => {
    // Once, also where React mounts twice: what was dropped on the project's page is taken in here.
    if (begun.current) return;
    begun.current = true;
    const file = handedOver(project.id);
    if (file) void take(file, { look: again });
  }, [again, project.id, take]);

  switch (stage.at) {
    case 'choose':
      return (
        <ChooseStage
          stage={stage}
          again={again}
          onFile={(file) => void take(file, { look: again })}
          onRefused={intake.refuse}
        />
      );
    case 'reading':
      return <TransferStage file={stage.file} share={stage.share} doing="reading" onCancel={intake.cancel} />;
    case 'sending':
      return <TransferStage file={stage.file} share={stage.share} doing="sending" onCancel={intake.cancel} />;
    case 'matching':
      return <MatchingStage stage={stage} intake={intake} />;
  }
}
