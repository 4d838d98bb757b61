import { afterEach, expect, it, vi } from 'vitest';
import { closeDatabase } from '@/db/client';
import { ping } from '@/db/scope';
import { openRoute } from '@/lib/http/route';
import { isDatabaseAway } from '@/lib/http/unavailable';

afterEach(async () => {
  vi.unstubAllEnvs();
  await closeDatabase();
});

it('answers 503 where the database is out of reach, and says so', async () => {
  vi.stubEnv('DATABASE_URL', 'postgres://nobody@127.0.0.1:1/nowhere');
  const answer = await openRoute(ping)(new Request('http://x.test/api/x'), { params: Promise.resolve({}) });
  expect(answer.status).toBe(503);
  expect(answer.headers.get('retry-after')).toBe('5');
  expect(await answer.json()).toMatchObject({
    title: 'Not available',
    detail: expect.stringMatching(/^The database does not answer\./) as string,
  });
});

it('knows a database that shuts down from a query that is wrong', () => {
  const failed = (code: string) =>
    new Error('Failed query', { cause: Object.assign(new Error('said'), { code }) });
  for (const code of ['57P01', '57P03', '08006', '53300', 'ECONNRESET']) {
    expect(isDatabaseAway(failed(code)), code).toBe(true);
  }
  for (const code of ['23505', '22P02', '42501', 'ENOENT']) {
    expect(isDatabaseAway(failed(code)), code).toBe(false);
  }
  expect(isDatabaseAway(new Error('Connection terminated unexpectedly'))).toBe(true);
  expect(isDatabaseAway('a string')).toBe(false);
});
