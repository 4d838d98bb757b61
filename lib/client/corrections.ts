'use client';

import { queryOptions, useMutation, useQuery, useQueryClient, type QueryClient } from '@tanstack/react-query';
import type { CorrectionResult, CorrectionView, SubmissionView } from '@/lib/contract/submission';
import { ClientError } from './error';
import { findingsKey, withAdopted, withFix, withResult, type Findings } from './findings';
import { call, withQuery } from './http';
import { keys } from './keys';
import { invalidateDerived, submissionPath } from './submissions';

export interface HandEdit {
  readonly sheet: string;
  readonly cell: string;
  readonly to: string | number | null;
}

/** One step that changes cells, or takes a change back. */
export type CorrectionStep =
  | { readonly kind: 'adopt'; readonly fixes: readonly string[] }
  | { readonly kind: 'edit'; readonly edits: readonly HandEdit[]; readonly finding: string | null }
  | { readonly kind: 'undo'; readonly correction: string };

export function correctionsKey(office: string, submission: string) {
  return keys.submissionPart(office, submission, 'corrections');
}

function correctionsQuery(office: string, submission: string) {
  return queryOptions({
    queryKey: correctionsKey(office, submission),
    queryFn: ({ signal }) =>
      call<{ items: CorrectionView[] }>(submissionPath(office, submission, 'corrections'), { signal }),
  });
}

/** The corrections in force: who made which, and when. */
export function useCorrections(office: string, submission: string, enabled: boolean) {
  return useQuery({
    ...correctionsQuery(office, submission),
    select: (answer) => answer.items,
    enabled,
  });
}

/** The same, fetched anew for undoing one that was not made on this page. */
export async function fetchCorrections(client: QueryClient, office: string, submission: string) {
  const answer = await client.fetchQuery({ ...correctionsQuery(office, submission), staleTime: 0 });
  return answer.items;
}

/** Steps run one after the other, each with the version the one before it left. */
function serially(submission: string) {
  return { id: `corrections:${submission}` };
}

export function useCorrect(office: string, submission: string) {
  const client = useQueryClient();
  return useMutation({
    mutationKey: correctionsKey(office, submission),
    scope: serially(submission),
    mutationFn: (step: CorrectionStep) => send(client, office, submission, step),
    onMutate: async (step) => {
      if (step.kind !== 'adopt') return { before: undefined };
      return {
        before: await foresee(client, office, submission, (all) => withAdopted(all, new Set(step.fixes))),
      };
    },
    onSuccess: (result) => settle(client, office, submission, result),
    onError: (error, _step, context) => takeBack(client, office, submission, error, context?.before),
  });
}

export interface FixStep {
  readonly fix: string;
  readonly state: 'declined' | 'proposed';
}

/** Declines a fix, or proposes it again. */
export function useSetFix(office: string, submission: string) {
  const client = useQueryClient();
  return useMutation({
    mutationKey: correctionsKey(office, submission),
    scope: serially(submission),
    mutationFn: ({ fix, state }: FixStep) =>
      call<CorrectionResult>(submissionPath(office, submission, 'fixes', fix), {
        method: 'PATCH',
        body: { state, version: versionOf(client, office, submission) },
      }),
    onMutate: async ({ fix, state }) => ({
      before: await foresee(client, office, submission, (all) => withFix(all, fix, state)),
    }),
    onSuccess: (result) => settle(client, office, submission, result),
    onError: (error, _step, context) => takeBack(client, office, submission, error, context?.before),
  });
}

function send(client: QueryClient, office: string, submission: string, step: CorrectionStep) {
  const version = versionOf(client, office, submission);
  const path = submissionPath(office, submission, 'corrections');
  if (step.kind === 'undo') {
    return call<CorrectionResult>(withQuery(`${path}/${encodeURIComponent(step.correction)}`, { version }), {
      method: 'DELETE',
    });
  }
  const body =
    step.kind === 'adopt'
      ? { version, fixes: step.fixes }
      : { version, edits: step.edits, ...(step.finding ? { finding: step.finding } : {}) };
  return call<CorrectionResult>(path, { method: 'POST', body });
}

/** Read when the step starts: a step waiting behind another sends the version that one left. */
function versionOf(client: QueryClient, office: string, submission: string): number {
  return client.getQueryData<SubmissionView>(keys.submission(office, submission))?.version ?? 0;
}

async function foresee(
  client: QueryClient,
  office: string,
  submission: string,
  change: (findings: Findings) => Findings,
): Promise<Findings | undefined> {
  const key = findingsKey(office, submission);
  await client.cancelQueries({ queryKey: key });
  const before = client.getQueryData<Findings>(key);
  if (before) client.setQueryData<Findings>(key, change(before));
  return before;
}

/** Puts the answer into the caches: the findings are patched, the figures replaced, the rest marked stale. */
function settle(client: QueryClient, office: string, submission: string, result: CorrectionResult) {
  client.setQueryData<Findings>(findingsKey(office, submission), (findings) =>
    findings ? withResult(findings, result) : findings,
  );
  client.setQueryData<SubmissionView>(keys.submission(office, submission), result.submission);
  // Not waited for: the step is made, and the next one may begin.
  void invalidateDerived(client, office, submission);
}

/** A refused step leaves nothing behind; where someone else was first, what they did is fetched. */
function takeBack(
  client: QueryClient,
  office: string,
  submission: string,
  error: Error,
  before: Findings | undefined,
) {
  if (before) client.setQueryData<Findings>(findingsKey(office, submission), before);
  if (error instanceof ClientError && error.status > 0 && error.status < 500 && error.status !== 409) return;
  return refetchAll(client, office, submission);
}

/** Everything of a submission, after someone else changed it or the connection was lost. */
export function refetchAll(client: QueryClient, office: string, submission: string): Promise<void> {
  return client.invalidateQueries({ queryKey: keys.submission(office, submission) });
}
