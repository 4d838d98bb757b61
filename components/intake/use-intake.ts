'use client';

import { useQueryClient } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useCallback, useEffect, useRef, useState } from 'react';
import { ClientError, sentenceOf } from '@/lib/client/error';
import { detect, submit, type MatchingChoice } from '@/lib/client/intake';
import { keys } from '@/lib/client/keys';
import type { IntakeView } from '@/lib/contract/intake';
import { detectedIn, existingIn } from './detected';
import { forget, handOver } from './handover';
import { choiceOf, draftOf, readAs, type MatchingDraft } from './matching';
import { noteReading } from './read-note';

export interface Trouble {
  readonly sentence: string;
  /** The revision that this very file is already: it can be looked at, or handed in all the same. */
  readonly existing: { readonly id: string; readonly revision: number } | null;
}

export type Stage =
  | { at: 'choose'; file: File | null; trouble: Trouble | null }
  | { at: 'reading'; file: File; share: number }
  | {
      at: 'matching';
      file: File;
      view: IntakeView;
      draft: MatchingDraft;
      rereading: boolean;
      trouble: Trouble | null;
    }
  | { at: 'sending'; file: File; share: number; view: IntakeView; draft: MatchingDraft };

const START: Stage = { at: 'choose', file: null, trouble: null };

/** The way of a file: dropped → detected → changed → confirmed, or straight through where the columns are clear. */
export function useIntake(office: string, project: string) {
  const [stage, setStage] = useState<Stage>(START);
  const router = useRouter();
  const client = useQueryClient();
  /** What is under way; a second click finds it here, before anything is drawn anew. */
  const running = useRef<AbortController | null>(null);
  const sending = useRef(false);

  const begin = useCallback((): AbortController => {
    running.current?.abort();
    const controller = new AbortController();
    running.current = controller;
    return controller;
  }, []);
  useEffect(() => () => running.current?.abort(), []);

  const send = useCallback(
    async (
      file: File,
      view: IntakeView,
      draft: MatchingDraft,
      how: { straight: boolean; again?: boolean },
    ) => {
      if (sending.current) return;
      sending.current = true;
      const { signal } = begin();
      const onProgress = (share: number) => setStage({ at: 'sending', file, share, view, draft });
      onProgress(0);
      try {
        const choice = how.straight ? {} : choiceOf(draft);
        const made = await submit(
          office,
          project,
          file,
          { ...choice, again: how.again },
          { signal, onProgress },
        );
        if (how.straight) {
          // Kept, so that the same file can be read anew with other columns.
          handOver(project, file, 'again');
          noteReading(made.id, { sentence: readAs(draft), project });
        }
        client.setQueryData(keys.submission(office, made.id), made);
        void client.invalidateQueries({ queryKey: keys.projects(office) });
        router.push(`/${office}/submissions/${made.id}`);
      } catch (error) {
        sending.current = false;
        if (signal.aborted) return;
        // Where the columns could not be told after all, the refusal brings what was detected.
        const found = detectedIn(error) ?? view;
        const kept = found === view ? draft : draftOf(found);
        setStage({
          at: 'matching',
          file,
          view: found,
          draft: kept,
          rereading: false,
          trouble: troubleOf(error),
        });
      }
    },
    [begin, client, office, project, router],
  );

  /** Reads the file without keeping anything. `look`: stop at the columns even where they are clear. */
  const take = useCallback(
    async (file: File, { look = false }: { look?: boolean } = {}) => {
      const { signal } = begin();
      sending.current = false;
      const onProgress = (share: number) => setStage({ at: 'reading', file, share });
      onProgress(0);
      try {
        const view = await detect(office, file, {}, { signal, onProgress });
        forget();
        const draft = draftOf(view);
        if (view.sure && view.problems.length === 0 && !look)
          await send(file, view, draft, { straight: true });
        else setStage({ at: 'matching', file, view, draft, rereading: false, trouble: null });
      } catch (error) {
        if (signal.aborted) return;
        forget();
        setStage({ at: 'choose', file, trouble: troubleOf(error) });
      }
    },
    [begin, office, send],
  );

  /** Shows the draft at once, and fetches how the list would be read with `choice`. */
  const change = useCallback(
    async (file: File, view: IntakeView, draft: MatchingDraft, choice: MatchingChoice) => {
      const { signal } = begin();
      setStage({ at: 'matching', file, view, draft, rereading: true, trouble: null });
      try {
        const found = await detect(office, file, choice, { signal });
        // Columns set by hand stay as they are set; otherwise they are detected for the new sheet or header.
        const next = choice.columns ? draft : draftOf(found, draft.sheets);
        setStage({ at: 'matching', file, view: found, draft: next, rereading: false, trouble: null });
      } catch (error) {
        if (signal.aborted) return;
        setStage({ at: 'matching', file, view, draft, rereading: false, trouble: troubleOf(error) });
      }
    },
    [begin, office],
  );

  const cancel = useCallback(() => {
    running.current?.abort();
    sending.current = false;
    setStage((before) =>
      before.at === 'sending'
        ? {
            at: 'matching',
            file: before.file,
            view: before.view,
            draft: before.draft,
            rereading: false,
            trouble: null,
          }
        : START,
    );
  }, []);

  const refuse = useCallback((sentence: string) => {
    setStage({ at: 'choose', file: null, trouble: { sentence, existing: null } });
  }, []);

  return { stage, take, change, send, cancel, refuse };
}

function troubleOf(error: unknown): Trouble {
  const errors = error instanceof ClientError ? (error.problem.errors ?? []) : [];
  const sentences = [sentenceOf(error), ...errors.map(({ message }) => message)];
  return {
    sentence: [...new Set(sentences)].join(' '),
    existing: existingIn(error),
  };
}
