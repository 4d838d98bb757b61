import { Forbidden } from '@/lib/contract/errors';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Refuses a change that another site's page sends with this user's cookie. Browsers say where a request
 * comes from; a program that says nothing holds the cookie itself.
 */
export function requireSameOrigin(request: Request): void {
  if (SAFE.has(request.method)) return;
  const site = request.headers.get('sec-fetch-site');
  if (site === 'same-origin' || site === 'none') return;
  const origin = request.headers.get('origin');
  if (site === null && origin === null) return;
  if (site === null && origin !== null && ownHosts(request).has(hostOf(origin))) return;
  throw new Forbidden('This request came from another site, so nothing was changed.');
}

function ownHosts(request: Request): Set<string> {
  const named = [
    request.headers.get('host'),
    request.headers.get('x-forwarded-host'),
    hostOf(process.env.NEXTAUTH_URL ?? ''),
  ];
  return new Set(named.filter((host): host is string => Boolean(host)));
}

function hostOf(url: string): string {
  return URL.canParse(url) ? new URL(url).host : '';
}
