'use client';

import { useMemo, useState } from 'react';
import { useMay } from '@/components/shell/office-context';
import { ButtonLink } from '@/components/ui/button';
import { Select } from '@/components/ui/field';
import { EmptyState, ErrorState, Loading } from '@/components/ui/states';
import { useRevisions } from '@/lib/client/projects';
import { useActivities, useSubmission } from '@/lib/client/submissions';
import { compareRevisions } from '@/lib/comparison/revisions';
import type { SubmissionView } from '@/lib/contract/submission';
import { ComparisonView } from './comparison-view';
import { defaultOther, orderedPair } from './pair';

/** This revision against another: what was asked and came back, and what changed unasked. */
export function ComparePage({ office, submission }: { office: string; submission: string }) {
  const { data: view } = useSubmission(office, submission);
  if (!view) return <Loading label="Looking up the revisions" />;
  return <Revisions office={office} view={view} />;
}

function Revisions({ office, view }: { office: string; view: SubmissionView }) {
  const { data: revisions, error, refetch } = useRevisions(office, view.project.id);
  const [picked, setPicked] = useState<string | null>(null);
  if (error && !revisions) return <ErrorState error={error} retry={() => void refetch()} />;
  if (!revisions) return <Loading label="Looking up the revisions" />;
  const others = revisions.filter(({ id }) => id !== view.id);
  const other = others.find(({ id }) => id === picked) ?? defaultOther(others, view);
  if (!other) return <NoOther office={office} view={view} />;
  return (
    <>
      <label className="mb-3 flex flex-wrap items-center gap-2">
        Compare Rev {view.revision} with
        <Select
          className="w-auto!"
          value={other.id}
          onChange={({ target }) => setPicked(target.value)}
          disabled={others.length === 1}
        >
          {others.map(({ id, revision, status }) => (
            <option key={id} value={id}>
              Rev {revision} ({status})
            </option>
          ))}
        </Select>
      </label>
      <Comparison office={office} {...orderedPair(view, other)} />
    </>
  );
}

interface Pair {
  office: string;
  earlier: SubmissionView;
  later: SubmissionView;
}

function Comparison({ office, earlier, later }: Pair) {
  const received = useActivities(office, earlier.id, 'received');
  const corrected = useActivities(office, earlier.id, 'corrected');
  const came = useActivities(office, later.id, 'received');
  const comparison = useMemo(
    () =>
      received.data && corrected.data && came.data
        ? compareRevisions(received.data, corrected.data, came.data)
        : null,
    [received.data, corrected.data, came.data],
  );
  const failed = [received, corrected, came].find(({ error, data }) => error && !data);
  if (failed) return <ErrorState error={failed.error} retry={() => void failed.refetch()} />;
  if (!comparison) return <Loading label="Fetching the activities of both" rows={5} />;
  return <ComparisonView comparison={comparison} earlier={earlier.revision} later={later.revision} />;
}

function NoOther({ office, view }: { office: string; view: SubmissionView }) {
  const mayUpload = useMay()('submissions:create');
  return (
    <EmptyState
      title="There is no other revision to compare with yet."
      action={
        mayUpload && (
          <ButtonLink variant="ghost" href={`/${office}/projects/${view.project.id}/intake`}>
            Hand in the next revision
          </ButtonLink>
        )
      }
    >
      When the next one comes in, this page shows which corrections came back in it, and what changed without
      being asked.
    </EmptyState>
  );
}
