import { findProject, type ProjectRow } from '@/db/queries/projects';
import { findLatest, insertSubmission } from '@/db/queries/submissions';
import { storable } from '@/db/storable';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import type { SubmissionView } from '@/lib/contract/submission';
import type { Form } from '@/lib/contract/transfer';
import { firstFindings } from '@/lib/services/findings/reconcile';
import { draftFindings } from '@/lib/services/findings/rows';
import { found, idOf, inOffice } from '@/lib/services/in-office';
import { settleMatching } from '@/lib/services/intake/matching';
import { readUpload } from '@/lib/services/intake/upload';
import { datesOfProject } from '@/lib/services/projects/view';
import { rememberSheets, rememberState } from '@/lib/services/schedule/load';
import { computed, readState } from '@/lib/services/schedule/state';
import { sha256 } from './digest';
import { correctedFigures, figuresOf } from './figures';
import { readingOf } from './reading';
import { requireSubmission } from './require';
import { nextRevision, recordReceived, storeList, supersede } from './store';
import { submissionView } from './view';

/** Takes a file in as the project's next revision: reads, audits and computes it, then keeps all of it or nothing. */
export async function createSubmission(
  ctx: OfficeContext,
  { path, form, arrived = new Date() }: { path: { project: string }; form: Form; arrived?: Date },
): Promise<SubmissionView> {
  requirePermission(ctx, 'submissions:create');
  const projectId = idOf(path.project, 'project');
  const before = await inOffice(ctx, async (tx) => {
    return { row: await findProject(tx, projectId), latest: await findLatest(tx, projectId) };
  });
  const row: ProjectRow = found(before.row, 'project');

  const { file, sheets, wanted } = readUpload(form);
  const digest = sha256(file.bytes);
  const how = { matching: settleMatching(sheets, wanted), reading: readingOf(row) };
  const state = await readState(sheets, how);
  const audit = firstFindings(draftFindings(state));
  const dates = datesOfProject(row);
  const summary = {
    received: figuresOf('received', computed(state), dates),
    ...(await correctedFigures(state, how, new Set(), dates)),
  };

  const id = crypto.randomUUID();
  const view = await inOffice(ctx, async (tx) => {
    const repeat = { arrived, seen: before.latest, again: form.fields.again?.[0] };
    const revision = await nextRevision(tx, projectId, digest, repeat);
    const values = {
      id,
      officeId: ctx.office.id,
      projectId,
      contractorId: row.contractor.id,
      revision,
      fileName: file.name,
      fileSha256: digest,
      fileBytes: file.bytes.byteLength,
      ...storable({ ...how, rows: { counts: state.list.rows, refused: state.list.refused }, summary }),
      receivedBy: ctx.user.id,
      receivedAt: new Date(),
    };
    await insertSubmission(tx, values, file.bytes);
    await storeList(tx, ctx, id, state.list, audit);
    await recordReceived(tx, ctx, id, {
      revision,
      file: file.name,
      sha256: digest,
      findings: audit.findings.length,
    });
    await supersede(tx, ctx, projectId, id, revision);
    return submissionView(tx, await requireSubmission(tx, id));
  });
  rememberSheets(digest, sheets);
  rememberState({ id, version: view.version }, 'received', state);
  return view;
}
