'use client';

import { DateText } from '@/components/ui/date-text';
import { classes } from '@/components/ui/classes';
import type { CommentView } from '@/lib/contract/submission';
import { AUDIENCES } from './audience';

/** What was said, oldest first: inside the office on a dashed rule, shared on a plain one; the words say which. */
export function Thread({ comments }: { comments: readonly CommentView[] }) {
  return (
    <ol className="flex flex-col gap-3" aria-live="polite" aria-relevant="additions">
      {comments.map((comment) => (
        <Said key={comment.id} comment={comment} />
      ))}
    </ol>
  );
}

function Said({ comment: { audience, by, body, at } }: { comment: CommentView }) {
  const inside = audience === 'inside';
  return (
    <li className={classes('border-l-2 py-0.5 pl-3', inside ? 'border-dashed border-brass' : 'border-cord')}>
      <p>
        <span className={classes('font-semibold', inside ? 'text-brass' : 'text-cord')}>
          {AUDIENCES[audience].name}
        </span>{' '}
        · {by.name}
        <span className="text-slate">, {by.role}</span>
      </p>
      <p className="whitespace-pre-wrap">{body}</p>
      <p className="text-slate">
        <DateText value={at} time />
      </p>
    </li>
  );
}
