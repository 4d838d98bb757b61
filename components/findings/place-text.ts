import type { FindingView } from '@/lib/contract/submission';

/** Where a finding is: its cell, else its row, with the sheet where there are several. */
export function placeText(finding: FindingView, severalSheets: boolean): string {
  const place = finding.cell ?? (finding.row === null ? null : `row ${String(finding.row)}`);
  if (place === null) return finding.sheet ?? 'whole list';
  return severalSheets && finding.sheet ? `${finding.sheet}, ${place}` : place;
}

/** What it is about: ID and name; the list itself where it is about no one activity. */
export function aboutText(finding: FindingView): string {
  const parts = [finding.activityId, finding.activityName].filter(Boolean);
  return parts.length > 0 ? parts.join(' ') : '–';
}

export function haveSeveralSheets(findings: readonly FindingView[]): boolean {
  const named = findings.find(({ sheet }) => sheet !== null);
  return findings.some(({ sheet }) => sheet !== null && sheet !== named?.sheet);
}
