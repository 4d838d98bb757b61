/** Where to go after signing in: only ever a path of this site, never another site's address. */
export function safeNextPath(next: string | null | undefined): string {
  if (!next || !next.startsWith('/') || /^\/[/\\]/.test(next) || /[\u0000-\u001f\\]/.test(next)) return '/';
  return next.startsWith('/sign-in') || next.startsWith('/api/') ? '/' : next;
}
