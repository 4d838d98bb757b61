'use client';

import { useFormat } from '@/components/ui/locale';
import type { SheetRowsView } from '@/lib/contract/sheet-rows';
import type { FindingView, FixView } from '@/lib/contract/submission';
import { activityEffect } from './activity-effect';

interface EffectLineProps {
  finding: FindingView;
  fix: FixView;
  piece: SheetRowsView | undefined;
}

/** What a fix does: to its activity where that is known, and to the finish. */
export function EffectLine({ finding, fix, piece }: EffectLineProps) {
  const format = useFormat();
  const own =
    piece && finding.row !== null && fix.state !== 'adopted'
      ? activityEffect(piece, finding.row, fix.edits)
      : null;
  const finish = fix.effect
    ? `finish ${format.dayDifference(fix.effect.expectedDuration)}, variance of the path ${format.signed(fix.effect.variance, 2)}\u00a0d²`
    : 'its effect on the finish cannot be computed yet';
  return (
    <span className="block text-slate">
      {own && (
        <>
          Expected {format.number(own.before.expected, 1)} →{' '}
          <b className="font-semibold text-ink">{format.days(own.after.expected)}</b>, variance{' '}
          {format.number(own.before.variance, 2)} → {format.variance(own.after.variance)};{' '}
        </>
      )}
      {own ? finish : finish.charAt(0).toUpperCase() + finish.slice(1)}
    </span>
  );
}
