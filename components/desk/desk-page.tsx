'use client';

import { Crumbs } from '@/components/shell/crumbs';
import { useMay, useOfficeView } from '@/components/shell/office-context';
import { Page } from '@/components/shell/page';
import { ButtonLink } from '@/components/ui/button';
import { Caution } from '@/components/ui/caution';
import { EmptyState, ErrorState, Loading } from '@/components/ui/states';
import { useProjects } from '@/lib/client/projects';
import { ProjectCards } from './project-cards';
import { WaitingList } from './waiting-list';

/** What waits for me, across projects; then each project's last revision with its three figures. */
export function DeskPage() {
  const { slug, name, me } = useOfficeView();
  const may = useMay();
  const projects = useProjects(slug);
  const scheduler = me.role === 'scheduler';
  return (
    <Page
      title="Desk"
      sub={scheduler ? `Your projects with ${name}.` : `${name}: what has come in, and what waits for you.`}
      aside={may('projects:create') && <ButtonLink href={`/${slug}/projects/new`}>New project</ButtonLink>}
    >
      <Crumbs trail={[{ label: 'Desk' }]} />
      {projects.error && !projects.data && (
        <ErrorState error={projects.error} retry={() => void projects.refetch()} />
      )}
      {projects.isPending && <Loading label="Fetching the projects" rows={5} />}
      {projects.data?.length === 0 && (
        <NoProjects scheduler={scheduler} mayCreate={may('projects:create')} slug={slug} />
      )}
      {projects.data && projects.data.length > 0 && (
        <div className="flex flex-col gap-7">
          <WaitingList projects={projects.data} />
          <ProjectCards projects={projects.data} />
        </div>
      )}
      {projects.data && projects.data.length > 0 && <Caution />}
    </Page>
  );
}

function NoProjects({
  scheduler,
  mayCreate,
  slug,
}: {
  scheduler: boolean;
  mayCreate: boolean;
  slug: string;
}) {
  if (scheduler) {
    return (
      <EmptyState title="No project of yours is here yet.">
        As soon as the office sets one up for your firm, you can hand in its activity list here.
      </EmptyState>
    );
  }
  return (
    <EmptyState
      title="There is no project yet."
      action={mayCreate && <ButtonLink href={`/${slug}/projects/new`}>Make the first project</ButtonLink>}
    >
      A project belongs to one contractor and holds its revisions.{' '}
      {mayCreate ? '' : 'An analyst can make one.'}
    </EmptyState>
  );
}
