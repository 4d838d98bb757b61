'use client';

import { useQuery } from '@tanstack/react-query';
import type { RecordEntryView } from '@/lib/contract/submission';
import { call } from './http';
import { keys } from './keys';
import { submissionPath } from './submissions';

export type RecordEntries = { readonly items: readonly RecordEntryView[] };

export function recordKey(office: string, submission: string) {
  return keys.submissionPart(office, submission, 'record');
}

export function fetchRecord(
  office: string,
  submission: string,
  signal?: AbortSignal,
): Promise<RecordEntries> {
  return call<RecordEntries>(submissionPath(office, submission, 'record'), signal ? { signal } : {});
}

/** What was done, the latest first. */
export function useRecord(office: string, submission: string) {
  return useQuery({
    queryKey: recordKey(office, submission),
    queryFn: ({ signal }) => fetchRecord(office, submission, signal),
    select: newestFirst,
    staleTime: 30_000,
  });
}

function newestFirst(answer: RecordEntries): readonly RecordEntryView[] {
  return [...answer.items].sort((x, y) => y.sequence - x.sequence);
}
