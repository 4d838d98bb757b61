'use client';

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { CommentView } from '@/lib/contract/submission';
import { findingsKey, withCommentCounts, type Findings } from './findings';
import { call } from './http';
import { keys } from './keys';
import { submissionPath } from './submissions';

export type Comments = { readonly items: readonly CommentView[] };
export type Audience = CommentView['audience'];

export interface NewComment {
  readonly body: string;
  readonly finding: string | null;
  readonly audience: Audience;
}

export function commentsKey(office: string, submission: string) {
  return keys.submissionPart(office, submission, 'comments');
}

/** All comments of a submission that the person may read. */
export function useComments(office: string, submission: string) {
  const client = useQueryClient();
  return useQuery({
    queryKey: commentsKey(office, submission),
    queryFn: async ({ signal }) => {
      const answer = await call<Comments>(submissionPath(office, submission, 'comments'), { signal });
      client.setQueryData<Findings>(findingsKey(office, submission), (findings) =>
        findings ? withCommentCounts(findings, countByFinding(answer.items)) : findings,
      );
      return answer;
    },
    staleTime: 30_000,
  });
}

export function useAddComment(office: string, submission: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: NewComment) =>
      call<CommentView>(submissionPath(office, submission, 'comments'), { method: 'POST', body }),
    onSuccess: (comment) => {
      client.setQueryData<Comments>(commentsKey(office, submission), (comments) =>
        comments ? withComment(comments, comment) : comments,
      );
      return client.invalidateQueries({ queryKey: commentsKey(office, submission) });
    },
  });
}

/** With one more, unless the event stream was quicker and it is there already. */
export function withComment(comments: Comments, comment: CommentView): Comments {
  if (comments.items.some((known) => known.id === comment.id)) return comments;
  return { items: [...comments.items, comment] };
}

export function countByFinding(comments: readonly CommentView[]): Map<string, number> {
  const counts = new Map<string, number>();
  for (const { finding } of comments) if (finding) counts.set(finding, (counts.get(finding) ?? 0) + 1);
  return counts;
}

/** A finding's thread, oldest first. */
export function threadOf(comments: readonly CommentView[], finding: string): readonly CommentView[] {
  return comments
    .filter((comment) => comment.finding === finding)
    .sort((x, y) => x.at.localeCompare(y.at) || x.id.localeCompare(y.id));
}
