'use client';

import { useRef, useState } from 'react';
import { useMay } from '@/components/shell/office-context';
import { useHotkeys } from '@/components/ui/hotkeys';
import type { HandEdit } from '@/lib/client/corrections';
import { adoptedFix } from '@/lib/client/findings';
import { useSheetRows } from '@/lib/client/sheet-rows';
import type { FindingView } from '@/lib/contract/submission';
import type { Steps } from '../use-steps';
import { BY_HAND, chosenFix, chosenOption, handCells } from './fix-choice';
import { useHandDraft } from './hand-drafts';
import { MOST_ROWS, proposedTexts, rowsToShow } from './sheet-cells';

interface BenchPlace {
  office: string;
  submission: string;
  /** Why nothing can be corrected here any more; null where it can. */
  closed: string | null;
  finding: FindingView;
  steps: Steps;
}

const NOTHING: ReadonlyMap<string, string> = new Map();

/** What is chosen on the bench, the cells it is about, and the keys that act on it. */
export function useBench({ office, submission, closed, finding, steps }: BenchPlace) {
  const mayEver = useMay();
  const may = (permission: string) => closed === null && mayEver(permission);
  const [picked, setPicked] = useState<string | null>(null);
  const hand = useHandDraft(finding.id);
  const firstCell = useRef<HTMLInputElement>(null);
  const comment = useRef<HTMLTextAreaElement>(null);
  const open = finding.state !== 'corrected';
  const option = chosenOption(finding, picked);
  const fix = open ? chosenFix(finding, option) : adoptedFix(finding);
  const edits = fix?.edits ?? [];
  const rows = rowsToShow(finding, edits);
  const rowsAnswer = useSheetRows(office, submission, finding.sheet, rows.slice(0, MOST_ROWS));
  const piece = rowsAnswer.data?.sheet === finding.sheet ? rowsAnswer.data : undefined;
  const cells = open && may('corrections:edit') ? handCells(finding) : [];

  const adopt = () => {
    if (open && fix?.state === 'proposed' && may('corrections:adopt')) void steps.adopt(finding, fix);
  };
  const decline = () => {
    if (!open || !fix || fix.state === 'adopted' || !may('fixes:update')) return;
    void steps.setFixState(finding, fix, fix.state === 'declined' ? 'proposed' : 'declined');
  };
  const choose = (next: string) => {
    if (next === BY_HAND && cells.length === 0) return;
    setPicked(next);
    if (next === BY_HAND) requestAnimationFrame(() => firstCell.current?.focus());
  };
  const write = (handEdits: readonly HandEdit[]) =>
    void steps.edit(finding, handEdits).then((done) => {
      if (!done) return;
      hand.clear();
      setPicked(null);
    });

  useHotkeys('The selected finding', [
    { key: 'a', does: 'Adopt the chosen fix', run: adopt },
    { key: 'd', does: 'Decline the fix, or propose it again', run: decline },
    { key: 'e', does: 'Edit its cells by hand', run: () => choose(BY_HAND) },
    { key: 'c', does: 'Write a comment', run: () => comment.current?.focus() },
  ]);

  const proposed = option === BY_HAND ? hand.typed : proposedTexts(edits, finding.sheet ?? '');
  return {
    open,
    may,
    option,
    choose,
    fix,
    edits,
    rows,
    rowsAnswer,
    piece,
    cells,
    hand,
    /** By address, what the chosen fix or the hand would write; nothing once it is settled. */
    proposed: open ? proposed : NOTHING,
    adopt,
    decline,
    write,
    firstCell,
    comment,
  };
}
export type BenchState = ReturnType<typeof useBench>;
