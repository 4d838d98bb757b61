'use client';

import { Skeleton } from './skeleton';
import { FindingsBoard } from './findings-board';
import { EmptyState, ErrorState } from '@/components/ui/states';
import { useFormat } from '@/components/ui/locale';
import { useFindings } from '@/lib/client/findings';
import { useSubmission } from '@/lib/client/submissions';
import type { SubmissionView } from '@/lib/contract/submission';
import { WorkbookLinks } from './workbook-links';

/** The findings of a submission; below the submission's frame. */
export function FindingsPage({ office, submission }: { office: string; submission: string }) {
  const { data: view } = useSubmission(office, submission);
  const { data: findings, error, refetch } = useFindings(office, submission);
  if (error && !findings) {
    return (
      <ErrorState error={error} retry={() => void refetch()} title="The findings could not be fetched" />
    );
  }
  if (!findings || !view) return <Skeleton />;
  if (findings.length === 0) return <NothingFound office={office} view={view} />;
  return <FindingsBoard office={office} view={view} findings={findings} />;
}

function NothingFound({ office, view }: { office: string; view: SubmissionView }) {
  const format = useFormat();
  const { activities } = view.rows;
  return (
    <EmptyState
      title={`Nothing found: ${format.plural(activities, 'activity was', 'activities were')} read and every rule passed.`}
      action={<WorkbookLinks office={office} view={view} />}
    >
      What sets the finish stands on the Path page, and how sure the date is on the Confidence page.
    </EmptyState>
  );
}
