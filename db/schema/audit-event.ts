import { bigint, foreignKey, index, integer, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { instant, organisationId, thingId } from './columns';
import { organisation } from './organisation';

/** One row is a change, in canonical form, written in the change's own transaction: who, from which device, what, when it happened and when it came in. */
export const auditEvent = pgTable(
  'audit_event',
  {
    organisationId: organisationId(),
    id: thingId(),
    personId: uuid('person_id').notNull(),
    deviceId: uuid('device_id').notNull(),
    deviceSequence: bigint('device_sequence', { mode: 'number' }).notNull(),
    kind: text('kind').notNull(),
    version: integer('version').notNull(),
    thingId: uuid('thing_id').notNull(),
    body: jsonb('body').notNull(),
    occurred: jsonb('occurred').notNull(),
    confirmations: jsonb('confirmations').notNull(),
    /** Who read a phone's kept file in at the office; null where the phone sent it itself. */
    readInBy: uuid('read_in_by'),
    recordedAt: instant('recorded_at').notNull().defaultNow(),
  },
  (t) => [
    primaryKey({ name: 'audit_event_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'audit_event_organisation_fk', columns: [t.organisationId], foreignColumns: [organisation.id] }),
    // The page of changes lists the newest first; the seal walks the unsealed ones in this order.
    index('audit_event_recorded_index').on(t.organisationId, t.recordedAt, t.id),
  ],
);
