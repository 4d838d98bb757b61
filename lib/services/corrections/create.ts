import type { z } from 'zod';
import { insertCorrections, listCorrections, nextSequence } from '@/db/queries/corrections';
import type { Tx } from '@/db/scope';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import { checked } from '@/lib/contract/errors';
import { correctionCreate, type CorrectionResult } from '@/lib/contract/submission';
import { idOf, inOffice } from '@/lib/services/in-office';
import { appendRecord } from '@/lib/services/record/append';
import type { RecordEvent } from '@/lib/services/record/sentence';
import { rememberState } from '@/lib/services/schedule/load';
import { announce, workOutChange, writeChange } from './change';
import { planAdoption, planEdits, type Plan } from './plan';
import { claim, readStanding, type Standing } from './standing';
import { correctionView } from './view';

/** Adopts fixes, or edits cells by hand; the list is read, audited and computed anew with them. */
export async function createCorrections(
  ctx: OfficeContext,
  { path, body }: { path: { submission: string }; body: z.input<typeof correctionCreate> },
): Promise<CorrectionResult> {
  requirePermission(ctx, 'corrections:adopt');
  const id = idOf(path.submission, 'submission');
  const { fixes, edits, finding, version } = checked(correctionCreate, body);
  if (edits) requirePermission(ctx, 'corrections:edit');
  const standing = await readStanding(ctx, id, version);
  const plan = edits ? planEdits(standing, edits, finding) : planAdoption(standing, fixes ?? []);
  const change = await workOutChange(ctx, standing, plan.sheets, [
    ...standing.corrections,
    ...plan.corrections,
  ]);
  const batch = crypto.randomUUID();
  const result = await inOffice(ctx, async (tx) => {
    await claim(tx, standing);
    await insertPlanned(tx, ctx, id, batch, plan);
    const next = await writeChange(tx, ctx, standing, change);
    await appendRecord(tx, ctx, recordOf(batch, standing, plan), { submission: id });
    const rows = (await listCorrections(tx, id)).filter((correction) => correction.batch === batch);
    return announce(
      tx,
      standing,
      change,
      { kind: 'correction', id: batch },
      {
        batch,
        items: rows.map(correctionView),
        skipped: plan.skipped.map(({ id: fix, reason }) => ({ fix, reason })),
        inapplicable: [],
        version: next,
      },
    );
  });
  rememberState({ id, version: result.version }, 'corrected', change.corrected);
  return result;
}

async function insertPlanned(
  tx: Tx,
  ctx: OfficeContext,
  submission: string,
  batch: string,
  plan: Plan,
): Promise<void> {
  const first = await nextSequence(tx, submission);
  const rows = plan.corrections.map(({ fix, finding, edits }, index) => ({
    id: crypto.randomUUID(),
    sequence: first + index,
    batch,
    fix_id: fix,
    finding_id: finding,
    edits,
  }));
  await insertCorrections(
    tx,
    { officeId: ctx.office.id, submissionId: submission, userId: ctx.user.id },
    rows,
  );
}

const CELLS_NAMED = 5;

function recordOf(batch: string, { findings }: Standing, { corrections }: Plan): RecordEvent {
  const cells = [...new Set(corrections.flatMap(({ edits }) => edits.map(({ cell }) => cell)))];
  if (corrections.every(({ fix }) => fix === null)) {
    const more = Math.max(0, cells.length - CELLS_NAMED);
    return { verb: 'cells edited', data: { batch, cells: cells.slice(0, CELLS_NAMED), more } };
  }
  const mended = new Set(corrections.map(({ finding }) => finding));
  const rules = [...new Set(findings.filter(({ id }) => mended.has(id)).map(({ rule }) => rule))].sort();
  return { verb: 'fixes adopted', data: { batch, fixes: corrections.length, cells: cells.length, rules } };
}
