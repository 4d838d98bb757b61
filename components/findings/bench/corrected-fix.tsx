'use client';

import { Button } from '@/components/ui/button';
import { DateText } from '@/components/ui/date-text';
import { useCorrections } from '@/lib/client/corrections';
import { adoptedFix } from '@/lib/client/findings';
import type { Figures, FindingView } from '@/lib/contract/submission';
import { correctionOf } from '../outcome';
import { EffectLine } from './effect-line';
import { EditsText } from './edits-text';

interface CorrectedFixProps {
  office: string;
  submission: string;
  finding: FindingView;
  busy: boolean;
  mayUndo: boolean;
  /** The figures as corrected. */
  now: Figures;
  /** The batch that the key for undoing would take back. */
  lastBatch: string | null;
  onUndo: () => void;
}

/** What corrected a finding, who did it and when, with the way back. */
export function CorrectedFix(props: CorrectedFixProps) {
  const { office, submission, finding, busy, mayUndo, now, lastBatch, onUndo } = props;
  const corrections = useCorrections(office, submission, true);
  const fix = adoptedFix(finding);
  const correction = correctionOf(corrections.data ?? [], finding, fix);
  const edits = fix?.edits ?? correction?.edits ?? [];
  return (
    <div className="border-l-2 border-moss pl-3">
      <p>
        <span className="font-semibold text-moss">Corrected</span>
        {correction && (
          <>
            {' '}
            by {correction.by}, <DateText value={correction.at} time />
            {!correction.fix && ', by hand'}
          </>
        )}
        .
      </p>
      {fix && <p>{fix.reason}</p>}
      <EditsText edits={edits} />
      {fix && <EffectLine finding={finding} fix={fix} piece={undefined} now={now} />}
      {mayUndo && (correction || corrections.isPending) && (
        <Button
          variant="ghost"
          {...(correction?.batch === lastBatch ? { shortcut: 'z' } : {})}
          className="mt-2"
          busy={busy}
          onClick={onUndo}
        >
          Undo
        </Button>
      )}
    </div>
  );
}
