import { describe, expect, it } from 'vitest';
import { safeNextPath } from '@/components/shell/next-path';

describe('safeNextPath', () => {
  it('keeps a path of this site', () => {
    expect(safeNextPath('/demo/projects?x=1')).toBe('/demo/projects?x=1');
  });

  it.each([
    'https://elsewhere.example',
    '//elsewhere.example',
    '/\\elsewhere.example',
    '/\t/elsewhere.example',
    'demo',
    '',
  ])('does not leave the site for %j', (next) => {
    expect(safeNextPath(next)).toBe('/');
  });

  it('does not lead back to the door, nor to data', () => {
    expect(safeNextPath('/sign-in?next=/demo')).toBe('/');
    expect(safeNextPath('/api/me')).toBe('/');
    expect(safeNextPath(null)).toBe('/');
  });
});
