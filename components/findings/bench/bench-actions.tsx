'use client';

import { useMay } from '@/components/shell/office-context';
import { Button } from '@/components/ui/button';
import type { FixView } from '@/lib/contract/submission';

interface BenchActionsProps {
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
  const { fix, ofRule, busy, onAdopt, onDecline, onAdoptRule } = props;
  const may = useMay();
  const mayAdopt = may('corrections:adopt');
  const mayDecline = may('fixes:update');
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
