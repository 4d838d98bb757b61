import { NextResponse, type NextRequest } from 'next/server';

const OPEN_PAGES = ['/sign-in', '/invitation/'];

/**
 * Gives each page its content security policy with a fresh nonce, and sends who has no session at all to
 * the sign-in page. Whether the session holds is checked again in the pages and in every handler.
 */
export function proxy(request: NextRequest): NextResponse {
  const { pathname, search } = request.nextUrl;
  const open = OPEN_PAGES.some(
    (page) => pathname === page || (page.endsWith('/') && pathname.startsWith(page)),
  );
  if (!open && !hasSessionCookie(request)) {
    const target = request.nextUrl.clone();
    target.pathname = '/sign-in';
    target.search = pathname === '/' ? '' : `?next=${encodeURIComponent(pathname + search)}`;
    return NextResponse.redirect(target);
  }

  const nonce = Buffer.from(crypto.getRandomValues(new Uint8Array(16))).toString('base64');
  const policy = contentSecurityPolicy(nonce, process.env.NODE_ENV === 'development');
  const headers = new Headers(request.headers);
  headers.set('x-nonce', nonce);
  headers.set('content-security-policy', policy);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set('content-security-policy', policy);
  if (request.nextUrl.protocol === 'https:') {
    response.headers.set('strict-transport-security', 'max-age=31536000');
  }
  return response;
}

/** next-auth splits a long session over cookies `…session-token.0`, `.1`, and prefixes the name under https. */
function hasSessionCookie(request: NextRequest): boolean {
  return request.cookies
    .getAll()
    .some(({ name }) => /^(__Secure-)?next-auth\.session-token(\.\d+)?$/.test(name));
}

function contentSecurityPolicy(nonce: string, development: boolean): string {
  return [
    "default-src 'self'",
    // Development only: React rebuilds stack traces with eval.
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${development ? " 'unsafe-eval'" : ''}`,
    development ? "style-src 'self' 'unsafe-inline'" : `style-src 'self' 'nonce-${nonce}'`,
    "style-src-attr 'unsafe-inline'",
    "img-src 'self' blob: data:",
    "font-src 'self'",
    "connect-src 'self'",
    "worker-src 'self'",
    "object-src 'none'",
    "base-uri 'self'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join('; ');
}

// Bodies that pass through here are cut at 10 MB, so uploads to /api must not.
export const config = {
  matcher: ['/((?!api/|_next/|favicon\\.ico|icon\\.svg|apple-icon\\.png).*)'],
};
