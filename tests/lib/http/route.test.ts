import { describe, expect, it } from 'vitest';
import { Conflict, Invalid } from '@/lib/contract/errors';
import { Download } from '@/lib/contract/transfer';
import { openRoute } from '@/lib/http/route';

const params = { params: Promise.resolve({}) };
const ask = (useCase: () => Promise<unknown>, options = {}) =>
  openRoute(useCase, options)(new Request('http://x.test/api/x?a=1&b='), params);

it('answers JSON that is kept by nobody', async () => {
  const answer = await ask(() => Promise.resolve({ a: 1 }), { status: 201 });
  expect([answer.status, await answer.json()]).toEqual([201, { a: 1 }]);
  expect(answer.headers.get('cache-control')).toBe('private, no-store');
});

it('answers nothing where there is nothing to say', async () => {
  const answer = await ask(() => Promise.resolve(undefined), { status: 204 });
  expect([answer.status, await answer.text()]).toEqual([204, '']);
});

it('answers a file as one', async () => {
  const answer = await ask(() =>
    Promise.resolve(new Download('ä.csv', 'text/csv', new Uint8Array([65]), { 'x-y': 'z' })),
  );
  expect(await answer.text()).toBe('A');
  expect(Object.fromEntries(answer.headers)).toMatchObject({
    'content-type': 'text/csv',
    'content-length': '1',
    'x-y': 'z',
  });
});

it('answers a refusal as a problem document with its members', async () => {
  const answer = await ask(() =>
    Promise.reject(new Conflict('Someone was first.', { members: { version: 3 } })),
  );
  expect(answer.headers.get('content-type')).toBe('application/problem+json');
  expect(await answer.json()).toEqual({
    type: 'about:blank',
    status: 409,
    title: 'Not as things stand',
    detail: 'Someone was first.',
    version: 3,
  });
  const invalid = await ask(() => Promise.reject(Invalid.field('name', 'Give a name.')));
  expect(await invalid.json()).toMatchObject({
    status: 422,
    errors: [{ path: 'name', message: 'Give a name.' }],
  });
});

it('tells nothing of what nobody foresaw but an id', async () => {
  const answer = await ask(() => Promise.reject(new Error('password is tallow')));
  expect(answer.status).toBe(500);
  const text = await answer.text();
  expect(text).not.toContain('tallow');
  expect(text).toMatch(/urn:uuid:[0-9a-f-]{36}/);
});

it('takes a parameter without a value for none', async () => {
  let given: unknown;
  await openRoute((_who: null, call: { query: object }) => Promise.resolve((given = call.query)))(
    new Request('http://x.test/api/x?a=1&b='),
    params,
  );
  expect(given).toEqual({ a: '1' });
});

describe('parameters of the address', () => {
  const seen = async (given: Record<string, string | string[]> | undefined) => {
    let path: unknown;
    await openRoute((_who: null, call: { path: object }) => Promise.resolve((path = call.path)))(
      new Request('http://x.test/api/x'),
      { params: Promise.resolve(given) },
    );
    return path;
  };

  it('are none where the framework gives none', async () => {
    expect(await seen(undefined)).toEqual({});
  });

  it('are given as the address has them, several segments in one', async () => {
    expect(await seen({ office: 'demo', unknown: ['a', 'b'] })).toEqual({ office: 'demo', unknown: 'a/b' });
  });
});
