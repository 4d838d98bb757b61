import { listening, subscribe } from '@/db/listen';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import { EventStream } from '@/lib/contract/transfer';
import { submissionEvent } from '@/lib/contract/submission';
import { idOf, inOffice } from '@/lib/services/in-office';
import { requireSubmission } from '@/lib/services/submissions/require';

/** What changes in the submission, as it does; a scheduler hears nothing of what is said inside the office. */
export async function streamEvents(
  ctx: OfficeContext,
  { path }: { path: { submission: string } },
): Promise<EventStream> {
  requirePermission(ctx, 'submissions:read');
  const id = idOf(path.submission, 'submission');
  await inOffice(ctx, (tx) => requireSubmission(tx, id));
  return new EventStream(async (sink) => {
    const stop = subscribe(id, (payload) => {
      if (payload.audience === 'inside' && ctx.contractor !== null) return;
      // After a gap nobody knows what was missed: a reader that comes back looks for itself.
      if (payload.kind === 'reconnected') return sink.close();
      const event = submissionEvent.safeParse(payload);
      if (event.success) sink.send(event.data.kind, event.data);
    });
    await listening();
    return stop;
  });
}
