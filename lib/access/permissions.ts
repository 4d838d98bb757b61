import type { Role } from '@/lib/contract/shared';
import { Forbidden } from '@/lib/contract/errors';
import type { OfficeContext } from './context';

const STAFF = ['administrator', 'analyst', 'reviewer'] as const;
const EVERYONE = [...STAFF, 'scheduler'] as const;

/** Who may do what: `entity:verb` and the roles that may. A scheduler's reach ends at its contractor's projects. */
export const PERMISSIONS = {
  'office:read': EVERYONE,
  'contractors:read': EVERYONE,
  'contractors:create': ['administrator'],
  'members:read': ['administrator'],
  'members:create': ['administrator'],
  'members:update': ['administrator'],
  'projects:read': EVERYONE,
  'projects:create': ['administrator', 'analyst'],
  'projects:update': ['administrator', 'analyst'],
  'submissions:read': EVERYONE,
  'submissions:create': ['analyst', 'scheduler'],
  'corrections:adopt': ['analyst', 'scheduler'],
  'corrections:edit': ['analyst'],
  /** A scheduler undoes what the contractor's own people adopted. */
  'corrections:undo': ['analyst', 'scheduler'],
  'fixes:update': ['analyst'],
  'comments:read': EVERYONE,
  'comments:create': ['analyst', 'reviewer', 'scheduler'],
  'record:read': EVERYONE,
  'rules:read': EVERYONE,
} as const satisfies Record<string, readonly Role[]>;

export type Permission = keyof typeof PERMISSIONS;

export function may(role: Role, permission: Permission): boolean {
  return (PERMISSIONS[permission] as readonly Role[]).includes(role);
}

export function permissionsOf(role: Role): Permission[] {
  return (Object.keys(PERMISSIONS) as Permission[]).filter((permission) => may(role, permission));
}

/** First line of every use-case. */
export function requirePermission(ctx: OfficeContext, permission: Permission): void {
  if (!may(ctx.role, permission)) {
    throw new Forbidden(`${article(ctx.role)} ${ctx.role} may not do this (${permission}).`);
  }
  if (ctx.readOnly && !permission.endsWith(':read')) {
    throw new Forbidden('This token may only read, so nothing was changed.');
  }
}

function article(role: Role): string {
  return /^[aeiou]/.test(role) ? 'An' : 'A';
}
