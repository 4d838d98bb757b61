'use client';

import { useQuery, type QueryClient } from '@tanstack/react-query';
import type { ScheduleState } from '@/lib/schedule/weight';
import type { ActivityView, AnalysisView, ChanceView, SubmissionView } from '@/lib/contract/submission';
import { call, officePath, withQuery } from './http';
import { keys } from './keys';

/** What follows from the cells: to be computed anew by the server once a cell changes. */
const DERIVED = ['activities', 'analysis', 'chance', 'rows'] as const;

export function submissionPath(office: string, submission: string, ...segments: readonly string[]): string {
  return officePath(office, 'submissions', submission, ...segments);
}

/** Address of the workbook in one of its states, for a link that downloads it. */
export function workbookPath(office: string, submission: string, state: 'received' | 'corrected'): string {
  return withQuery(submissionPath(office, submission, 'workbook'), { state });
}

/** The event stream keeps it fresh; see `useSubmissionEvents`. */
export function useSubmission(office: string, submission: string) {
  return useQuery({
    queryKey: keys.submission(office, submission),
    queryFn: ({ signal }) => call<SubmissionView>(submissionPath(office, submission), { signal }),
    staleTime: 60_000,
  });
}

export function useActivities(office: string, submission: string, state: ScheduleState, enabled = true) {
  return useQuery({
    queryKey: keys.submissionPart(office, submission, 'activities', state),
    queryFn: ({ signal }) =>
      call<{ items: ActivityView[] }>(
        withQuery(submissionPath(office, submission, 'activities'), { state }),
        { signal },
      ),
    select: (answer) => answer.items,
    staleTime: 300_000,
    enabled,
  });
}

export function useAnalysis(office: string, submission: string, state: ScheduleState, enabled = true) {
  return useQuery({
    queryKey: keys.submissionPart(office, submission, 'analysis', state),
    queryFn: ({ signal }) =>
      call<AnalysisView>(withQuery(submissionPath(office, submission, 'analysis'), { state }), { signal }),
    staleTime: 300_000,
    enabled,
  });
}

/** What is asked of the chance: a number of working days, a date, or a confidence between 0 and 1. */
export type ChanceQuestion = { days: number } | { date: string } | { confidence: number };

export function useChance(
  office: string,
  submission: string,
  state: ScheduleState,
  question: ChanceQuestion | null,
) {
  return useQuery({
    queryKey: keys.submissionPart(office, submission, 'chance', state, question),
    queryFn: ({ signal }) =>
      call<ChanceView>(withQuery(submissionPath(office, submission, 'chance'), { ...question, state }), {
        signal,
      }),
    staleTime: 300_000,
    enabled: question !== null,
  });
}

/** Marks what the cells give as stale; only what is on the screen is fetched again. */
export async function invalidateDerived(
  client: QueryClient,
  office: string,
  submission: string,
): Promise<void> {
  const parts = [...DERIVED, 'record', 'corrections'].map((part) => ({
    queryKey: keys.submissionPart(office, submission, part),
  }));
  // A first answer still on its way was asked for before the step: invalidating would wait for it and keep it.
  await Promise.all(parts.map((part) => client.cancelQueries(part)));
  await Promise.all(parts.map((part) => client.invalidateQueries(part)));
}
