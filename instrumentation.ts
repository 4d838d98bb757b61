import type { Instrumentation } from 'next';

/** What failed while a page was drawn goes to the log; the reader sees only the digest. */
export const onRequestError: Instrumentation.onRequestError = async (error, request, context) => {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return;
  const { log } = await import('@/lib/http/log');
  // The route, not the path: an invitation's path is a secret.
  log.error(
    { err: error, method: request.method, route: context.routePath, kind: context.routeType },
    'a page failed',
  );
};
