'use client';

import { useIsMutating, useQueryClient, type QueryClient } from '@tanstack/react-query';
import { useEffect, useEffectEvent, useRef, useState } from 'react';
import type { z } from 'zod';
import type { submissionEvent, SubmissionView } from '@/lib/contract/submission';
import { commentsKey } from './comments';
import { correctionsKey, refetchAll } from './corrections';
import { keys } from './keys';
import { latestDeed } from './record';
import { submissionPath } from './submissions';

export type SubmissionEvent = z.infer<typeof submissionEvent>;

const KINDS = [
  'comment',
  'correction',
  'fix',
  'status',
] as const satisfies readonly SubmissionEvent['kind'][];

/** How often to look while no event stream can be had. */
const LOOK_EVERY_MS = 10_000;
/** A stream the server closed for good is opened again after this. */
const REOPEN_MS = 5_000;

/** An event's data; null where it is none of ours. */
export function readEvent(data: string): SubmissionEvent | null {
  let value: unknown;
  try {
    value = JSON.parse(data);
  } catch {
    return null;
  }
  if (typeof value !== 'object' || value === null || !('kind' in value)) return null;
  const kind = KINDS.find((known) => known === value.kind);
  if (!kind) return null;
  return {
    kind,
    ...('version' in value && typeof value.version === 'number' ? { version: value.version } : {}),
    ...('id' in value && typeof value.id === 'string' ? { id: value.id } : {}),
  };
}

/**
 * Whether an event tells of something this page does not show yet. Our own steps come back as events too:
 * their version is already here once their answer is.
 */
export function isNews(event: SubmissionEvent, knownVersion: number | undefined): boolean {
  if (event.kind === 'comment') return true;
  return event.version === undefined || knownVersion === undefined || event.version > knownVersion;
}

export interface Subscription {
  close(): void;
}

/** Listens to a submission; `onGap` is called whenever events may have been missed. */
export function subscribe(
  url: string,
  onEvent: (event: SubmissionEvent) => void,
  onGap: () => void,
): Subscription {
  let source: EventSource | null = null;
  let reopening: ReturnType<typeof setTimeout> | undefined;
  let looking: ReturnType<typeof setInterval> | undefined;
  let wasOpen = false;

  const hear = (message: MessageEvent<string>) => {
    const event = readEvent(message.data);
    if (event) onEvent(event);
  };
  const open = () => {
    const stream = new EventSource(url);
    source = stream;
    for (const kind of KINDS) stream.addEventListener(kind, hear);
    stream.onmessage = hear;
    stream.onopen = () => {
      clearInterval(looking);
      looking = undefined;
      if (wasOpen) onGap();
      wasOpen = true;
    };
    stream.onerror = () => {
      looking ??= setInterval(onGap, LOOK_EVERY_MS);
      if (stream.readyState !== EventSource.CLOSED) return;
      clearTimeout(reopening);
      reopening = setTimeout(open, REOPEN_MS);
    };
  };
  open();
  return {
    close() {
      clearTimeout(reopening);
      clearInterval(looking);
      source?.close();
    },
  };
}

/** What others did meanwhile, in a sentence. */
export interface News {
  readonly sentence: string;
  readonly dismiss: () => void;
}

/** Keeps the caches of a submission fresh while a page of it is open; null while there is nothing to tell. */
export function useSubmissionEvents(office: string, submission: string): News | null {
  const client = useQueryClient();
  const [sentence, setSentence] = useState<string | null>(null);
  const ownSteps = useIsMutating({ mutationKey: correctionsKey(office, submission) });
  const waiting = useRef<SubmissionEvent[]>([]);

  const take = useEffectEvent((event: SubmissionEvent) => {
    if (event.kind === 'comment') {
      void client.invalidateQueries({ queryKey: commentsKey(office, submission) });
    } else if (ownSteps > 0) {
      // Whether it tells of our own step is known once that step's answer is here.
      waiting.current.push(event);
    } else if (isNews(event, knownVersion(client, office, submission))) {
      void refetchAll(client, office, submission);
      void tellLatest(office, submission, setSentence);
    }
  });
  const catchUp = useEffectEvent(() => void lookForChanges(client, office, submission));

  useEffect(() => {
    const url = submissionPath(office, submission, 'events');
    const subscription = subscribe(
      url,
      (event) => take(event),
      () => catchUp(),
    );
    return () => subscription.close();
  }, [office, submission]);

  useEffect(() => {
    if (ownSteps > 0) return;
    for (const event of waiting.current.splice(0)) take(event);
  }, [ownSteps]);

  return sentence === null ? null : { sentence, dismiss: () => setSentence(null) };
}

function knownVersion(client: QueryClient, office: string, submission: string): number | undefined {
  return client.getQueryData<SubmissionView>(keys.submission(office, submission))?.version;
}

/** After a gap: the comments, and everything else only where the version says that something changed. */
async function lookForChanges(client: QueryClient, office: string, submission: string): Promise<void> {
  const before = knownVersion(client, office, submission);
  void client.invalidateQueries({ queryKey: commentsKey(office, submission) });
  await client.refetchQueries({ queryKey: keys.submission(office, submission), exact: true });
  if (knownVersion(client, office, submission) !== before) await refetchAll(client, office, submission);
}

async function tellLatest(
  office: string,
  submission: string,
  tell: (sentence: string) => void,
): Promise<void> {
  const deed = await latestDeed(office, submission);
  tell(`${deed ?? 'Someone else changed this submission.'} What you see is new.`);
}
