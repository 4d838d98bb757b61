'use client';

import { useQuery } from '@tanstack/react-query';
import type { RecordEntryView } from '@/lib/contract/submission';
import { call } from './http';
import { keys } from './keys';
import { submissionPath } from './submissions';

export type RecordEntries = { readonly items: readonly RecordEntryView[] };

function recordKey(office: string, submission: string) {
  return keys.submissionPart(office, submission, 'record');
}

function fetchRecord(office: string, submission: string, signal?: AbortSignal): Promise<RecordEntries> {
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

/** The latest entry as a sentence about who did it; null where the record cannot be had. */
export async function latestDeed(office: string, submission: string): Promise<string | null> {
  try {
    const { items } = await fetchRecord(office, submission);
    const [latest] = newestFirst({ items });
    return latest ? deedSentence(latest) : null;
  } catch {
    // It only adds to what is said anyway.
    return null;
  }
}

/** "Piet Ostra adopted 3 fixes in 4 cells.", from an entry whose sentence begins with its verb. */
export function deedSentence({ by, summary }: RecordEntryView): string {
  const said = summary.replace(/[.\s]+$/, '');
  const begun = /^Rev \d/.test(said) ? `: ${said}` : ` ${said.charAt(0).toLowerCase()}${said.slice(1)}`;
  return `${by}${begun}.`;
}

function newestFirst(answer: RecordEntries): readonly RecordEntryView[] {
  return [...answer.items].sort((x, y) => y.sequence - x.sequence);
}
