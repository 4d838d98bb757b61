import { toClientError, unreachable } from './error';

type Method = 'GET' | 'POST' | 'PATCH' | 'PUT' | 'DELETE';

export interface CallOptions {
  readonly method?: Method;
  /** Sent as JSON. */
  readonly body?: unknown;
  readonly signal?: AbortSignal;
}

/** Path below an office: `officePath('demo', 'projects', id)` → /api/offices/demo/projects/… */
export function officePath(office: string, ...segments: readonly string[]): string {
  return ['/api/offices', office, ...segments.map(encodeURIComponent)].join('/');
}

/** Path with a query; entries that are undefined or null are left out. */
export function withQuery(
  path: string,
  query: Readonly<Record<string, string | number | boolean | null | undefined>>,
): string {
  const search = new URLSearchParams();
  for (const [name, value] of Object.entries(query)) {
    if (value !== undefined && value !== null) search.set(name, String(value));
  }
  const text = search.toString();
  return text === '' ? path : `${path}?${text}`;
}

/**
 * Calls the HTTP surface and gives the answer's JSON; `undefined` for 204.
 * Throws a ClientError for every refusal, and lets an abort through as it is.
 */
export async function call<T>(path: string, options: CallOptions = {}): Promise<T> {
  const { method = 'GET', body, signal } = options;
  const response = await send(path, {
    method,
    headers: {
      accept: 'application/json, application/problem+json',
      ...(body === undefined ? {} : { 'content-type': 'application/json' }),
    },
    ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    ...(signal ? { signal } : {}),
  });
  const text = await response.text();
  if (!response.ok) throw toClientError(response.status, text);
  return trusted<T>(text === '' ? undefined : JSON.parse(text));
}

async function send(path: string, init: RequestInit): Promise<Response> {
  try {
    return await fetch(path, { credentials: 'same-origin', cache: 'no-store', ...init });
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') throw error;
    throw unreachable();
  }
}

/** Our own server validates its answers' shapes; they are not checked twice. */
export function trusted<T>(value: unknown): T {
  return value as T;
}
