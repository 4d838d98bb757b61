import { NextRequest } from 'next/server';
import { describe, expect, it } from 'vitest';
import { config, proxy } from '@/proxy';

function ask(path: string, cookie?: string) {
  const headers = cookie ? { cookie } : undefined;
  return proxy(new NextRequest(`http://localhost:3000${path}`, { headers }));
}
const SESSION = 'next-auth.session-token=x';

describe('without a session', () => {
  it('sends to the sign-in page, and back afterwards', () => {
    const response = ask('/demo/projects?x=1');
    expect(response.status).toBe(307);
    expect(response.headers.get('location')).toBe(
      'http://localhost:3000/sign-in?next=%2Fdemo%2Fprojects%3Fx%3D1',
    );
    expect(ask('/').headers.get('location')).toBe('http://localhost:3000/sign-in');
  });

  it('leaves the sign-in page and the one-time link open, and nothing that only looks like them', () => {
    expect(ask('/sign-in').headers.get('location')).toBeNull();
    expect(ask('/invitation/abc').headers.get('location')).toBeNull();
    expect(ask('/sign-in-here').headers.get('location')).not.toBeNull();
    expect(ask('/invitation').headers.get('location')).not.toBeNull();
  });

  it('knows the cookie by its names', () => {
    for (const name of [
      'next-auth.session-token',
      '__Secure-next-auth.session-token',
      'next-auth.session-token.0',
    ]) {
      expect(ask('/demo', `${name}=x`).headers.get('location')).toBeNull();
    }
    expect(ask('/demo', 'next-auth.csrf-token=x').headers.get('location')).not.toBeNull();
  });
});

describe('content security policy', () => {
  const policyOf = (path = '/demo') => ask(path, SESSION).headers.get('content-security-policy') ?? '';

  it('lets only scripts with the nonce of this answer run', () => {
    const policy = policyOf();
    expect(policy).toMatch(/script-src 'self' 'nonce-[A-Za-z0-9+/]{22}==' 'strict-dynamic'(;|$)/);
    expect(policy).not.toMatch(/script-src[^;]*unsafe/);
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy).toContain("object-src 'none'");
  });

  it('makes a nonce of its own for each answer', () => {
    expect(policyOf()).not.toBe(policyOf());
  });
});

describe('matcher', () => {
  const matches = (path: string) => config.matcher.some((pattern) => new RegExp(`^${pattern}$`).test(path));

  it('leaves the HTTP surface and the built files alone', () => {
    expect(['/api/offices/demo', '/_next/static/x.js', '/favicon.ico', '/icon.svg'].some(matches)).toBe(
      false,
    );
    expect(['/', '/sign-in', '/demo/projects', '/apiary'].every(matches)).toBe(true);
  });
});
