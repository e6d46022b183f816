import { foreignKey, integer, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { instant, organisationId } from './columns';
import { organisation } from './organisation';

/** One row is an edit that came on an older version than the one that stood: kept as it was sent, never applied, shown to settle. */
export const losingEdit = pgTable(
  'losing_edit',
  {
    organisationId: organisationId(),
    operationId: uuid('operation_id').notNull(),
    personId: uuid('person_id').notNull(),
    kind: text('kind').notNull(),
    thingId: uuid('thing_id').notNull(),
    baseVersion: integer('base_version').notNull(),
    standingVersion: integer('standing_version').notNull(),
    body: jsonb('body').notNull(),
    receivedAt: instant('received_at').notNull().defaultNow(),
  },
  (t) => [
    primaryKey({ name: 'losing_edit_pk', columns: [t.organisationId, t.operationId] }),
    foreignKey({ name: 'losing_edit_organisation_fk', columns: [t.organisationId], foreignColumns: [organisation.id] }),
  ],
);
