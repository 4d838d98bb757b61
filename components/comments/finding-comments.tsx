'use client';

import { useMemo, type Ref } from 'react';
import { useMay } from '@/components/shell/office-context';
import { ErrorState, Loading } from '@/components/ui/states';
import { threadOf, useComments } from '@/lib/client/comments';
import { Composer } from './composer';
import { Thread } from './thread';

interface FindingCommentsProps {
  office: string;
  submission: string;
  finding: string;
  /** The text field, for the key that leads to it. */
  field: Ref<HTMLTextAreaElement>;
}

/** The thread of a finding with its composer. */
export function FindingComments({ office, submission, finding, field }: FindingCommentsProps) {
  const comments = useComments(office, submission);
  const mayWrite = useMay()('comments:create');
  const thread = useMemo(() => threadOf(comments.data?.items ?? [], finding), [comments.data, finding]);
  if (comments.error && !comments.data) {
    return <ErrorState error={comments.error} retry={() => void comments.refetch()} />;
  }
  if (!comments.data) return <Loading label="Fetching the comments" rows={2} />;
  return (
    <>
      {thread.length === 0 && <p className="text-slate">Nobody has said anything about this yet.</p>}
      <Thread comments={thread} />
      {mayWrite ? (
        <Composer key={finding} office={office} submission={submission} finding={finding} field={field} />
      ) : (
        <p className="mt-2 text-slate">Your role reads comments and does not write them.</p>
      )}
    </>
  );
}
