'use client';

import Link from 'next/link';
import type { ReactNode } from 'react';
import { useOfficeView } from '@/components/shell/office-context';
import { DateText } from '@/components/ui/date-text';
import { useFormat } from '@/components/ui/locale';
import { StateWord } from '@/components/ui/state-word';
import type { ProjectView } from '@/lib/contract/project';
import { OpenCounts } from './open-counts';
import { openCount, type Latest } from './waiting';

/** Each project with its latest revision's three figures. */
export function ProjectCards({ projects }: { projects: readonly ProjectView[] }) {
  return (
    <section aria-labelledby="projects-heading">
      <h2 id="projects-heading" className="mb-3 text-base font-semibold">
        Projects and their latest revisions
      </h2>
      <ul className="grid grid-cols-[repeat(auto-fill,minmax(min(100%,352px),1fr))] gap-4">
        {projects.map((project) => (
          <ProjectCard key={project.id} project={project} />
        ))}
      </ul>
    </section>
  );
}

function ProjectCard({ project }: { project: ProjectView }) {
  const { slug } = useOfficeView();
  const { latest } = project;
  return (
    <li className="flex flex-col border border-hair bg-leaf p-4">
      <h3 className="text-base font-semibold">
        <Link href={`/${slug}/projects/${project.id}`}>{project.name}</Link>
      </h3>
      <p className="text-slate">
        {project.code} · {project.contractor.name}
      </p>
      {latest ? (
        <>
          <p className="mt-3">
            <Link href={`/${slug}/submissions/${latest.id}`} className="font-semibold">
              Rev {latest.revision}
            </Link>{' '}
            · <StateWord state={latest.status} /> ·{' '}
            <span className="text-slate">
              came in <DateText value={latest.receivedAt.slice(0, 10)} />
            </span>
          </p>
          <Figures project={project} latest={latest} />
        </>
      ) : (
        <p className="mt-3 text-slate">No activity list has been handed in yet.</p>
      )}
    </li>
  );
}

function Figures({ project, latest }: { project: ProjectView; latest: Latest }) {
  const format = useFormat();
  const { computable, expectedDuration, finish, chanceOfTarget } = latest.figures;
  return (
    <dl className="mt-3 grid grid-cols-1 gap-3 border-t border-hair pt-3 sm:grid-cols-3">
      <Figure label="Findings open" value={format.count(openCount(latest))}>
        <OpenCounts open={latest.open} />
      </Figure>
      <Figure
        label="Expected finish"
        value={computable && expectedDuration !== null ? format.days(expectedDuration) : 'not computable'}
      >
        {finish && <DateText value={finish} />}
      </Figure>
      <Figure
        label="Chance of the target"
        value={chanceOfTarget === null ? '–' : format.percent(chanceOfTarget)}
      >
        {project.targetFinish ? <DateText value={project.targetFinish} /> : 'no target set'}
      </Figure>
    </dl>
  );
}

function Figure({ label, value, children }: { label: string; value: string; children: ReactNode }) {
  return (
    <div className="min-w-0">
      <dt className="text-slate">{label}</dt>
      <dd className="text-base font-semibold">{value}</dd>
      <dd className="text-slate">{children}</dd>
    </div>
  );
}
