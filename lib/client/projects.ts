'use client';

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { CalendarView } from '@/lib/contract/office';
import type { ProjectView } from '@/lib/contract/project';
import type { SubmissionView } from '@/lib/contract/submission';
import type { Unit } from '@/lib/schedule/activity';
import { call, officePath } from './http';
import { keys } from './keys';

export interface ProjectInput {
  readonly code: string;
  readonly name: string;
  readonly contractor: string;
  readonly start: string;
  readonly targetFinish: string | null;
  readonly unit: Unit | null;
  readonly hoursPerDay: number;
  readonly calendar?: CalendarView;
}

export function useProjects(office: string) {
  return useQuery({
    queryKey: keys.projects(office),
    queryFn: ({ signal }) => call<{ items: ProjectView[] }>(officePath(office, 'projects'), { signal }),
    select: (answer) => answer.items,
  });
}

export function useProject(office: string, project: string) {
  return useQuery({
    queryKey: keys.project(office, project),
    queryFn: ({ signal }) => call<ProjectView>(officePath(office, 'projects', project), { signal }),
  });
}

/** The submissions of a project, first revision first. */
export function useRevisions(office: string, project: string) {
  return useQuery({
    queryKey: keys.revisions(office, project),
    queryFn: ({ signal }) =>
      call<{ items: SubmissionView[] }>(officePath(office, 'projects', project, 'submissions'), { signal }),
    select: (answer) => [...answer.items].sort((a, b) => a.revision - b.revision),
  });
}

export function useCreateProject(office: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: ProjectInput) =>
      call<ProjectView>(officePath(office, 'projects'), { method: 'POST', body }),
    onSuccess: () => client.invalidateQueries({ queryKey: keys.projects(office) }),
  });
}

export function useUpdateProject(office: string, project: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: Partial<Omit<ProjectInput, 'contractor'>>) =>
      call<ProjectView>(officePath(office, 'projects', project), { method: 'PATCH', body }),
    // The start, the target and the calendar stand behind every figure of the office.
    onSuccess: () => client.invalidateQueries({ queryKey: keys.office(office) }),
  });
}
