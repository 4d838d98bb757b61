'use client';

import { useQuery } from '@tanstack/react-query';
import type { CorrectionResult, FindingView, FixView } from '@/lib/contract/submission';
import { call } from './http';
import { keys } from './keys';
import { submissionPath } from './submissions';

export type Findings = { readonly items: readonly FindingView[] };

export function findingsKey(office: string, submission: string) {
  return keys.submissionPart(office, submission, 'findings');
}

/** All of them; thousands. Kept up by corrections' answers and by events, so never fetched again for its age. */
export function useFindings(office: string, submission: string, enabled = true) {
  return useQuery({
    queryKey: findingsKey(office, submission),
    queryFn: ({ signal }) => call<Findings>(submissionPath(office, submission, 'findings'), { signal }),
    select: selectItems,
    staleTime: Infinity,
    enabled,
  });
}

function selectItems(answer: Findings): readonly FindingView[] {
  return answer.items;
}

/** Fix and alternatives, the proposed one first. */
export function fixesOf(finding: FindingView): readonly FixView[] {
  return finding.fix ? [finding.fix, ...finding.alternatives] : finding.alternatives;
}

export function adoptedFix(finding: FindingView): FixView | null {
  return fixesOf(finding).find((fix) => fix.state === 'adopted') ?? null;
}

/** The findings after a correction, those untouched being the very same objects. */
export function withResult(findings: Findings, result: Pick<CorrectionResult, 'changed' | 'gone'>): Findings {
  const changed = new Map(result.changed.map((finding) => [finding.id, finding]));
  const gone = new Set(result.gone);
  const items: FindingView[] = [];
  for (const finding of findings.items) {
    if (gone.has(finding.id)) continue;
    items.push(changed.get(finding.id) ?? finding);
    changed.delete(finding.id);
  }
  return { items: [...items, ...changed.values()] };
}

/** What the list will look like once the fixes are adopted; shown until the server has answered. */
export function withAdopted(findings: Findings, fixes: ReadonlySet<string>): Findings {
  return mapFindings(findings, (finding) => {
    const chosen = fixesOf(finding).find((fix) => fixes.has(fix.id));
    return chosen ? { ...withFixState(finding, chosen.id, 'adopted'), state: 'corrected' } : finding;
  });
}

export function withFix(findings: Findings, fix: string, state: FixView['state']): Findings {
  return mapFindings(findings, (finding) =>
    fixesOf(finding).some((known) => known.id === fix) ? withFixState(finding, fix, state) : finding,
  );
}

/** The number of comments of each finding, as counted; the same object where nothing differs. */
export function withCommentCounts(findings: Findings, counts: ReadonlyMap<string, number>): Findings {
  return mapFindings(findings, (finding) => {
    const comments = counts.get(finding.id) ?? 0;
    return comments === finding.comments ? finding : { ...finding, comments };
  });
}

function mapFindings(findings: Findings, change: (finding: FindingView) => FindingView): Findings {
  let touched = false;
  const items = findings.items.map((finding) => {
    const next = change(finding);
    touched ||= next !== finding;
    return next;
  });
  return touched ? { items } : findings;
}

function withFixState(finding: FindingView, fix: string, state: FixView['state']): FindingView {
  const set = (known: FixView): FixView => (known.id === fix ? { ...known, state } : known);
  return {
    ...finding,
    fix: finding.fix && set(finding.fix),
    alternatives: finding.alternatives.map(set),
  };
}
