import { encode } from 'next-auth/jwt';

process.env.AUTH_SECRET ??= 'a secret of the tests';

type Handler = (request: Request, next: { params: Promise<Record<string, string>> }) => Promise<Response>;
type RouteModule = Partial<Record<string, Handler>>;

const modules = import.meta.glob<RouteModule>('/app/api/**/route.ts');

interface Place {
  readonly pattern: RegExp;
  readonly names: readonly string[];
  readonly load: () => Promise<RouteModule>;
}

/** `/app/api/offices/[office]/route.ts` → `/api/offices/{office}`. */
export const routePaths: readonly string[] = Object.keys(modules)
  .map((file) =>
    file
      .replace(/^\/app/, '')
      .replace(/\/route\.ts$/, '')
      .replace(/\[(\w+)\]/g, '{$1}'),
  )
  .sort();

const places: readonly Place[] = Object.entries(modules).map(([file, load]) => {
  const path = file.replace(/^\/app/, '').replace(/\/route\.ts$/, '');
  const names = [...path.matchAll(/\[(\w+)\]/g)].map((match) => match[1] ?? '');
  return { names, load, pattern: new RegExp(`^${path.replace(/\[\w+\]/g, '([^/]+)')}$`) };
});

export async function loadRoute(path: string): Promise<RouteModule> {
  const file = `/app${path.replace(/\{(\w+)\}/g, '[$1]')}/route.ts`;
  const load = modules[file];
  if (!load) throw new Error(`There is no ${file}.`);
  return load();
}

export interface Asking {
  readonly token?: string;
  readonly cookie?: string;
  readonly body?: unknown;
  readonly form?: FormData;
  /** A body as it stands, with its content type among the headers. */
  readonly raw?: BodyInit;
  readonly headers?: Record<string, string>;
  readonly signal?: AbortSignal;
}

/** Asks a route handler as the server would; the answer is the real one. */
export async function ask(method: string, path: string, asking: Asking = {}): Promise<Response> {
  const url = new URL(path, 'http://plumbrow.test');
  for (const { pattern, names, load } of places) {
    const match = pattern.exec(url.pathname);
    if (!match) continue;
    const handler = (await load())[method];
    if (!handler) return new Response(null, { status: 405 });
    const params = Object.fromEntries(names.map((name, i) => [name, decodeURIComponent(match[i + 1] ?? '')]));
    return handler(request(method, url, asking), { params: Promise.resolve(params) });
  }
  throw new Error(`No route answers ${path}.`);
}

function request(
  method: string,
  url: URL,
  { token, cookie, body, form, raw, headers, signal }: Asking,
): Request {
  return new Request(url, {
    method,
    headers: {
      host: url.host,
      ...(token === undefined ? {} : { authorization: `Bearer ${token}` }),
      ...(cookie === undefined ? {} : { cookie }),
      ...(body === undefined ? {} : { 'content-type': 'application/json' }),
      ...headers,
    },
    ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    ...(form === undefined ? {} : { body: form }),
    ...(raw === undefined ? {} : { body: raw }),
    ...(signal ? { signal } : {}),
  });
}

/** The cookie that signing in gives. */
export async function sessionCookie(user: string, epoch = 0): Promise<string> {
  const token = await encode({ token: { sub: user, epoch }, secret: process.env.AUTH_SECRET ?? '' });
  return `next-auth.session-token=${token}`;
}

export async function json<T>(answer: Response): Promise<T> {
  return (await answer.json()) as T;
}
