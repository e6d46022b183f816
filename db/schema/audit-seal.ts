import { foreignKey, integer, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core';
import { instant, organisationId } from './columns';
import { organisation } from './organisation';

/** One row seals an audit event into the organisation's hash chain: its place, and the hash over the one before and itself. */
export const auditSeal = pgTable(
  'audit_seal',
  {
    organisationId: organisationId(),
    place: integer('place').notNull(),
    eventId: uuid('event_id').notNull(),
    chainHash: text('chain_hash').notNull(),
    sealedAt: instant('sealed_at').notNull().defaultNow(),
  },
  (t) => [
    primaryKey({ name: 'audit_seal_pk', columns: [t.organisationId, t.place] }),
    unique('audit_seal_event_unique').on(t.organisationId, t.eventId),
    foreignKey({ name: 'audit_seal_organisation_fk', columns: [t.organisationId], foreignColumns: [organisation.id] }),
  ],
);
