import { beforeAll, describe, expect, it } from 'vitest';
import type { IntakeView } from '@/lib/contract/intake';
import type { SubmissionView } from '@/lib/contract/submission';
import type { Problem } from '@/lib/contract/shared';
import { makeCast, SLUG, type Cast } from '@/tests/support/cast';
import { testDatabase } from '@/tests/support/database';
import { ask, json } from '@/tests/support/http';
import { csv, SEVEN, upload, uploadForm } from '@/tests/support/uploads';

const database = testDatabase();
let cast: Cast;

beforeAll(async () => {
  cast = await makeCast();
});

const intake = (file: File, fields = {}, token = cast.analyst.token) =>
  ask('POST', `/api/offices/${SLUG}/intake`, { token, form: uploadForm(file, fields) });

const NAMELESS = ['x,y,z,u,v,w', 'A,Set out,1,2,3,', 'B,Dig,2,4,6,A', 'C,Pour,1,2,9,B'];

describe('intake', () => {
  it('says how the list would be read, and keeps nothing', async () => {
    const answer = await intake(csv(['Bay bridge', '', ...SEVEN]));
    expect(answer.status).toBe(200);
    const view = await json<IntakeView>(answer);
    expect(view).toMatchObject({ sure: true, problems: [], proposed: view.sheets[0]?.name });
    expect(view.sheets[0]).toMatchObject({ headerRow: 3, rows: 7 });
    expect(view.sheets[0]?.columns.map(({ field }) => field)).toEqual([
      'id',
      'name',
      'optimistic',
      'likely',
      'pessimistic',
      'predecessors',
    ]);
    expect(view.sample[3]).toMatchObject({
      row: 7,
      kind: 'activity',
      id: 'D',
      optimistic: 5,
      likely: 4,
      predecessors: 'C',
    });
    expect(view.preview.find(({ row }) => row === 3)?.cells[1]).toBe('Activity');
    expect(await database.asOwner('select 1 from submissions')).toEqual([]);
  });

  it('takes what is settled as said', async () => {
    const columns = { id: 0, name: 1, optimistic: 4, likely: 3, pessimistic: 2, predecessors: 5 };
    const view = await json<IntakeView>(await intake(csv(SEVEN), { columns: JSON.stringify(columns) }));
    expect(view.sample[0]).toMatchObject({ id: 'A', optimistic: 3, likely: 2, pessimistic: 1 });
  });

  it('is for who may upload', async () => {
    const tokens = [cast.administrator, cast.analyst, cast.reviewer, cast.scheduler, cast.stranger];
    const statuses = await Promise.all(
      tokens.map(async ({ token }) => (await intake(csv(SEVEN), {}, token)).status),
    );
    expect(statuses).toEqual([403, 200, 403, 200, 404]);
  });

  it('refuses what is no list with a sentence', async () => {
    const answer = await intake(
      new File([new Uint8Array([0x89, 0x50, 0x4e, 0x47, 13, 10, 26, 10, 0, 0])], 'p.png'),
    );
    expect(answer.status).toBe(422);
    expect((await json<Problem>(answer)).errors?.[0]?.path).toBe('file');
  });
});

describe('a list whose columns cannot be told', () => {
  const lines = ['Colour,Weather,Mood', 'red,rain,good', 'blue,sun,bad', 'green,snow,fair'];

  it('is refused with what was detected', async () => {
    const answer = await upload(cast.analyst.token, cast.projects.hull, csv(lines));
    expect(answer.status).toBe(422);
    const problem = await json<Problem & IntakeView>(answer);
    expect(problem.errors?.length).toBeGreaterThan(0);
    expect(problem.sheets[0]?.columns.map(({ index }) => index)).toEqual([0, 1, 2]);
    expect(problem.preview[1]?.cells).toEqual(['red', 'rain', 'good']);
  });

  it('is taken once they are named', async () => {
    const columns = { id: 0, name: 1, optimistic: 2, likely: 3, pessimistic: 4, predecessors: 5 };
    const fields = { columns: JSON.stringify(columns), headerRow: '1' };
    const answer = await upload(cast.analyst.token, cast.projects.hull, csv(NAMELESS), fields);
    expect(answer.status).toBe(201);
    expect((await json<SubmissionView>(answer)).figures.received.expectedDuration).toBeCloseTo(9, 12);
  });

  it('is refused where two fields are given one column', async () => {
    const fields = { columns: JSON.stringify({ id: 0, likely: 0 }) };
    const answer = await upload(cast.analyst.token, cast.projects.hull, csv(NAMELESS), fields);
    expect(answer.status).toBe(422);
    expect((await json<Problem>(answer)).errors?.[0]?.path).toBe('columns.likely');
  });
});
