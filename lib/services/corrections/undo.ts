import type { z } from 'zod';
import { withdrawCorrections, type CorrectionRow } from '@/db/queries/corrections';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import { checked, Forbidden } from '@/lib/contract/errors';
import { undoQuery, type CorrectionResult } from '@/lib/contract/submission';
import { replay } from '@/lib/corrections';
import { found, idOf, inOffice } from '@/lib/services/in-office';
import { appendRecord } from '@/lib/services/record/append';
import { rememberState, toEvents } from '@/lib/services/schedule/load';
import { announce, workOutChange, writeChange } from './change';
import { claim, readStanding } from './standing';
import { correctionView } from './view';

/** Withdraws one correction, or all of a batch, and replays the rest; what no longer applies is told. */
export async function undoCorrection(
  ctx: OfficeContext,
  { path, query }: { path: { submission: string; correction: string }; query: z.input<typeof undoQuery> },
): Promise<CorrectionResult> {
  requirePermission(ctx, 'corrections:undo');
  const id = idOf(path.submission, 'submission');
  const target = idOf(path.correction, 'correction');
  const { version } = checked(undoQuery, query);
  const standing = await readStanding(ctx, id, version);
  const undone = standing.corrections.filter((each) => each.id === target || each.batch === target);
  const batch = found(undone[0], 'correction').batch;
  requireOwn(ctx, undone);
  const rest = standing.corrections.filter((each) => !undone.includes(each));
  const { sheets, inapplicable } = replay(standing.received, toEvents(rest));
  const change = await workOutChange(ctx, standing, sheets, rest);
  const result = await inOffice(ctx, async (tx) => {
    await claim(tx, standing);
    await withdrawCorrections(
      tx,
      id,
      undone.map((each) => each.id),
      ctx.user.id,
    );
    const next = await writeChange(tx, ctx, standing, change);
    const cells = new Set(undone.flatMap(({ edits }) => edits.map(({ sheet, cell }) => `${cell} ${sheet}`)))
      .size;
    const data = { batch, corrections: undone.length, cells };
    await appendRecord(tx, ctx, { verb: 'corrections undone', data }, { submission: id });
    return announce(
      tx,
      standing,
      change,
      { kind: 'correction', id: batch },
      {
        batch,
        items: undone.map(correctionView),
        skipped: [],
        inapplicable: inapplicable.map(({ id: correction, reason }) => ({ correction, reason })),
        version: next,
      },
    );
  });
  rememberState({ id, version: result.version }, 'corrected', change.corrected);
  return result;
}

/** A scheduler undoes what its own contractor's people adopted. */
function requireOwn(ctx: OfficeContext, undone: readonly CorrectionRow[]): void {
  if (ctx.contractor === null || undone.every(({ contractor }) => contractor === ctx.contractor)) return;
  throw new Forbidden('This was adopted by the programme office; ask it to undo it.');
}
