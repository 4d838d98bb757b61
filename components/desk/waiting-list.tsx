'use client';

import Link from 'next/link';
import { useOfficeView } from '@/components/shell/office-context';
import { DateText } from '@/components/ui/date-text';
import { useFormat } from '@/components/ui/locale';
import { Panel } from '@/components/ui/panel';
import { StateWord } from '@/components/ui/state-word';
import { OpenCounts } from './open-counts';
import type { ProjectView } from '@/lib/contract/project';
import { sentenceFor, sentenceForNothing, waitingFor, type Waiting } from './waiting';

export function WaitingList({ projects }: { projects: readonly ProjectView[] }) {
  const { me } = useOfficeView();
  const waiting = waitingFor(me.role, projects);
  if (waiting.length === 0) {
    return (
      <Panel title="Nothing waits for you" bench>
        <p className="text-slate">{sentenceForNothing(me.role)}</p>
      </Panel>
    );
  }
  return (
    <Panel
      title={
        waiting.length === 1 ? 'One thing waits for you' : `${String(waiting.length)} things wait for you`
      }
      bench
    >
      <ul>
        {waiting.map((item) => (
          <WaitingRow key={item.project.id} item={item} />
        ))}
      </ul>
    </Panel>
  );
}

function WaitingRow({ item }: { item: Waiting }) {
  const { slug } = useOfficeView();
  const format = useFormat();
  const { project, latest } = item;
  const toProject = item.task === 'revise' || item.task === 'first';
  const href = toProject || !latest ? `/${slug}/projects/${project.id}` : `/${slug}/submissions/${latest.id}`;
  return (
    <li className="grid gap-x-6 gap-y-1 border-b border-hair py-3 last:border-0 last:pb-0 sm:grid-cols-[minmax(0,1fr)_auto]">
      <div className="min-w-0">
        <Link href={href} className="text-base font-semibold">
          {project.name}
          {latest && `, Rev ${String(latest.revision)}`}
        </Link>
        <p className="text-slate">
          {project.contractor.name} · {project.code}
          {latest && (
            <>
              {' · '}
              <StateWord state={latest.status} /> · came in{' '}
              <DateText value={latest.receivedAt.slice(0, 10)} />
            </>
          )}
        </p>
        <p>{sentenceFor(item, format.count)}</p>
      </div>
      {latest && <OpenCounts open={latest.open} />}
    </li>
  );
}
