import { sql } from 'drizzle-orm';
import { boolean, foreignKey, index, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { id, moment } from './columns';
import { memberships } from './memberships';
import { contractorPolicy, identityPolicy, isUser, staffPolicy } from './policy';

/** Acts with the role of the membership it belongs to. The application's role writes `token_hash` and cannot read it. */
export const apiTokens = pgTable(
  'api_tokens',
  {
    id: id(),
    officeId: uuid('office_id').notNull(),
    membershipId: uuid('membership_id').notNull(),
    name: text('name').notNull(),
    tokenHash: text('token_hash').notNull().unique(),
    readOnly: boolean('read_only').notNull().default(false),
    createdAt: moment('created_at').notNull().defaultNow(),
    lastUsedAt: moment('last_used_at'),
    revokedAt: moment('revoked_at'),
    expiresAt: moment('expires_at'),
  },
  (table) => [
    foreignKey({
      name: 'api_tokens_membership',
      columns: [table.officeId, table.membershipId],
      foreignColumns: [memberships.officeId, memberships.id],
    }).onDelete('cascade'),
    index('api_tokens_office_membership').on(table.officeId, table.membershipId),
    staffPolicy('api_tokens', table.officeId),
    // A scheduler has its own tokens to look after.
    contractorPolicy(
      'api_tokens',
      table.officeId,
      sql`${table.membershipId} in (select ${memberships.id} from ${memberships} where ${isUser(memberships.userId)})`,
      'all',
    ),
    identityPolicy('api_tokens'),
  ],
);
