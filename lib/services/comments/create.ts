import type { z } from 'zod';
import { notify } from '@/db/listen';
import { insertComment } from '@/db/queries/comments';
import { findFinding } from '@/db/queries/findings';
import type { Tx } from '@/db/scope';
import { storableText } from '@/db/storable';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import { checked, Invalid } from '@/lib/contract/errors';
import { commentCreate, type CommentView } from '@/lib/contract/submission';
import { found, idOf, inOffice } from '@/lib/services/in-office';
import { appendRecord } from '@/lib/services/record/append';
import { requireSubmission } from '@/lib/services/submissions/require';
import { commentView } from './view';

type Wanted = z.output<typeof commentCreate>;

/** Comments on a finding, on a row or on the whole; what a scheduler writes is always shared. */
export async function createComment(
  ctx: OfficeContext,
  { path, body }: { path: { submission: string }; body: z.input<typeof commentCreate> },
): Promise<CommentView> {
  requirePermission(ctx, 'comments:create');
  const submission = idOf(path.submission, 'submission');
  const wanted = checked(commentCreate, body);
  const audience = ctx.role === 'scheduler' ? 'shared' : wanted.audience;
  return inOffice(ctx, async (tx) => {
    const { submission: row } = await requireSubmission(tx, submission);
    const rule = await ruleOf(tx, submission, wanted);
    const about = {
      finding: wanted.finding ?? null,
      sheet: wanted.finding ? null : storedSheet(row.matching, wanted),
      row: wanted.finding ? null : (wanted.row ?? null),
    };
    const text = storableText(wanted.body);
    const comment = found(
      await insertComment(tx, {
        officeId: ctx.office.id,
        submissionId: submission,
        findingId: about.finding,
        sheet: about.sheet,
        row: about.row,
        audience,
        body: text,
        authorId: ctx.user.id,
      }),
      'comment',
    );
    const data = { comment: comment.id, rule, row: about.row };
    await appendRecord(tx, ctx, { verb: 'comment added', data }, { submission, audience });
    await notify(tx, submission, { kind: 'comment', id: comment.id, audience });
    const { id: author, name } = ctx.user;
    return commentView({ ...comment, ...about, audience, body: text, author, name, role: ctx.role });
  });
}

async function ruleOf(tx: Tx, submission: string, { finding }: Wanted): Promise<string | null> {
  if (!finding) return null;
  const row = await findFinding(tx, submission, finding);
  if (!row) throw Invalid.field('finding', 'There is no such finding in this submission.');
  return row.rule;
}

/** A row alone stands on the list's first sheet. */
function storedSheet(matching: readonly { sheet: string }[], { sheet, row }: Wanted): string | null {
  if (sheet) {
    if (!matching.some((known) => known.sheet === sheet)) {
      throw Invalid.field('sheet', 'The list does not stand on a sheet of that name.');
    }
    return sheet;
  }
  return row ? (matching[0]?.sheet ?? null) : null;
}
