'use client';

import type { Figures, FindingView } from '@/lib/contract/submission';
import { BenchActions } from './bench-actions';
import { BY_HAND } from './fix-choice';
import { FixOptions } from './fix-options';
import { HandEditForm } from './hand-edit';
import type { BenchState } from './use-bench';

interface OpenFixProps {
  finding: FindingView;
  bench: BenchState;
  /** The figures as corrected. */
  now: Figures;
  ofRule: number;
  busy: boolean;
  /** Nothing can be corrected here any more. */
  closed: boolean;
  onAdoptRule: () => void;
}

/** What can be done about a finding that is not settled yet. */
export function OpenFix({ finding, bench, now, ofRule, busy, closed, onAdoptRule }: OpenFixProps) {
  const { cells, piece, option, fix, hand } = bench;
  return (
    <>
      {!finding.fix && (
        <p className="text-slate">
          No fix can honestly be proposed for this.{' '}
          {cells.length > 0 ? 'Write another value by hand, or ask about it below.' : 'Ask about it below.'}
        </p>
      )}
      <FixOptions
        finding={finding}
        piece={piece}
        now={now}
        option={option}
        onOption={bench.choose}
        byHand={
          cells.length > 0 &&
          piece && (
            <HandEditForm
              sheet={piece.sheet}
              cells={cells}
              piece={piece}
              typed={hand.typed}
              onType={hand.type}
              onSend={bench.write}
              busy={busy}
              first={bench.firstCell}
            />
          )
        }
      />
      {!closed && (
        <BenchActions
          fix={option === BY_HAND ? null : fix}
          ofRule={ofRule}
          busy={busy}
          onAdopt={bench.adopt}
          onDecline={bench.decline}
          onAdoptRule={onAdoptRule}
        />
      )}
    </>
  );
}
