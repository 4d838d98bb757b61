import { describe, expect, it } from 'vitest';
import type { OfficeContext } from '@/lib/access/context';
import {
  may,
  PERMISSIONS,
  permissionsOf,
  requirePermission,
  type Permission,
} from '@/lib/access/permissions';
import { role, type Role } from '@/lib/contract/shared';

const all = Object.keys(PERMISSIONS) as Permission[];

function context(of: Role, readOnly = false): OfficeContext {
  const office = { id: '1', slug: 's', name: 'S', locale: 'en-GB' };
  const user = { id: '2', name: 'U', email: 'u@s.example' };
  return { office, user, role: of, contractor: null, membership: '3', via: 'token', readOnly };
}

describe.each(role.options)('%s', (of) => {
  it('may what the table says and nothing else', () => {
    for (const permission of all) {
      const attempt = () => requirePermission(context(of), permission);
      if (may(of, permission)) expect(attempt).not.toThrow();
      else expect(attempt).toThrow(`${of} may not do this`);
    }
    expect(permissionsOf(of)).toEqual(all.filter((permission) => may(of, permission)));
  });

  it('only reads with a token that may only read', () => {
    for (const permission of permissionsOf(of)) {
      const attempt = () => requirePermission(context(of, true), permission);
      if (permission.endsWith(':read')) expect(attempt).not.toThrow();
      else expect(attempt).toThrow('may only read');
    }
  });
});

it('keeps people to administrators, hand edits and declining to analysts, and writing from reviewers but for comments', () => {
  expect(PERMISSIONS['members:create']).toEqual(['administrator']);
  expect(PERMISSIONS['corrections:edit']).toEqual(['analyst']);
  expect(PERMISSIONS['fixes:update']).toEqual(['analyst']);
  expect(permissionsOf('reviewer').filter((permission) => !permission.endsWith(':read'))).toEqual([
    'comments:create',
  ]);
});
