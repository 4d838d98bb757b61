import type { z } from 'zod';
import type { FixRow } from '@/db/queries/fixes';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import { checked, Conflict } from '@/lib/contract/errors';
import { fixUpdate, type CorrectionResult } from '@/lib/contract/submission';
import { announce, writeChange } from '@/lib/services/corrections/change';
import { claim, readStanding, type Standing } from '@/lib/services/corrections/standing';
import { toValues } from '@/lib/services/findings/reconcile-fixes';
import type { Reconciliation } from '@/lib/services/findings/reconcile';
import { found, idOf, inOffice } from '@/lib/services/in-office';
import { appendRecord } from '@/lib/services/record/append';
import { rememberState } from '@/lib/services/schedule/load';
import { correctedFigures } from '@/lib/services/submissions/figures';
import { datesOf } from '@/lib/services/submissions/view';

/** Declines a fix, or proposes it again. No cell changes; what is proposed for a blocked list may. */
export async function updateFix(
  ctx: OfficeContext,
  { path, body }: { path: { submission: string; fix: string }; body: z.input<typeof fixUpdate> },
): Promise<CorrectionResult> {
  requirePermission(ctx, 'fixes:update');
  const id = idOf(path.submission, 'submission');
  const wanted = checked(fixUpdate, body);
  const standing = await readStanding(ctx, id, wanted.version);
  const fix = found(
    standing.fixes.find((each) => each.id === path.fix.toLowerCase()),
    'fix',
  );
  if (fix.state === 'adopted') throw new Conflict('This fix is adopted; undo it first.');
  const reconciliation = onlyFix(standing, fix, wanted.state);
  const { submission } = standing.row;
  const figures = await correctedFigures(
    standing.corrected,
    submission,
    reconciliation.declined,
    datesOf(standing.row),
  );
  const change = { reconciliation, summary: { ...submission.summary, ...figures } };
  const result = await inOffice(ctx, async (tx) => {
    await claim(tx, standing);
    const version = await writeChange(tx, ctx, standing, change);
    const about = found(
      standing.findings.find((finding) => finding.id === fix.finding),
      'finding',
    );
    const verb = wanted.state === 'declined' ? 'fix declined' : 'fix proposed again';
    const data = { fix: fix.id, rule: about.rule, cell: about.cell };
    await appendRecord(tx, ctx, { verb, data }, { submission: id });
    const parts = { batch: null, items: [], skipped: [], inapplicable: [], version };
    return announce(tx, standing, change, { kind: 'fix', id: fix.id }, parts);
  });
  rememberState({ id, version: result.version }, 'corrected', standing.corrected);
  return result;
}

function onlyFix({ findings, fixes }: Standing, fix: FixRow, state: 'declined' | 'proposed'): Reconciliation {
  const declinedNow = (each: FixRow) => (each.id === fix.id ? state : each.state) === 'declined';
  const declined = new Set(
    fixes.filter((each) => each.rank === 0 && declinedNow(each)).map((each) => each.finding),
  );
  return {
    findings: { insert: [], update: [], erase: [] },
    fixes: { insert: [], update: [{ ...toValues(fix), state }], erase: [] },
    changed: new Set([fix.finding]),
    declined: new Set(findings.filter(({ id }) => declined.has(id)).map(({ key }) => key)),
  };
}
