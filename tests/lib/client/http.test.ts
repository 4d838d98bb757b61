import { afterEach, describe, expect, it, vi } from 'vitest';
import { ClientError } from '@/lib/client/error';
import { call, officePath, withQuery } from '@/lib/client/http';

const answer = (status: number, body: string) =>
  vi.fn(() => Promise.resolve(new Response(body || null, { status })));

afterEach(() => vi.unstubAllGlobals());

describe('paths', () => {
  it('quotes what stands in them', () => {
    expect(officePath('demo', 'projects', 'a/b')).toBe('/api/offices/demo/projects/a%2Fb');
    expect(withQuery('/x', { state: 'received', days: 3, date: undefined, none: null })).toBe(
      '/x?state=received&days=3',
    );
    expect(withQuery('/x', { date: undefined })).toBe('/x');
  });
});

describe('call', () => {
  it('gives the JSON of a good answer, and nothing for 204', async () => {
    vi.stubGlobal('fetch', answer(200, '{"id":"1"}'));
    expect(await call<{ id: string }>('/x')).toEqual({ id: '1' });
    vi.stubGlobal('fetch', answer(204, ''));
    expect(await call<undefined>('/x', { method: 'DELETE' })).toBeUndefined();
  });

  it('sends a body as JSON', async () => {
    const fetch = answer(200, '{}');
    vi.stubGlobal('fetch', fetch);
    await call('/x', { method: 'POST', body: { name: 'A' } });
    expect(fetch).toHaveBeenCalledWith(
      '/x',
      expect.objectContaining({ method: 'POST', body: '{"name":"A"}', credentials: 'same-origin' }),
    );
  });

  it('throws the refusal', async () => {
    vi.stubGlobal('fetch', answer(403, '{"title":"Not allowed","status":403}'));
    await expect(call('/x')).rejects.toMatchObject({ status: 403, message: 'Not allowed' });
  });

  it('tells a lost connection from a cancelled request', async () => {
    vi.stubGlobal(
      'fetch',
      vi.fn(() => Promise.reject(new TypeError('failed'))),
    );
    await expect(call('/x')).rejects.toBeInstanceOf(ClientError);
    vi.stubGlobal(
      'fetch',
      vi.fn(() => Promise.reject(new DOMException('stopped', 'AbortError'))),
    );
    await expect(call('/x')).rejects.toMatchObject({ name: 'AbortError' });
  });
});
