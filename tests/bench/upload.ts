import { withOwner } from '@/db/owner';
import { findProject } from '@/db/queries/projects';
import { insertSubmission } from '@/db/queries/submissions';
import { contractors, memberships, offices, users } from '@/db/schema';
import { storable } from '@/db/storable';
import type { OfficeContext } from '@/lib/access/context';
import { firstFindings } from '@/lib/services/findings/reconcile';
import { draftFindings } from '@/lib/services/findings/rows';
import { listFindings } from '@/lib/services/findings/list';
import { createCorrections } from '@/lib/services/corrections/create';
import { inOffice } from '@/lib/services/in-office';
import { createProject } from '@/lib/services/projects/create';
import { datesOfProject } from '@/lib/services/projects/view';
import { computed, readState } from '@/lib/services/schedule/state';
import { createSubmission } from '@/lib/services/submissions/create';
import { correctedFigures, figuresOf } from '@/lib/services/submissions/figures';
import { getSubmission } from '@/lib/services/submissions/get';
import { sha256 } from '@/lib/services/submissions/digest';
import { storeList } from '@/lib/services/submissions/store';
import { DEFAULT_READING } from '@/lib/schedule/activity-list';
import { detectMatching, readSheets } from '@/parsers';
import { syntheticList, toXlsx, type ListRow } from '@/tests/support/lists';
import { measure, REPEATS, type BenchRow } from './measure';

/** A defect on every tenth row: estimates out of order, or a predecessor that does not exist. */
function withDefects(rows: readonly ListRow[]): ListRow[] {
  return rows.map((row, index) => {
    if (index % 20 === 10) return { ...row, optimistic: row.likely, likely: row.optimistic };
    if (index % 20 !== 0 || index === 0) return row;
    return { ...row, predecessors: [...row.predecessors, { id: `${row.id}X`, type: 'FS' as const, lag: 0 }] };
  });
}

async function makeOffice(): Promise<{ ctx: OfficeContext; contractor: string }> {
  const office = { id: crypto.randomUUID(), slug: `bench-${Date.now()}`, name: 'Bench', locale: 'en-GB' };
  const user = { id: crypto.randomUUID(), name: 'Bench', email: `${office.slug}@bench.example` };
  const contractor = crypto.randomUUID();
  const membership = crypto.randomUUID();
  await withOwner(async (tx) => {
    await tx.insert(offices).values(office);
    await tx.insert(contractors).values({ id: contractor, officeId: office.id, name: 'Bench' });
    await tx.insert(users).values(user);
    await tx
      .insert(memberships)
      .values({ id: membership, officeId: office.id, userId: user.id, role: 'analyst' });
  });
  const rest = { role: 'analyst', contractor: null, via: 'session', readOnly: false } as const;
  return { ctx: { office, user, membership, ...rest }, contractor };
}

/** Insert alone, a whole upload through the service, and one fix adopted, in a database of their own. */
export async function benchUpload(sizes: readonly number[]): Promise<BenchRow[]> {
  const { ctx, contractor } = await makeOffice();
  const rows: BenchRow[] = [];
  for (const size of sizes) {
    const bytes = await toXlsx(withDefects(syntheticList(size)));
    const { id: project } = await createProject(ctx, {
      body: { code: `B${size}`, name: `Bench ${size}`, contractor, start: '2027-01-04' },
    });
    rows.push(await measure('insert', size, await insertOf(ctx, contractor, project, bytes)));

    const form = { file: { name: 'list.xlsx', bytes }, fields: { again: ['true'] } };
    let latest = '';
    const upload = async () => {
      latest = (await createSubmission(ctx, { path: { project }, form })).id;
    };
    rows.push(await measure('whole upload', size, upload));
    rows.push(await measure('one fix adopted', size, () => adoptOne(ctx, latest)));
  }
  return rows;
}

/** What the upload writes, with all that comes before it done already. */
async function insertOf(ctx: OfficeContext, contractorId: string, projectId: string, bytes: Uint8Array) {
  const sheets = readSheets(bytes, 'list.xlsx');
  const how = { matching: detectMatching(sheets).matching, reading: DEFAULT_READING };
  const state = await readState(sheets, how);
  const drafts = draftFindings(state);
  // Each run inserts findings with ids of their own, made beforehand.
  const audits = Array.from({ length: REPEATS }, () => firstFindings(drafts));
  const project = await inOffice(ctx, (tx) => findProject(tx, projectId));
  if (!project) throw new Error('The bench lost its project.');
  const dates = datesOfProject(project);
  const summary = {
    received: figuresOf('received', computed(state), dates),
    ...(await correctedFigures(state, how, new Set(), dates)),
  };
  let revision = 1000;
  return () =>
    inOffice(ctx, async (tx) => {
      const id = crypto.randomUUID();
      const values = {
        id,
        officeId: ctx.office.id,
        projectId,
        contractorId,
        revision: revision++,
        fileName: 'list.xlsx',
        fileSha256: sha256(bytes),
        fileBytes: bytes.byteLength,
        ...how,
        rows: { counts: state.list.rows, refused: [] },
        summary,
        receivedBy: ctx.user.id,
      };
      await insertSubmission(tx, storable(values), bytes);
      await storeList(tx, ctx, id, state.list, audits.pop() ?? firstFindings(drafts));
    });
}

async function adoptOne(ctx: OfficeContext, submission: string): Promise<void> {
  const path = { submission };
  const { items } = await listFindings(ctx, { path });
  const open = items.find((finding) => finding.fix?.state === 'proposed');
  if (!open?.fix) throw new Error('The bench found no fix to adopt.');
  const { version } = await getSubmission(ctx, { path });
  await createCorrections(ctx, { path, body: { version, fixes: [open.fix.id] } });
}
