'use client';

import Link from 'next/link';
import { useFormat, type Format } from '@/components/ui/locale';
import { WeightMark } from '@/components/ui/weight-mark';
import { useFindings } from '@/lib/client/findings';
import { useAnalysis } from '@/lib/client/submissions';
import type { Figures, FindingView, SubmissionView } from '@/lib/contract/submission';
import { stopPath } from './stops';

/** As many are named; of more than one beyond them only the number is told. */
const NAMED = 4;

/** Why the schedule as corrected has no figures, and what they would be if the proposed fixes were adopted. */
export function BlockedNotice({ office, view }: { office: string; view: SubmissionView }) {
  const analysis = useAnalysis(office, view.id, 'corrected');
  const findings = useFindings(office, view.id);
  const because = new Set(analysis.data && !analysis.data.computable ? analysis.data.because : []);
  const blocking = (findings.data ?? []).filter(
    ({ id, weight, state }) => because.has(id) || (weight === 'blocks' && state === 'open'),
  );
  return (
    <section
      aria-label="Why there are no figures"
      className="mt-3 border border-l-4 border-hair border-l-umber bg-leaf px-4 py-3"
    >
      <p className="font-semibold">
        {blocking.length === 0
          ? 'The schedule as corrected cannot be computed.'
          : `The schedule as corrected cannot be computed: ${
              blocking.length === 1 ? 'one finding stands' : `${String(blocking.length)} findings stand`
            } in the way.`}
      </p>
      <BlockingList office={office} submission={view.id} findings={blocking} />
      <ProposedFigures view={view} />
    </section>
  );
}

function BlockingList({
  office,
  submission,
  findings,
}: {
  office: string;
  submission: string;
  findings: readonly FindingView[];
}) {
  const format = useFormat();
  const base = stopPath(office, submission, 'findings');
  const named = findings.length === NAMED + 1 ? findings.length : NAMED;
  const more = findings.length - named;
  return (
    <ul className="mt-1">
      {findings.slice(0, named).map((finding) => (
        <li key={finding.id} className="flex items-baseline gap-2">
          <WeightMark weight="blocks" bare />
          <span>
            <Link href={`${base}?finding=${finding.id}`}>{finding.title}</Link>: {finding.message}
          </span>
        </li>
      ))}
      {more > 0 && (
        <li>
          <Link href={`${base}?weight=blocks&state=open`}>
            and {format.count(more)} more findings that block the computation
          </Link>
        </li>
      )}
    </ul>
  );
}

function ProposedFigures({ view }: { view: SubmissionView }) {
  const format = useFormat();
  const { proposed } = view.figures;
  if (!proposed?.computable) {
    return (
      <p className="mt-2">
        Not each of them has a fix that could honestly be proposed, so it cannot be said what the figures
        would be. Settle those by hand first.
      </p>
    );
  }
  return (
    <p className="mt-2 border border-dashed border-slate px-3 py-2">
      <span className="font-semibold">Not adopted. </span>
      {proposedSentence(proposed, view.project.targetFinish, format)}
    </p>
  );
}

function proposedSentence(proposed: Figures, target: string | null, format: Format): string {
  const parts = [
    proposed.expectedDuration !== null &&
      `the expected finish would be ${format.days(proposed.expectedDuration)}${
        proposed.finish === null ? '' : ` (${format.date(proposed.finish)})`
      }`,
    proposed.variance !== null &&
      `the variance of the path ${format.variance(proposed.variance)}${
        proposed.standardDeviation === null
          ? ''
          : ` (deviation ${format.days(proposed.standardDeviation, 2)})`
      }`,
    proposed.chanceOfTarget !== null &&
      target !== null &&
      `the chance of ${format.date(target)} ${format.percent(proposed.chanceOfTarget)}`,
  ].filter((part) => part !== false);
  return `If the fixes proposed here were adopted, ${parts.join(', ')}.`;
}
