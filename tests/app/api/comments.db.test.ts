import { beforeAll, describe, expect, it } from 'vitest';
import { closeStreams } from '@/lib/http/event-stream';
import type { CommentView, FindingView, RecordEntryView, SubmissionView } from '@/lib/contract/submission';
import type { Problem } from '@/lib/contract/shared';
import { entryHash } from '@/lib/services/record/hash';
import { makeCast, SLUG, type Cast } from '@/tests/support/cast';
import { testDatabase } from '@/tests/support/database';
import { ask, json } from '@/tests/support/http';
import { received, SEVEN, submissionAt } from '@/tests/support/uploads';

const database = testDatabase();
let cast: Cast;
let submission: SubmissionView;
let finding: FindingView;

beforeAll(async () => {
  cast = await makeCast();
  submission = await received(cast.analyst.token, cast.projects.hull, SEVEN);
  const answer = await ask('GET', at('/findings'), { token: cast.analyst.token });
  [finding] = (await json<{ items: [FindingView] }>(answer)).items;
});

const at = (rest: string) => submissionAt(submission.id, rest);
const comment = (token: string, body: object) => ask('POST', at('/comments'), { token, body });
const read = async (token: string): Promise<CommentView[]> =>
  (await json<{ items: CommentView[] }>(await ask('GET', at('/comments'), { token }))).items;

describe('a comment', () => {
  it('inside the office is not the contractor’s to see, nor is that it was made', async () => {
    const inside = await json<CommentView>(
      await comment(cast.reviewer.token, { body: ' Looks padded. ', finding: finding.id }),
    );
    expect(inside).toMatchObject({
      audience: 'inside',
      body: 'Looks padded.',
      finding: finding.id,
      by: { role: 'reviewer' },
    });
    const shared = await json<CommentView>(
      await comment(cast.reviewer.token, { body: 'Why this?', finding: finding.id, audience: 'shared' }),
    );
    expect((await read(cast.analyst.token)).map(({ id }) => id)).toEqual([inside.id, shared.id]);
    expect((await read(cast.scheduler.token)).map(({ id }) => id)).toEqual([shared.id]);
    const seen = async (token: string) => {
      const view = await json<SubmissionView>(await ask('GET', at(''), { token }));
      const record = await json<{ items: RecordEntryView[] }>(await ask('GET', at('/record'), { token }));
      const findings = await json<{ items: FindingView[] }>(await ask('GET', at('/findings'), { token }));
      const counted = findings.items.find(({ id }) => id === finding.id)?.comments;
      return [view.comments, view.record, record.items.length, counted];
    };
    expect(await seen(cast.analyst.token)).toEqual([2, 3, 3, 2]);
    expect(await seen(cast.scheduler.token)).toEqual([1, 2, 2, 1]);
  });

  it('of a scheduler is always shared', async () => {
    const answer = await comment(cast.scheduler.token, { body: 'The crane is late.', audience: 'inside' });
    expect(answer.status).toBe(201);
    expect(await json(answer)).toMatchObject({
      audience: 'shared',
      by: { name: 'scheduler', role: 'scheduler' },
    });
  });

  it('may be about a row', async () => {
    const answer = await comment(cast.analyst.token, { body: 'See row 5.', row: 5 });
    expect(await json(answer)).toMatchObject({ row: 5, sheet: finding.sheet, finding: null });
  });

  it.each([
    ['says nothing', { body: ' \n ' }, 'body'],
    ['is about another finding', { body: 'x', finding: crypto.randomUUID() }, 'finding'],
    ['is about a sheet that is not there', { body: 'x', sheet: 'Nowhere', row: 3 }, 'sheet'],
    ['is for nobody', { body: 'x', audience: 'public' }, 'audience'],
  ])('that %s is refused', async (_name, body, path) => {
    const answer = await comment(cast.analyst.token, body);
    expect(answer.status).toBe(422);
    expect((await json<Problem>(answer)).errors?.[0]?.path).toBe(path);
  });

  it('is not for everybody to make', async () => {
    const statuses = [];
    for (const token of [
      cast.administrator.token,
      cast.otherScheduler.token,
      cast.stranger.token,
      cast.readOnly,
    ]) {
      statuses.push((await comment(token, { body: 'x' })).status);
    }
    expect(statuses).toEqual([403, 404, 404, 403]);
  });

  it('is kept whatever characters it has', async () => {
    const answer = await comment(cast.analyst.token, { body: 'a\u0000b \ud800 =HYPERLINK() 計画' });
    expect(await json(answer)).toMatchObject({ body: 'a\ufffdb \ufffd =HYPERLINK() 計画' });
  });
});

describe('the stream of events', () => {
  async function open(token: string) {
    const abort = new AbortController();
    const answer = await ask('GET', at('/events'), { token, signal: abort.signal });
    expect(answer.headers.get('content-type')).toContain('text/event-stream');
    const reader = answer.body!.pipeThrough(new TextDecoderStream()).getReader();
    let text = '';
    const until = async (wanted: string): Promise<string> => {
      while (!text.includes(wanted)) {
        const { value, done } = await reader.read();
        if (done) break;
        text += value;
      }
      return text;
    };
    await until(': listening');
    return { abort, until, reader };
  }

  it('brings a shared comment to the scheduler, and nothing of one inside the office', async () => {
    const scheduler = await open(cast.scheduler.token);
    const analyst = await open(cast.analyst.token);
    const inside = await json<CommentView>(await comment(cast.reviewer.token, { body: 'between us' }));
    const shared = await json<CommentView>(
      await comment(cast.reviewer.token, { body: 'to you', audience: 'shared' }),
    );
    const heard = await scheduler.until(shared.id);
    expect(heard).toContain('event: comment\ndata: {"kind":"comment"');
    expect(heard).not.toContain(inside.id);
    expect(await analyst.until(shared.id)).toContain(inside.id);
    scheduler.abort.abort();
    analyst.abort.abort();
    expect((await scheduler.reader.read()).done).toBe(true);
  });

  it('tells of corrections with the version they lead to', async () => {
    const stream = await open(cast.scheduler.token);
    const findings = await json<{ items: FindingView[] }>(
      await ask('GET', at('/findings'), { token: cast.analyst.token }),
    );
    const fixes = findings.items.flatMap(({ rule, fix }) =>
      rule === 'likely-below-optimistic' && fix ? [fix.id] : [],
    );
    await ask('POST', at('/corrections'), { token: cast.analyst.token, body: { version: 0, fixes } });
    expect(await stream.until('"version":1')).toContain('event: correction');
    stream.abort.abort();
  });

  it('ends when the server is told to stop', async () => {
    const stream = await open(cast.analyst.token);
    closeStreams();
    await stream.until('never said');
    expect((await stream.reader.read()).done).toBe(true);
  });

  it('is another contractor’s as little as the submission', async () => {
    expect((await ask('GET', at('/events'), { token: cast.otherScheduler.token })).status).toBe(404);
  });
});

describe('the record', () => {
  it('tells what was done in plain sentences, in order', async () => {
    const { items } = await json<{ items: RecordEntryView[] }>(
      await ask('GET', at('/record'), { token: cast.analyst.token }),
    );
    expect(items.map(({ sequence }) => sequence)).toEqual(items.map((_, index) => index + 1));
    expect(items[0]).toMatchObject({ by: 'analyst', verb: 'submission received' });
    expect(items[0]?.summary).toMatch(/^Received list\.csv as Rev 0; the audit found \d+ defects\.$/);
    expect(items.at(-1)?.summary).toBe('Adopted one fix in 2 cells (likely-below-optimistic).');
  });

  it('can be shown to be unaltered', async () => {
    const rows = await database.asOwner<Record<string, unknown>>(
      `select office_id, submission_id, sequence, at, actor_id, actor_name, verb, audience, data, previous_hash, hash
       from record_entries where submission_id = $1 order by sequence`,
      [submission.id],
    );
    let previous = '';
    for (const row of rows) {
      expect(row.previous_hash).toBe(previous);
      previous = entryHash(previous, {
        office: String(row.office_id),
        submission: String(row.submission_id),
        sequence: Number(row.sequence),
        at: (row.at as Date).toISOString(),
        actor: String(row.actor_id),
        actorName: String(row.actor_name),
        verb: String(row.verb),
        audience: String(row.audience),
        data: row.data,
      });
      expect(row.hash).toBe(previous);
    }
    expect(rows.length).toBeGreaterThan(5);
  });
});

it('knows the rules it audits by', async () => {
  const { items } = await json<{ items: { id: string; source: string }[] }>(
    await ask('GET', `/api/offices/${SLUG}/rules`, { token: cast.scheduler.token }),
  );
  expect(items.map(({ id }) => id)).toContain('unknown-predecessor');
  expect(items.every(({ source }) => source !== '')).toBe(true);
});
