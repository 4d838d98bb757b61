import { adoptedFix, fixesOf } from '@/lib/client/findings';
import type { FindingView, FixView, SubmissionView } from '@/lib/contract/submission';

/** By hand: in place of a fix's id. */
export const BY_HAND = 'by-hand';

/** The option that is chosen: what was picked while it is still there, else the adopted or the proposed fix. */
export function chosenOption(finding: FindingView, picked: string | null): string {
  const fixes = fixesOf(finding);
  if (picked === BY_HAND || fixes.some(({ id }) => id === picked)) return picked ?? BY_HAND;
  return (adoptedFix(finding) ?? fixes[0])?.id ?? BY_HAND;
}

export function chosenFix(finding: FindingView, option: string): FixView | null {
  return fixesOf(finding).find(({ id }) => id === option) ?? null;
}

/** Addresses that can be edited by hand: the finding's own cell, then those its fixes touch, on its sheet. */
export function handCells(finding: FindingView): string[] {
  const cells = fixesOf(finding)
    .flatMap(({ edits }) => edits)
    .filter(({ sheet }) => sheet === finding.sheet)
    .map(({ cell }) => cell.toUpperCase());
  const own = finding.cell ? [finding.cell.toUpperCase()] : [];
  return [...new Set([...own, ...cells])].slice(0, MOST_CELLS);
}

/** More than this is no work for a form beside the grid. */
const MOST_CELLS = 6;

/** The fixes of a rule that can be adopted in one step: one a finding, open and neither adopted nor declined. */
export function adoptable(findings: readonly FindingView[], rule: string): FixView[] {
  return findings.flatMap((finding) =>
    finding.rule === rule && finding.state === 'open' && finding.fix?.state === 'proposed'
      ? [finding.fix]
      : [],
  );
}

/** Why a submission takes no corrections any more; null where it does. */
export function closedReason(status: SubmissionView['status']): string | null {
  if (status === 'superseded') return 'A later revision has superseded this one, so it is corrected no more.';
  return status === 'accepted' ? 'This revision is accepted, so it is corrected no more.' : null;
}
