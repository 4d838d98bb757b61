import type { CommentRow } from '@/db/queries/comments';
import type { CommentView } from '@/lib/contract/submission';
import { SOMEBODY } from '@/lib/services/submissions/view';

export function commentView({ at, author, name, role, ...comment }: CommentRow): CommentView {
  return {
    ...comment,
    by: { id: author, name: name ?? SOMEBODY, role: role ?? '' },
    at: at.toISOString(),
  };
}
