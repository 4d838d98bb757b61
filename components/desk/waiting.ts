import type { ProjectView } from '@/lib/contract/project';
import type { Role } from '@/lib/contract/shared';

export type Latest = NonNullable<ProjectView['latest']>;

export interface Waiting {
  readonly project: ProjectView;
  /** Null where the first revision is still to come. */
  readonly latest: Latest | null;
  /** What there is to do, as the start of a sentence. */
  readonly task: 'review' | 'decide' | 'answer' | 'revise' | 'first';
}

/** How many findings of a submission are open, whatever their weight. */
export function openCount(latest: Latest): number {
  return latest.open.blocks + latest.open.distorts + latest.open.query;
}

/**
 * What waits for somebody of this role: for the office's people the revisions that came in and are not
 * decided, for a scheduler those that came back or have open findings. What blocks comes first, then what
 * has waited longest.
 */
export function waitingFor(role: Role, projects: readonly ProjectView[]): Waiting[] {
  const found = projects.flatMap((project): Waiting[] => {
    const task = role === 'scheduler' ? schedulerTask(project.latest) : officeTask(role, project.latest);
    return task ? [{ project, latest: project.latest, task }] : [];
  });
  return found.sort(
    (a, b) =>
      Number((b.latest?.open.blocks ?? 0) > 0) - Number((a.latest?.open.blocks ?? 0) > 0) ||
      (a.latest?.receivedAt ?? '').localeCompare(b.latest?.receivedAt ?? '') ||
      a.project.code.localeCompare(b.project.code),
  );
}

function officeTask(role: Role, latest: Latest | null): Waiting['task'] | null {
  if (!latest || (latest.status !== 'received' && latest.status !== 'under review')) return null;
  if (openCount(latest) > 0) return 'review';
  return role === 'analyst' ? 'decide' : null;
}

function schedulerTask(latest: Latest | null): Waiting['task'] | null {
  if (!latest) return 'first';
  if (latest.status === 'returned') return 'revise';
  const undecided = latest.status === 'received' || latest.status === 'under review';
  return undecided && openCount(latest) > 0 ? 'answer' : null;
}

/** Why nothing waits for somebody of this role. */
export function sentenceForNothing(role: Role): string {
  if (role === 'scheduler') return 'None of your revisions came back, and none has an open finding.';
  if (role === 'analyst') return 'Each revision that came in has been dealt with.';
  return 'No revision that is still to be decided has an open finding.';
}

/** What there is to do, as a plain sentence; `count` writes a number as the office does. */
export function sentenceFor({ task, latest }: Waiting, count: (value: number) => string = String): string {
  const open = latest ? openCount(latest) : 0;
  switch (task) {
    case 'review':
      return open === 1 ? 'One finding is open.' : `${count(open)} findings are open.`;
    case 'decide':
      return 'No finding is open; it can be decided.';
    case 'answer':
      return open === 1 ? 'One finding waits for an answer.' : `${count(open)} findings wait for an answer.`;
    case 'revise':
      return 'It was returned; the next revision is yours.';
    case 'first':
      return 'No activity list has been handed in yet.';
  }
}
