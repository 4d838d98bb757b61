import { and, asc, count, eq, isNotNull } from 'drizzle-orm';
import type { Tx } from '../client';
import { comments, memberships, users } from '../schema';

export type CommentRow = Awaited<ReturnType<typeof listComments>>[number];

/** Those the asker may see, the oldest first. */
export async function listComments(tx: Tx, submissionId: string) {
  return tx
    .select({
      id: comments.id,
      finding: comments.findingId,
      sheet: comments.sheet,
      row: comments.row,
      audience: comments.audience,
      body: comments.body,
      at: comments.createdAt,
      author: comments.authorId,
      name: users.name,
      role: memberships.role,
    })
    .from(comments)
    .leftJoin(users, eq(users.id, comments.authorId))
    .leftJoin(
      memberships,
      and(eq(memberships.userId, comments.authorId), eq(memberships.officeId, comments.officeId)),
    )
    .where(eq(comments.submissionId, submissionId))
    .orderBy(asc(comments.createdAt), asc(comments.id));
}

export async function insertComment(tx: Tx, values: Omit<typeof comments.$inferInsert, 'id' | 'createdAt'>) {
  const [row] = await tx
    .insert(comments)
    .values(values)
    .returning({ id: comments.id, at: comments.createdAt });
  return row ?? null;
}

/** By finding, as far as the asker may see them. */
export async function countComments(tx: Tx, submissionId: string): Promise<Map<string, number>> {
  const rows = await tx
    .select({ finding: comments.findingId, count: count() })
    .from(comments)
    .where(and(eq(comments.submissionId, submissionId), isNotNull(comments.findingId)))
    .groupBy(comments.findingId);
  return new Map(rows.flatMap((row) => (row.finding ? [[row.finding, row.count]] : [])));
}
