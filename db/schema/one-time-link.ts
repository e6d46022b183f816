import { sql } from 'drizzle-orm';
import { check, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { linkPurposes, roles, type LinkPurpose, type Role } from '@/lib/schemas/vocabulary';
import { instant, oneOf } from './columns';

/**
 * One row is a link that lets somebody in once: the first owner, an invited colleague, a forgotten password.
 * Not a tenant's row, since it is opened before anybody is signed in; only the hash of its secret is kept.
 */
export const oneTimeLink = pgTable(
  'one_time_link',
  {
    id: uuid('id').primaryKey(),
    secretHash: text('secret_hash').notNull().unique('one_time_link_secret_unique'),
    purpose: text('purpose').$type<LinkPurpose>().notNull(),
    organisationId: uuid('organisation_id'),
    personId: uuid('person_id'),
    email: text('email'),
    name: text('name'),
    role: text('role').$type<Role>(),
    farmIds: uuid('farm_ids').array().notNull().default(sql`'{}'`),
    createdBy: uuid('created_by'),
    createdAt: instant('created_at').notNull().defaultNow(),
    expiresAt: instant('expires_at').notNull(),
    usedAt: instant('used_at'),
    revokedAt: instant('revoked_at'),
  },
  (t) => [
    oneOf('one_time_link_purpose_known', t.purpose, linkPurposes),
    oneOf('one_time_link_role_known', t.role, roles),
    check(
      'one_time_link_invitation_complete',
      sql`${t.purpose} <> 'invitation' or (${t.organisationId} is not null and ${t.email} is not null and ${t.role} is not null)`,
    ),
  ],
);
