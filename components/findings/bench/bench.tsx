'use client';

import Link from 'next/link';
import { FindingComments } from '@/components/comments/finding-comments';
import { WeightMark } from '@/components/ui/weight-mark';
import type { FindingView, SubmissionView } from '@/lib/contract/submission';
import { aboutText } from '../place-text';
import type { Steps } from '../use-steps';
import { BenchSection } from './bench-section';
import { CellsSection } from './cells-section';
import { CorrectedFix } from './corrected-fix';
import { closedReason } from './fix-choice';
import { KeptFocus } from './kept-focus';
import { OpenFix } from './open-fix';
import { TroubleNote } from './trouble-note';
import { useBench } from './use-bench';

interface BenchProps {
  office: string;
  submission: SubmissionView;
  finding: FindingView;
  /** How many fixes of its rule could be adopted in one step. */
  ofRule: number;
  steps: Steps;
  onAdoptRule: () => void;
}

/** The selected finding: what is wrong, where, what can be done, by which rule, and what was said. Keyed by finding. */
export function Bench({ office, submission, finding, ofRule, steps, onAdoptRule }: BenchProps) {
  const closed = closedReason(submission.status);
  const bench = useBench({ office, submission: submission.id, closed, finding, steps });
  return (
    <>
      <p className="mb-1 flex flex-wrap gap-x-3 text-slate">
        <WeightMark weight={finding.weight} />
        <span>{aboutText(finding)}</span>
      </p>
      <p>{finding.message}</p>
      {finding.origin === 'correction' && (
        <p className="mt-1 text-slate">A correction made this; the list did not have it when it came.</p>
      )}
      <CellsSection finding={finding} file={submission.file.name} bench={bench} />
      <BenchSection title="Fix">
        {steps.trouble?.finding === finding.id && (
          <TroubleNote trouble={steps.trouble} onDismiss={steps.forgetTrouble} />
        )}
        {closed && <p className="mb-2 text-slate">{closed}</p>}
        <KeptFocus when={bench.open}>
          {bench.open ? (
            <OpenFix
              finding={finding}
              bench={bench}
              now={submission.figures.corrected}
              ofRule={ofRule}
              busy={steps.busy}
              closed={closed !== null}
              onAdoptRule={onAdoptRule}
            />
          ) : (
            <CorrectedFix
              office={office}
              submission={submission.id}
              finding={finding}
              busy={steps.busy}
              now={submission.figures.corrected}
              mayUndo={bench.may('corrections:undo')}
              lastBatch={steps.last}
              onUndo={() => void steps.undoFinding(finding)}
            />
          )}
        </KeptFocus>
      </BenchSection>
      <BenchSection title="Rule">
        <p>
          <Link href={`/${office}/rules/${finding.rule}`}>{finding.rule}</Link>. {finding.source}
        </p>
      </BenchSection>
      <BenchSection title="Comments">
        <FindingComments
          office={office}
          submission={submission.id}
          finding={finding.id}
          field={bench.comment}
        />
      </BenchSection>
    </>
  );
}
