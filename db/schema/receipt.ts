import { bigint, foreignKey, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { instant, organisationId } from './columns';
import { organisation } from './organisation';

/**
 * One row says that an operation has been answered, and how. It is written in the same transaction as the change,
 * claimed first, so that twins sent at once apply once. Kept for years: a phone may lie in a truck all winter.
 */
export const receipt = pgTable(
  'receipt',
  {
    organisationId: organisationId(),
    operationId: uuid('operation_id').notNull(),
    personId: uuid('person_id').notNull(),
    deviceId: uuid('device_id').notNull(),
    deviceSequence: bigint('device_sequence', { mode: 'number' }).notNull(),
    kind: text('kind').notNull(),
    thingId: uuid('thing_id').notNull(),
    /** A hash of the whole envelope; the same id with other content is refused. */
    contentHash: text('content_hash').notNull(),
    answer: jsonb('answer'),
    receivedAt: instant('received_at').notNull().defaultNow(),
  },
  (t) => [
    primaryKey({ name: 'receipt_pk', columns: [t.organisationId, t.operationId] }),
    foreignKey({ name: 'receipt_organisation_fk', columns: [t.organisationId], foreignColumns: [organisation.id] }),
  ],
);
