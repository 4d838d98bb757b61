import { Refusal } from '@/lib/contract/errors';
import { log } from './log';
import { isDatabaseAway } from './unavailable';

/** The one place where errors become answers (RFC 9457). What nobody foresaw is logged, and only its id is told. */
export function problemResponse(error: unknown, request: Request): Response {
  if (error instanceof Refusal) {
    const { errors, members, headers } = error.more;
    return problem(
      error.status,
      { title: error.title, detail: error.message, ...(errors && { errors }), ...members },
      headers,
    );
  }
  const id = crypto.randomUUID();
  log.error(
    { id, err: error, method: request.method, url: withoutSecret(new URL(request.url).pathname) },
    'unexpected error',
  );
  if (isDatabaseAway(error)) {
    const detail =
      'The database does not answer. Try again in a moment, and look first whether what you did was kept.';
    return problem(503, { title: 'Not available', detail }, { 'retry-after': '5' });
  }
  return problem(500, {
    title: 'Something went wrong here',
    detail: `Nothing was changed. Quote ${id} when you report it.`,
    instance: `urn:uuid:${id}`,
  });
}

/** An invitation's path is a secret. */
function withoutSecret(path: string): string {
  return path.replace(/(\/invitations\/).+/, '$1…');
}

function problem(status: number, members: object, headers: Readonly<Record<string, string>> = {}): Response {
  return new Response(JSON.stringify({ type: 'about:blank', status, ...members }), {
    status,
    headers: { 'content-type': 'application/problem+json', 'cache-control': 'no-store', ...headers },
  });
}
