'use client';

import { useEffect, useRef, type ReactNode } from 'react';
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

  useEffect(() => {
    // What was dropped on the project's page is taken in here.
    const file = handedOver(project.id, again ? 'again' : 'take');
    if (file) void take(file, { look: again });
  }, [again, project.id, take]);

  return (
    <StagePlace at={stage.at}>
      <StageView intake={intake} again={again} />
    </StagePlace>
  );
}

/** Takes the focus along when the stage changes: what held it is gone from the page. */
function StagePlace({ at, children }: { at: string; children: ReactNode }) {
  const place = useRef<HTMLDivElement>(null);
  const before = useRef(at);
  useEffect(() => {
    if (before.current !== at) place.current?.focus({ preventScroll: true });
    before.current = at;
  }, [at]);
  return (
    <div ref={place} tabIndex={-1}>
      {children}
    </div>
  );
}

function StageView({ intake, again }: { intake: ReturnType<typeof useIntake>; again: boolean }) {
  const { stage, take, refuse, cancel } = intake;
  switch (stage.at) {
    case 'choose':
      return (
        <ChooseStage
          stage={stage}
          again={again}
          onFile={(file) => void take(file, { look: again })}
          onRefused={refuse}
        />
      );
    case 'reading':
      return <TransferStage file={stage.file} share={stage.share} doing="reading" onCancel={cancel} />;
    case 'sending':
      return <TransferStage file={stage.file} share={stage.share} doing="sending" onCancel={cancel} />;
    case 'matching':
      return <MatchingStage stage={stage} intake={intake} />;
  }
}
