'use client';

import { useMay } from '@/components/shell/office-context';
import { Button } from '@/components/ui/button';
import { DateText } from '@/components/ui/date-text';
import { useCorrections } from '@/lib/client/corrections';
import { adoptedFix } from '@/lib/client/findings';
import type { FindingView, FixView } from '@/lib/contract/submission';
import { correctionOf } from '../outcome';

interface BenchActionsProps {
  finding: FindingView;
  /** The chosen fix; null where the hand is chosen, or nothing can be proposed. */
  fix: FixView | null;
  /** How many fixes of this rule could be adopted in one step. */
  ofRule: number;
  busy: boolean;
  onAdopt: () => void;
  onDecline: () => void;
  onAdoptRule: () => void;
}

/** Adopt, decline, propose again; what the role may not do is said and not shown as a button that fails. */
export function BenchActions(props: BenchActionsProps) {
  const { finding, fix, ofRule, busy, onAdopt, onDecline, onAdoptRule } = props;
  const may = useMay();
  const mayAdopt = may('corrections:adopt');
  const mayDecline = may('fixes:update');
  if (finding.state === 'corrected') return null;
  if (!mayAdopt && !mayDecline) {
    return (
      <p className="mt-3 text-slate">
        Your role reads the fixes and comments on them; an analyst or the contractor’s scheduler adopts them.
      </p>
    );
  }
  return (
    <>
      <div className="mt-3 flex flex-wrap gap-2">
        {fix?.state === 'proposed' && mayAdopt && (
          <Button shortcut="a" busy={busy} onClick={onAdopt}>
            Adopt
          </Button>
        )}
        {fix && fix.state !== 'adopted' && mayDecline && (
          <Button variant="ghost" shortcut="d" busy={busy} onClick={onDecline}>
            {fix.state === 'declined' ? 'Propose again' : 'Decline'}
          </Button>
        )}
      </div>
      {mayAdopt && ofRule > 1 && (
        <Button variant="quiet" className="mt-1 -ml-3" busy={busy} onClick={onAdoptRule}>
          Adopt all {ofRule} of this rule …
        </Button>
      )}
    </>
  );
}

interface CorrectedLineProps {
  office: string;
  submission: string;
  finding: FindingView;
  busy: boolean;
  onUndo: () => void;
}

/** Who corrected it and when, with the way back. */
export function CorrectedLine({ office, submission, finding, busy, onUndo }: CorrectedLineProps) {
  const mayUndo = useMay()('corrections:undo');
  const corrections = useCorrections(office, submission, true);
  const correction = correctionOf(corrections.data ?? [], finding, adoptedFix(finding));
  return (
    <div className="mt-3 border-l-2 border-moss pl-3">
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
      {mayUndo && (correction || corrections.isPending) && (
        <Button variant="ghost" shortcut="z" className="mt-2" busy={busy} onClick={onUndo}>
          Undo
        </Button>
      )}
    </div>
  );
}
