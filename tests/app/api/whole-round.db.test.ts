import { beforeAll, describe, expect, it } from 'vitest';
import { seedDemo } from '@/db/seed';
import { withOwner } from '@/db/owner';
import { apiTokens } from '@/db/schema';
import { newToken } from '@/lib/access/token';
import type { CorrectionResult, FindingView, SubmissionView } from '@/lib/contract/submission';
import type { ProjectView } from '@/lib/contract/project';
import { testDatabase } from '@/tests/support/database';
import { ask, json } from '@/tests/support/http';
import { uploadForm } from '@/tests/support/uploads';

const database = testDatabase();
const DEMO = '/api/offices/demo';
const tokens: Record<string, string> = {};
let projects: ProjectView[];

async function tokenOf(account: string): Promise<string> {
  const [member] = await database.asOwner<{ id: string; office_id: string }>(
    `select m.id, m.office_id from memberships m join users u on u.id = m.user_id where u.email = $1`,
    [`${account}@demo.example`],
  );
  const { token, hash } = newToken();
  const values = { officeId: member!.office_id, membershipId: member!.id, name: 'test', tokenHash: hash };
  await withOwner((tx) => tx.insert(apiTokens).values(values));
  return token;
}

beforeAll(async () => {
  await seedDemo(() => undefined);
  for (const account of ['analyst', 'scheduler', 'scheduler3']) tokens[account] = await tokenOf(account);
  projects = (await json<{ items: ProjectView[] }>(await as('analyst', 'GET', '/projects'))).items;
});

const as = (account: string, method: string, path: string, more = {}) =>
  ask(method, DEMO + path, { token: tokens[account] ?? '', ...more });
const findingsOf = async (id: string): Promise<FindingView[]> =>
  (await json<{ items: FindingView[] }>(await as('analyst', 'GET', `/submissions/${id}/findings`))).items;

/** Adopts what is proposed, round after round, until nothing is. */
async function adoptAll(id: string): Promise<SubmissionView> {
  for (let round = 0; round < 8; round += 1) {
    const view = await json<SubmissionView>(await as('analyst', 'GET', `/submissions/${id}`));
    const open = (await findingsOf(id)).filter(({ state }) => state === 'open');
    const fixes = open.flatMap(({ fix }) => (fix?.state === 'proposed' ? [fix.id] : []));
    if (fixes.length === 0) return view;
    const answer = await as('analyst', 'POST', `/submissions/${id}/corrections`, {
      body: { version: view.version, fixes },
    });
    if (answer.status === 409) return view;
    expect(answer.status).toBe(201);
    const result = await json<CorrectionResult>(answer);
    expect(result.items.length + result.skipped.length).toBe(fixes.length);
  }
  throw new Error('What is adopted is proposed again and again.');
}

/** Takes the project's first revision in once more, as it was received. */
async function firstAgain(project: ProjectView): Promise<SubmissionView> {
  const path = `/projects/${project.id}/submissions`;
  const { items } = await json<{ items: SubmissionView[] }>(await as('analyst', 'GET', path));
  const bytes = await (
    await as('analyst', 'GET', `/submissions/${items[0]!.id}/workbook?state=received`)
  ).arrayBuffer();
  const form = uploadForm(new File([bytes], items[0]!.file.name));
  return json<SubmissionView>(await as('analyst', 'POST', path, { form }));
}

async function undoAll(id: string): Promise<SubmissionView> {
  const path = `/submissions/${id}/corrections`;
  const { items } = await json<{ items: { batch: string }[] }>(await as('analyst', 'GET', path));
  for (const batch of new Set(items.map((each) => each.batch))) {
    const answer = await as('analyst', 'DELETE', `${path}/${batch}`);
    expect(answer.status).toBe(200);
  }
  return json<SubmissionView>(await as('analyst', 'GET', `/submissions/${id}`));
}

describe.each([
  ['UT-1', 'scheduler'],
  ['TC-3', 'scheduler3'],
])('the demo project %s', (code, scheduler) => {
  let project: ProjectView;
  let submission: SubmissionView;
  let corrected: SubmissionView;

  beforeAll(async () => {
    project = projects.find((each) => each.code === code)!;
    submission = await firstAgain(project);
  });

  it('comes back to what was received when all is undone, from the first step to the last', async () => {
    const before = await findingsOf(submission.id);
    await adoptAll(submission.id);
    const undone = await undoAll(submission.id);
    expect(undone.figures).toEqual(submission.figures);
    expect(await findingsOf(submission.id)).toEqual(before);
  });

  it('loses every finding that a fix is proposed for', async () => {
    corrected = await adoptAll(submission.id);
    const left = (await findingsOf(corrected.id)).filter(
      ({ state, fix }) => state === 'open' && fix !== null,
    );
    expect(left.map(({ rule, message }) => `${rule}: ${message}`)).toEqual([]);
    expect(corrected.corrections).toBeGreaterThan(0);
    expect(corrected.figures.corrected.computable).toBe(true);
  });

  it('gives the contractor a file that, sent in again, has none of the corrected findings', async () => {
    const answer = await as(scheduler, 'GET', `/submissions/${corrected.id}/workbook`);
    expect(answer.status).toBe(200);
    const [inFile, expected] = (answer.headers.get('x-corrections-found') ?? '').split('/');
    expect(inFile).toBe(expected);
    const mended = (await findingsOf(corrected.id)).filter(({ state }) => state === 'corrected');
    const file = new File([await answer.arrayBuffer()], corrected.file.name);
    const form = uploadForm(file);
    const again = await json<SubmissionView>(
      await as(scheduler, 'POST', `/projects/${project.id}/submissions`, { form }),
    );
    expect(again.revision).toBe(corrected.revision + 1);
    const keyOf = ({ rule, activityId, cell }: FindingView) => `${rule} ${activityId} ${cell}`;
    const still = new Set((await findingsOf(again.id)).map(keyOf));
    expect(mended.map(keyOf).filter((key) => still.has(key))).toEqual([]);
    expect({ ...again.figures.received, state: 'corrected' }).toEqual(corrected.figures.corrected);
  });
});
