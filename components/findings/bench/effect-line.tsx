'use client';

import { useFormat, type Format } from '@/components/ui/locale';
import { WorkedLine, type Working } from '@/components/ui/worked-line';
import type { SheetRowsView } from '@/lib/contract/sheet-rows';
import type { Figures, FindingView, FixView } from '@/lib/contract/submission';
import { activityEffect, type Moments } from './activity-effect';

interface EffectLineProps {
  finding: FindingView;
  fix: FixView;
  piece: SheetRowsView | undefined;
  /** The figures as corrected, which the effect is on. */
  now: Figures;
}

const THREE_POINTS = 'Malcolm, Roseboom, Clark, Fazar 1959';

/** What a fix does: to its activity where that is known, and to the finish; each number opens to its working. */
export function EffectLine({ finding, fix, piece, now }: EffectLineProps) {
  const format = useFormat();
  const settled = fix.state === 'adopted';
  const own =
    piece && finding.row !== null && !settled ? activityEffect(piece, finding.row, fix.edits) : null;
  return (
    <p className="text-slate">
      {own && (
        <>
          Expected {format.number(own.before.expected, 1)} →{' '}
          <WorkedLine working={expectedWorking(own.after, format)}>
            <b className="font-semibold text-ink">{format.days(own.after.expected)}</b>
          </WorkedLine>
          , variance {format.number(own.before.variance, 2)} →{' '}
          <WorkedLine working={varianceWorking(own.after, format)}>
            {format.variance(own.after.variance)}
          </WorkedLine>
          .{' '}
        </>
      )}
      <FinishEffect effect={fix.effect} from={settled ? null : now} />
    </p>
  );
}

function FinishEffect({ effect, from }: { effect: FixView['effect']; from: Figures | null }) {
  const format = useFormat();
  if (!effect) return 'Its effect on the finish cannot be computed yet.';
  const finish = format.dayDifference(effect.expectedDuration);
  const working = from && finishWorking(effect.expectedDuration, from, finish, format);
  return (
    <>
      Finish {working ? <WorkedLine working={working}>{finish}</WorkedLine> : finish}, variance of the path{' '}
      {format.signed(effect.variance, 2)}
      {'\u00a0'}d².
    </>
  );
}

function expectedWorking(
  { optimistic: a, likely: m, pessimistic: b, expected }: Moments,
  format: Format,
): Working {
  return {
    title: 'Expected duration with this fix',
    formula: '(a + 4m + b) / 6',
    figures: `(${short(a, format)} + 4 × ${short(m, format)} + ${short(b, format)}) / 6`,
    result: format.days(expected, 2),
    source: THREE_POINTS,
  };
}

function varianceWorking({ optimistic: a, pessimistic: b, variance }: Moments, format: Format): Working {
  return {
    title: 'Variance with this fix',
    formula: '((b − a) / 6)²',
    figures: `((${short(b, format)} − ${short(a, format)}) / 6)²`,
    result: format.variance(variance),
    source: THREE_POINTS,
  };
}

function finishWorking(days: number, now: Figures, result: string, format: Format): Working | null {
  if (now.expectedDuration === null) return null;
  return {
    title: 'Finish effect of this fix alone',
    formula: 'expected finish with it − expected finish without it',
    figures: `${format.number(now.expectedDuration + days, 2)} − ${format.number(now.expectedDuration, 2)}`,
    result,
    source: 'Both passes over the network, once with the fix and once without it.',
  };
}

function short(days: number, format: Format): string {
  return format.number(days, Number.isInteger(days) ? 0 : 2);
}
