import type { Format } from '@/components/ui/locale';
import type { CorrectionResult, CorrectionView, FindingView, FixView } from '@/lib/contract/submission';

/** What came of a step, in sentences. */

/** "Adopted. Expected finish 118.0 d, 28 Jun 2027." */
export function outcomeSentence(done: string, result: CorrectionResult, format: Format): string {
  const { expectedDuration, finish } = result.submission.figures.corrected;
  if (expectedDuration === null) return `${done} The schedule still cannot be computed.`;
  const date = finish === null ? '' : `, ${format.date(finish)}`;
  return `${done} Expected finish ${format.days(expectedDuration)}${date}.`;
}

/** Which of the fixes asked for were left out, and why: each reason once. */
export function skippedSentence({ skipped }: Pick<CorrectionResult, 'skipped'>): string {
  const reasons = [...new Set(skipped.map(({ reason }) => reason))];
  const count = skipped.length === 1 ? 'One fix was' : `${String(skipped.length)} fixes were`;
  return `${count} left out. ${reasons.slice(0, 3).join(' ')}${reasons.length > 3 ? ' …' : ''}`;
}

/** After an undo: which other corrections no longer fit what the cells hold now, and why. */
export function inapplicableSentence({ inapplicable }: Pick<CorrectionResult, 'inapplicable'>): string {
  const reasons = [...new Set(inapplicable.map(({ reason }) => reason))];
  const count =
    inapplicable.length === 1
      ? 'One other correction no longer applies.'
      : `${String(inapplicable.length)} other corrections no longer apply.`;
  return `${count} ${reasons.slice(0, 3).join(' ')}`;
}

/**
 * The correction in force that settles a finding: by its adopted fix, else the latest made for it by hand,
 * else the latest that changed its cell.
 */
export function correctionOf(
  corrections: readonly CorrectionView[],
  finding: Pick<FindingView, 'id' | 'sheet' | 'cell'>,
  adopted: Pick<FixView, 'id'> | null,
): CorrectionView | null {
  const inOrder = [...corrections].sort((x, y) => x.at.localeCompare(y.at));
  const touches = ({ edits }: CorrectionView) =>
    edits.some(({ sheet, cell }) => sheet === finding.sheet && cell === finding.cell);
  return (
    inOrder.findLast(({ fix }) => adopted !== null && fix === adopted.id) ??
    inOrder.findLast((correction) => correction.finding === finding.id) ??
    inOrder.findLast(touches) ??
    null
  );
}

/** The smallest and the largest finish effect among fixes; null where none is known. */
export function effectRange(fixes: readonly FixView[]): { least: number; most: number } | null {
  const days = fixes.flatMap(({ effect }) => (effect ? [effect.expectedDuration] : []));
  return days.length === 0 ? null : { least: Math.min(...days), most: Math.max(...days) };
}
