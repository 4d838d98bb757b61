import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type {
  ActivityView,
  CorrectionResult,
  CorrectionView,
  FindingView,
  SubmissionView,
} from '@/lib/contract/submission';
import type { Problem } from '@/lib/contract/shared';
import { makeCast, type Cast } from '@/tests/support/cast';
import { testDatabase } from '@/tests/support/database';
import { ask, json } from '@/tests/support/http';
import { BLOCKED, csv, received, SEVEN, submissionAt, upload } from '@/tests/support/uploads';

testDatabase();
let cast: Cast;
let submission: SubmissionView;
let findings: FindingView[];

beforeAll(async () => {
  cast = await makeCast();
});

async function start(lines: readonly string[]): Promise<void> {
  submission = await received(cast.analyst.token, cast.projects.hull, lines);
  findings = await listFindings();
}

const at = (rest: string) => submissionAt(submission.id, rest);

async function listFindings(): Promise<FindingView[]> {
  const answer = await ask('GET', at('/findings'), { token: cast.analyst.token });
  return (await json<{ items: FindingView[] }>(answer)).items;
}

function byRule(rule: string, among = findings): FindingView {
  const finding = among.find((each) => each.rule === rule);
  if (!finding) throw new Error(`Nothing was found by ${rule}.`);
  return finding;
}

const fixOf = (rule: string): string => byRule(rule).fix?.id ?? '';
const correct = (body: object, token = cast.analyst.token) =>
  ask('POST', at('/corrections'), { token, body });
const undo = (id: string, query = '', token = cast.analyst.token) =>
  ask('DELETE', at(`/corrections/${id}${query}`), { token });

async function done(answer: Response): Promise<CorrectionResult> {
  if (!answer.ok) throw new Error(`${answer.status} ${await answer.text()}`);
  return json<CorrectionResult>(answer);
}

describe('adopting a fix', () => {
  beforeEach(() => start(SEVEN));

  it('changes the cells, mends the finding and moves the figures', async () => {
    const answer = await correct({ version: 0, fixes: [fixOf('likely-below-optimistic')] });
    expect(answer.status).toBe(201);
    const result = await done(answer);
    expect(result).toMatchObject({
      version: 1,
      skipped: [],
      gone: [],
      items: [{ by: 'analyst', batch: result.batch }],
    });
    expect(result.items[0]?.edits).toEqual([
      { sheet: byRule('likely-below-optimistic').sheet, cell: 'C5', from: '5', to: '4' },
      { sheet: byRule('likely-below-optimistic').sheet, cell: 'D5', from: '4', to: '5' },
    ]);
    const mended = byRule('likely-below-optimistic', result.changed);
    expect(mended).toMatchObject({ state: 'corrected', fix: { state: 'adopted' } });
    const { received: before, corrected } = result.submission.figures;
    expect(before.expectedDuration).toBeCloseTo(16.5, 12);
    expect(corrected.expectedDuration).toBeCloseTo(17, 12);
    expect(corrected.variance).toBeCloseTo(23 / 9, 12);
    expect(result.submission).toMatchObject({
      version: 1,
      corrections: 1,
      record: 2,
      status: 'under review',
    });
    expect(result.submission.open.distorts).toBe(submission.open.distorts - 1);
    expect(result.submission.findings).toEqual(submission.findings);
  });

  it('shows in the activities, the sheet and the workbook as corrected, and not as received', async () => {
    await done(await correct({ version: 0, fixes: [fixOf('likely-below-optimistic')] }));
    const states = await Promise.all(
      ['received', 'corrected'].map(async (state) => {
        const answer = await ask('GET', at(`/activities?state=${state}`), { token: cast.analyst.token });
        const { items } = await json<{ items: ActivityView[] }>(answer);
        return items.find(({ id }) => id === 'D');
      }),
    );
    expect(states).toMatchObject([
      { optimistic: 5, likely: 4 },
      { optimistic: 4, likely: 5 },
    ]);
    const workbook = await ask('GET', at('/workbook'), { token: cast.scheduler.token });
    expect(await workbook.text()).toBe(SEVEN.join('\r\n').replace('D,Cure,5,4,6', 'D,Cure,4,5,6') + '\r\n');
    expect(workbook.headers.get('x-corrections-found')).toBe('1/1');
  });

  it('of the workbook sent in again gives none of the corrected findings', async () => {
    await done(
      await correct({ version: 0, fixes: [fixOf('likely-below-optimistic'), fixOf('unknown-predecessor')] }),
    );
    const bytes = await (await ask('GET', at('/workbook'), { token: cast.scheduler.token })).arrayBuffer();
    const answer = await upload(
      cast.scheduler.token,
      cast.projects.hull,
      new File([bytes], 'list (corrected).csv'),
    );
    submission = await json<SubmissionView>(answer);
    const rules = (await listFindings()).map(({ rule }) => rule);
    expect(rules).not.toContain('likely-below-optimistic');
    expect(rules).not.toContain('unknown-predecessor');
  });

  it('of two people at once is the first one’s', async () => {
    const attempts = ['likely-below-optimistic', 'unknown-predecessor'].map((rule) =>
      correct({ version: 0, fixes: [fixOf(rule)] }),
    );
    const answers = await Promise.all(attempts);
    expect(answers.map((answer) => answer.status).sort()).toEqual([201, 409]);
    const refused = answers.find((answer) => answer.status === 409);
    expect(await json(refused!)).toMatchObject({
      version: 1,
      detail: expect.stringContaining('Someone else'),
    });
    const { items } = await json<{ items: CorrectionView[] }>(
      await ask('GET', at('/corrections'), { token: cast.analyst.token }),
    );
    expect(items).toHaveLength(1);
  });

  it('twice is refused with the reason', async () => {
    const fix = fixOf('likely-below-optimistic');
    await done(await correct({ version: 0, fixes: [fix] }));
    const again = await correct({ version: 1, fixes: [fix] });
    expect(again.status).toBe(409);
    expect((await json<Problem>(again)).detail).toBe('This finding is corrected already.');
    const mixed = await done(await correct({ version: 1, fixes: [fix, fixOf('unknown-predecessor')] }));
    expect(mixed.skipped).toEqual([{ fix, reason: 'This finding is corrected already.' }]);
    expect(mixed.items).toHaveLength(1);
  });

  it('that is none of this submission’s is refused', async () => {
    const answer = await correct({ version: 0, fixes: [crypto.randomUUID()] });
    expect(answer.status).toBe(422);
    expect((await json<Problem>(answer)).errors?.[0]?.path).toBe('fixes.0');
  });

  it.each([
    ['neither fixes nor edits', { version: 0 }],
    ['both', { version: 0, fixes: [crypto.randomUUID()], edits: [{ sheet: 's', cell: 'A1', to: 1 }] }],
    ['no version', { fixes: [crypto.randomUUID()] }],
    ['no address', { version: 0, edits: [{ sheet: 's', cell: '1A', to: 1 }] }],
  ])('or editing with %s is refused', async (_name, body) => {
    expect((await correct(body)).status).toBe(422);
  });
});

describe('who may', () => {
  beforeEach(() => start(SEVEN));

  it('adopt, and who may edit by hand', async () => {
    const fixes = () => ({ version: 0, fixes: [fixOf('likely-below-optimistic')] });
    const edits = () => ({
      version: 0,
      edits: [{ sheet: byRule('likely-below-optimistic').sheet, cell: 'C5', to: 3 }],
    });
    const refused = [];
    for (const who of ['administrator', 'reviewer', 'otherScheduler', 'stranger'] as const) {
      refused.push(
        (await correct(fixes(), cast[who].token)).status,
        (await correct(edits(), cast[who].token)).status,
      );
    }
    expect(refused).toEqual([403, 403, 403, 403, 404, 403, 404, 404]);
    expect((await correct(fixes(), cast.readOnly)).status).toBe(403);
    expect((await correct(edits(), cast.scheduler.token)).status).toBe(403);
    expect((await correct(fixes(), cast.scheduler.token)).status).toBe(201);
  });

  it('undo: a scheduler its own side’s, the office everybody’s', async () => {
    const office = await done(await correct({ version: 0, fixes: [fixOf('likely-below-optimistic')] }));
    const own = await done(
      await correct({ version: 1, fixes: [fixOf('unknown-predecessor')] }, cast.scheduler.token),
    );
    expect((await undo(office.batch!, '', cast.scheduler.token)).status).toBe(403);
    expect((await undo(own.batch!, '', cast.scheduler.token)).status).toBe(200);
    expect((await undo(office.batch!, '', cast.reviewer.token)).status).toBe(403);
    expect((await undo(office.batch!, '', cast.otherScheduler.token)).status).toBe(404);
    expect((await undo(office.batch!)).status).toBe(200);
  });

  it('decline', async () => {
    const statuses = [];
    for (const who of [
      'administrator',
      'reviewer',
      'scheduler',
      'otherScheduler',
      'stranger',
      'analyst',
    ] as const) {
      const path = at(`/fixes/${fixOf('likely-below-optimistic')}`);
      const body = { state: 'declined', version: 0 };
      statuses.push((await ask('PATCH', path, { token: cast[who].token, body })).status);
    }
    expect(statuses).toEqual([403, 403, 403, 403, 404, 200]);
  });
});

describe('undoing', () => {
  beforeEach(() => start(SEVEN));

  it('puts everything back as it was, but for the trail', async () => {
    const { batch } = await done(
      await correct({ version: 0, fixes: [fixOf('likely-below-optimistic'), fixOf('unknown-predecessor')] }),
    );
    const back = await done(await undo(batch!, '?version=1'));
    expect(back).toMatchObject({ version: 2, inapplicable: [], submission: { corrections: 0, record: 3 } });
    expect(back.submission.figures.corrected).toEqual(submission.figures.corrected);
    expect(await listFindings()).toEqual(findings);
    expect((await undo(batch!)).status).toBe(404);
  });

  it('one of a batch leaves the others', async () => {
    const { items } = await done(
      await correct({ version: 0, fixes: [fixOf('likely-below-optimistic'), fixOf('unknown-predecessor')] }),
    );
    const [first] = items.filter(({ fix }) => fix === fixOf('likely-below-optimistic'));
    const back = await done(await undo(first?.id ?? ''));
    expect(back.submission.corrections).toBe(1);
    expect(byRule('likely-below-optimistic', back.changed)).toMatchObject({
      state: 'open',
      fix: { state: 'proposed' },
    });
  });

  it('with an old version is refused', async () => {
    const { batch } = await done(await correct({ version: 0, fixes: [fixOf('likely-below-optimistic')] }));
    expect((await undo(batch!, '?version=0')).status).toBe(409);
  });
});

describe('editing by hand', () => {
  beforeEach(() => start(SEVEN));
  const sheet = () => byRule('likely-below-optimistic').sheet ?? '';

  it('changes a cell, answers a finding and says what the cell held', async () => {
    const finding = byRule('likely-below-optimistic').id;
    const result = await done(
      await correct({ version: 0, edits: [{ sheet: sheet(), cell: 'c5', to: 3 }], finding }),
    );
    expect(result.items).toMatchObject([{ fix: null, finding, edits: [{ cell: 'C5', from: '5', to: '3' }] }]);
    expect(byRule('likely-below-optimistic', result.changed).state).toBe('corrected');
  });

  it('that changes nothing is refused, naming the field', async () => {
    const answer = await correct({ version: 0, edits: [{ sheet: sheet(), cell: 'C5', to: '5' }] });
    expect(answer.status).toBe(422);
    expect((await json<Problem>(answer)).errors).toEqual([
      { path: 'edits.0.to', message: 'C5 holds this already.' },
    ]);
  });

  it('that breaks something makes a finding, which vanishes with the edit unless it was talked about', async () => {
    const broken = await done(
      await correct({ version: 0, edits: [{ sheet: sheet(), cell: 'F3', to: 'B' }] }),
    );
    const made = byRule('self-link', broken.changed);
    expect(made).toMatchObject({ origin: 'correction', state: 'open', weight: 'blocks' });
    expect(broken.submission.figures).toMatchObject({
      received: { computable: true },
      corrected: { computable: false },
      proposed: { computable: true },
    });
    const analysis = await ask('GET', at('/analysis?state=corrected'), { token: cast.analyst.token });
    expect(await json(analysis)).toMatchObject({ computable: false, because: [made.id] });
    const back = await done(await undo(broken.batch!));
    expect(back.gone).toContain(made.id);
    expect(await listFindings()).toEqual(findings);

    const again = await done(await correct({ version: 2, edits: [{ sheet: sheet(), cell: 'F3', to: 'B' }] }));
    const finding = byRule('self-link', again.changed).id;
    await ask('POST', at('/comments'), { token: cast.reviewer.token, body: { body: 'Why?', finding } });
    const kept = await done(await undo(again.batch!));
    expect(kept.gone).not.toContain(finding);
    expect(kept.changed.find(({ id }) => id === finding)).toMatchObject({ state: 'corrected', comments: 1 });
  });

  it('is told where a later correction has nothing to change any more', async () => {
    const first = await done(
      await correct({ version: 0, edits: [{ sheet: sheet(), cell: 'F7', to: 'D, B' }] }),
    );
    await done(await correct({ version: 1, edits: [{ sheet: sheet(), cell: 'F7', to: 'D, Z9' }] }));
    const back = await done(await undo(first.batch!));
    expect(back.inapplicable).toMatchObject([{ reason: expect.stringContaining('F7') }]);
  });
});

describe('declining', () => {
  it('keeps a fix out of what is proposed, until it is proposed again', async () => {
    await start(BLOCKED);
    const fix = fixOf('loop');
    const set = (state: string, version: number) =>
      ask('PATCH', at(`/fixes/${fix}`), { token: cast.analyst.token, body: { state, version } });
    const declined = await done(await set('declined', 0));
    expect(declined).toMatchObject({
      version: 1,
      batch: null,
      items: [],
      changed: [{ rule: 'loop', fix: { state: 'declined' } }],
    });
    expect(declined.submission.figures.proposed).toMatchObject({ computable: false });
    expect((await set('proposed', 0)).status).toBe(409);
    const again = await done(await set('proposed', 1));
    expect(again.submission.figures.proposed).toEqual(submission.figures.proposed);
  });

  it('is not for a fix that is adopted', async () => {
    await start(SEVEN);
    const fix = fixOf('likely-below-optimistic');
    await done(await correct({ version: 0, fixes: [fix] }));
    const answer = await ask('PATCH', at(`/fixes/${fix}`), {
      token: cast.analyst.token,
      body: { state: 'declined', version: 1 },
    });
    expect(answer.status).toBe(409);
  });
});

describe('a blocked list', () => {
  it('is computed once its blocking findings are mended', async () => {
    await start(BLOCKED);
    let version = 0;
    for (let round = 0; round < 4; round += 1) {
      const fixes = (await listFindings()).flatMap(({ weight, state, fix }) =>
        weight === 'blocks' && state === 'open' && fix ? [fix.id] : [],
      );
      if (fixes.length === 0) break;
      version = (await done(await correct({ version, fixes }))).version;
    }
    const now = await json<SubmissionView>(await ask('GET', at(''), { token: cast.analyst.token }));
    expect(now.figures.corrected.computable).toBe(true);
    expect(now.figures.corrected.expectedDuration).toBe(submission.figures.proposed?.expectedDuration);
    expect(now.figures.received.computable).toBe(false);
    expect((await listFindings()).some(({ fix }) => fix?.effect)).toBe(true);
  });
});

describe('a revision that is closed', () => {
  it('is corrected no more', async () => {
    await start(SEVEN);
    const old = submission;
    const fix = fixOf('likely-below-optimistic');
    await upload(cast.analyst.token, cast.projects.hull, csv([...SEVEN, 'H,More,1,2,3,A']));
    submission = old;
    const answer = await correct({ version: 1, fixes: [fix] });
    expect(answer.status).toBe(409);
    expect((await json<Problem>(answer)).detail).toContain('superseded');
  });
});
