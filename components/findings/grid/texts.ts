import type { Format } from '@/components/ui/locale';
import { adoptedFix } from '@/lib/client/findings';
import type { FindingView } from '@/lib/contract/submission';
import { pieceWords, summariseEdits } from '../edit-text';

/** The texts of the cells, for the renderers and for measuring the rows. */

export function messageText(finding: FindingView): string {
  return finding.origin === 'correction' ? `${finding.message} (A correction made this.)` : finding.message;
}

/** "+1.3 d"; a dash where it is not known. */
export function effectText(finding: FindingView, format: Format): string {
  const effect = (adoptedFix(finding) ?? finding.fix)?.effect;
  return effect ? format.dayDifference(effect.expectedDuration) : '–';
}

export function fixText(finding: FindingView): string {
  const summary = summariseEdits((adoptedFix(finding) ?? finding.fix)?.edits ?? []);
  if (summary.kind === 'none') return 'none';
  return summary.kind === 'count' ? summary.text : summary.pieces.map(pieceWords).join(' · ');
}

/** What stands under the state, a line each. */
export function sideNotes(finding: FindingView): readonly string[] {
  const notes: string[] = [];
  if (finding.state === 'open' && finding.fix?.state === 'declined') notes.push('fix declined');
  if (finding.comments > 0) notes.push(finding.comments === 1 ? '1 comment' : `${finding.comments} comments`);
  return notes;
}
