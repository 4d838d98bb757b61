'use client';

import Link from 'next/link';
import { useRef, useState } from 'react';
import { FindingComments } from '@/components/comments/finding-comments';
import { useMay } from '@/components/shell/office-context';
import { useHotkeys } from '@/components/ui/hotkeys';
import { ErrorState } from '@/components/ui/states';
import { WeightMark } from '@/components/ui/weight-mark';
import { useSheetRows } from '@/lib/client/sheet-rows';
import type { FindingView } from '@/lib/contract/submission';
import { aboutText } from '../place-text';
import type { Steps } from '../use-steps';
import { BenchActions, CorrectedLine } from './bench-actions';
import { BenchSection } from './bench-section';
import { BY_HAND, chosenFix, chosenOption, handCells } from './fix-choice';
import { FixOptions } from './fix-options';
import { useHandDraft } from './hand-drafts';
import { HandEditForm } from './hand-edit';
import { markedCells, MOST_ROWS, proposedTexts, rowsToShow } from './sheet-cells';
import { SheetPiece } from './sheet-piece';
import { TroubleNote } from './trouble-note';

interface BenchProps {
  office: string;
  submission: string;
  finding: FindingView;
  /** How many fixes of its rule could be adopted in one step. */
  ofRule: number;
  steps: Steps;
  onAdoptRule: () => void;
}

/** The selected finding: what is wrong, where, what can be done, by which rule, and what was said. Keyed by finding. */
export function Bench({ office, submission, finding, ofRule, steps, onAdoptRule }: BenchProps) {
  const may = useMay();
  const [picked, setPicked] = useState<string | null>(null);
  const option = chosenOption(finding, picked);
  const fix = chosenFix(finding, option);
  const hand = useHandDraft(finding.id);
  const firstCell = useRef<HTMLInputElement>(null);
  const comment = useRef<HTMLTextAreaElement>(null);

  const edits = fix?.edits ?? [];
  const rows = rowsToShow(finding, edits);
  const piece = useSheetRows(office, submission, finding.sheet, rows.slice(0, MOST_ROWS));
  const sheet = piece.data?.sheet === finding.sheet ? piece.data : undefined;
  const cells = may('corrections:edit') ? handCells(finding) : [];
  const open = finding.state !== 'corrected';

  const adopt = () => {
    if (fix?.state === 'proposed' && open && may('corrections:adopt')) void steps.adopt(finding, fix);
  };
  const decline = () => {
    if (!fix || fix.state === 'adopted' || !may('fixes:update')) return;
    void steps.setFixState(finding, fix, fix.state === 'declined' ? 'proposed' : 'declined');
  };
  const byHand = () => {
    if (cells.length === 0) return;
    setPicked(BY_HAND);
    requestAnimationFrame(() => firstCell.current?.focus());
  };
  useHotkeys('The selected finding', [
    { key: 'a', does: 'Adopt the chosen fix', run: adopt },
    { key: 'd', does: 'Decline the fix, or propose it again', run: decline },
    { key: 'e', does: 'Edit its cells by hand', run: byHand },
    { key: 'c', does: 'Write a comment', run: () => comment.current?.focus() },
  ]);

  return (
    <>
      <p className="mb-1 flex flex-wrap gap-x-3 text-slate">
        <WeightMark weight={finding.weight} />
        <span>{aboutText(finding)}</span>
      </p>
      <p>{finding.message}</p>
      {finding.origin === 'correction' && (
        <p className="mt-1 text-slate">A correction made this; the list did not have it when it came.</p>
      )}
      {rows.length > 0 && (
        <BenchSection title={`In the workbook, sheet “${finding.sheet ?? ''}”`}>
          {piece.error && !sheet && (
            <ErrorState
              error={piece.error}
              title="The cells could not be fetched"
              retry={() => void piece.refetch()}
            />
          )}
          {sheet && (
            <SheetPiece
              piece={sheet}
              rows={rows}
              marked={markedCells(finding, edits)}
              proposed={
                option === BY_HAND
                  ? hand.typed
                  : proposedTexts(fix?.state === 'adopted' ? [] : edits, sheet.sheet)
              }
            />
          )}
          {!sheet && !piece.error && <p className="text-slate">Fetching the cells …</p>}
          {rows.length > MOST_ROWS && (
            <p className="text-slate">and {rows.length - MOST_ROWS} more rows that it touches.</p>
          )}
        </BenchSection>
      )}
      <BenchSection title="Fix">
        {steps.trouble?.finding === finding.id && (
          <TroubleNote trouble={steps.trouble} onDismiss={steps.forgetTrouble} />
        )}
        {!finding.fix && (
          <p className="text-slate">
            No fix can honestly be proposed for this.{' '}
            {cells.length > 0 ? 'Write another value by hand, or ask about it below.' : 'Ask about it below.'}
          </p>
        )}
        <FixOptions
          finding={finding}
          piece={sheet}
          option={option}
          onOption={(next) => (next === BY_HAND ? byHand() : setPicked(next))}
          byHand={
            cells.length > 0 &&
            sheet && (
              <HandEditForm
                sheet={sheet.sheet}
                cells={cells}
                piece={sheet}
                typed={hand.typed}
                onType={hand.type}
                busy={steps.busy}
                first={firstCell}
                onSend={(handEdits) => {
                  void steps.edit(finding, handEdits).then((done) => {
                    if (!done) return;
                    hand.clear();
                    setPicked(null);
                  });
                }}
              />
            )
          }
        />
        <BenchActions
          finding={finding}
          fix={option === BY_HAND ? null : fix}
          ofRule={ofRule}
          busy={steps.busy}
          onAdopt={adopt}
          onDecline={decline}
          onAdoptRule={onAdoptRule}
        />
        {!open && (
          <CorrectedLine
            office={office}
            submission={submission}
            finding={finding}
            busy={steps.busy}
            onUndo={() => void steps.undoFinding(finding)}
          />
        )}
      </BenchSection>
      <BenchSection title="Rule">
        <p>
          <Link href={`/${office}/rules/${finding.rule}`}>{finding.rule}</Link>. {finding.source}
        </p>
      </BenchSection>
      <BenchSection title="Comments">
        <FindingComments office={office} submission={submission} finding={finding.id} field={comment} />
      </BenchSection>
    </>
  );
}
