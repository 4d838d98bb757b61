import type { SubmissionView } from '@/lib/contract/submission';
import { formatCount, formatDays, formatPercent, plural } from '@/lib/client/format';

/** The five places along the cord, from the top down; the first is the submission's own address. */
export const STOPS = ['findings', 'path', 'confidence', 'compare', 'record'] as const;
export type Stop = (typeof STOPS)[number];

export const STOP_NAMES: Record<Stop, string> = {
  findings: 'Findings',
  path: 'Path',
  confidence: 'Confidence',
  compare: 'Compare',
  record: 'Record',
};

export function stopPath(office: string, submission: string, stop: Stop): string {
  const base = `/${encodeURIComponent(office)}/submissions/${encodeURIComponent(submission)}`;
  return stop === 'findings' ? base : `${base}/${stop}`;
}

/** Which place an address is at. */
export function stopAt(pathname: string): Stop {
  const last = pathname.split('/').filter(Boolean).at(3);
  return STOPS.find((stop) => stop === last) ?? 'findings';
}

/** The line under a knot's name. */
export function stopNote(stop: Stop, submission: SubmissionView, locale: string): string {
  const { open, figures, project, revision, record } = submission;
  switch (stop) {
    case 'findings':
      return `${formatCount(open.blocks + open.distorts + open.query, locale)} open`;
    case 'path':
      return figures.corrected.expectedDuration === null
        ? 'blocked'
        : formatDays(figures.corrected.expectedDuration, locale);
    case 'confidence':
      if (project.targetFinish === null) return 'no target';
      return figures.corrected.chanceOfTarget === null
        ? 'blocked'
        : formatPercent(figures.corrected.chanceOfTarget, locale);
    case 'compare':
      return revision === 0 ? 'the first one' : `Rev ${String(revision - 1)} → ${String(revision)}`;
    case 'record':
      return plural(record, 'entry', 'entries', locale);
  }
}
