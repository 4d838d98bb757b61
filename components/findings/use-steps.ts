'use client';

import { useQueryClient } from '@tanstack/react-query';
import { useRef, useState } from 'react';
import { toast } from '@/components/ui/toast';
import { fetchCorrections, useCorrect, useSetFix, type CorrectionStep } from '@/lib/client/corrections';
import { ClientError } from '@/lib/client/error';
import { adoptedFix } from '@/lib/client/findings';
import type { CorrectionResult, FindingView, FixView } from '@/lib/contract/submission';
import { useFormat } from '@/components/ui/locale';
import { latestDeed } from '@/lib/client/record';
import { correctionOf, inapplicableSentence, outcomeSentence, skippedSentence } from './outcome';

/** What went wrong with a step, beside the finding it was for; null: with one that was for none. */
export interface Trouble {
  readonly finding: string | null;
  readonly error: unknown;
  /** Where someone else was first: who it was and what they did, as far as it is known. */
  readonly first: string | null;
}

/** The steps one can take on findings, what came of the last one, and the way back. */
export function useSteps(office: string, submission: string) {
  const client = useQueryClient();
  const format = useFormat();
  const correct = useCorrect(office, submission);
  const setFix = useSetFix(office, submission);
  const [trouble, setTrouble] = useState<Trouble | null>(null);
  const [said, setSaid] = useState('');
  /** Batches made on this page, the latest last. */
  const [made, setMade] = useState<readonly string[]>([]);
  const madeNow = useRef(made);
  const underWay = useRef(new Set<string>());
  /** The step begun last, until it is told what came of it: undoing waits for it. */
  const latest = useRef<Promise<unknown>>(Promise.resolve());

  const setBatches = (change: (all: readonly string[]) => readonly string[]): void => {
    madeNow.current = change(madeNow.current);
    setMade(madeNow.current);
  };

  /** Runs a step unless the same is under way: a double click sends once. */
  const run = async (
    name: string,
    finding: string | null,
    send: () => Promise<CorrectionResult>,
  ): Promise<CorrectionResult | null> => {
    if (underWay.current.has(name)) return null;
    underWay.current.add(name);
    setTrouble(null);
    try {
      return await send();
    } catch (error) {
      const first = wasStale(error) ? await latestDeed(office, submission) : null;
      setTrouble({ finding, error, first });
      return null;
    } finally {
      underWay.current.delete(name);
    }
  };

  const undo = async (batch: string, finding: string | null): Promise<boolean> => {
    const result = await run(`undo ${batch}`, finding, () =>
      correct.mutateAsync({ kind: 'undo', correction: batch }),
    );
    if (!result) return false;
    setBatches((all) => all.filter((known) => known !== batch));
    setSaid(outcomeSentence('Undone.', result, format));
    if (result.inapplicable.length > 0) toast({ text: inapplicableSentence(result), tone: 'trouble' });
    return true;
  };

  const change = (name: string, finding: string | null, step: CorrectionStep, done: string) => {
    const changed = carryOut(name, finding, step, done);
    latest.current = changed;
    return changed;
  };

  const carryOut = async (name: string, finding: string | null, step: CorrectionStep, done: string) => {
    const result = await run(name, finding, () => correct.mutateAsync(step));
    if (!result) return false;
    const { batch, items, skipped } = result;
    if (batch) setBatches((all) => [...all, batch]);
    const sentence = outcomeSentence(done, result, format);
    setSaid(sentence);
    if (skipped.length > 0) toast({ text: skippedSentence(result), tone: 'trouble' });
    if (items.length > 1 && batch) {
      toast({ text: sentence, action: { label: 'Undo all', run: () => void undo(batch, null) } });
    }
    return true;
  };

  return {
    said,
    trouble,
    /** The batch that `undoLast` would take back. */
    last: made.at(-1) ?? null,
    busy: correct.isPending || setFix.isPending,
    forgetTrouble: () => setTrouble(null),
    adopt: (finding: FindingView, fix: FixView) =>
      change(`adopt ${fix.id}`, finding.id, { kind: 'adopt', fixes: [fix.id] }, 'Adopted.'),
    adoptAll: (fixes: readonly string[]) =>
      change(
        'adopt all',
        null,
        { kind: 'adopt', fixes },
        `${format.plural(fixes.length, 'fix', 'fixes')} adopted.`,
      ),
    edit: (finding: FindingView, edits: Extract<CorrectionStep, { kind: 'edit' }>['edits']) =>
      change(
        `edit ${finding.id}`,
        finding.id,
        { kind: 'edit', edits, finding: finding.id },
        'Edited by hand.',
      ),
    setFixState: async (finding: FindingView, fix: FixView, state: 'declined' | 'proposed') => {
      const result = await run(`${state} ${fix.id}`, finding.id, () =>
        setFix.mutateAsync({ fix: fix.id, state }),
      );
      if (result) setSaid(state === 'declined' ? 'The fix is declined.' : 'The fix is proposed again.');
      return result !== null;
    },
    /** Takes back what corrects a finding, whoever made it and whenever. */
    undoFinding: async (finding: FindingView): Promise<void> => {
      try {
        const corrections = await fetchCorrections(client, office, submission);
        const correction = correctionOf(corrections, finding, adoptedFix(finding));
        if (correction) await undo(correction.id, finding.id);
        else toast('There is no correction of this finding to undo.');
      } catch (error) {
        setTrouble({ finding: finding.id, error, first: null });
      }
    },
    /** The last step made on this page, waited for where it is under way; false where there is none. */
    undoLast: (): Promise<boolean> => {
      const undone = latest.current.then(async () => {
        const batch = madeNow.current.at(-1);
        if (batch === undefined) return false;
        await undo(batch, null);
        return true;
      });
      latest.current = undone;
      return undone;
    },
  };
}
export type Steps = ReturnType<typeof useSteps>;

/** Whether a step was refused because someone else changed the submission first: the refusal then names its version. */
export function wasStale(error: unknown): boolean {
  return error instanceof ClientError && error.status === 409 && typeof error.body.version === 'number';
}
