import { foreignKey, pgTable, primaryKey, text } from 'drizzle-orm/pg-core';
import { organisationId, origin, originChecks, planned, thingId } from './columns';
import { organisation } from './organisation';

/** One row is a question asked in one or more plantings, over fields and years. */
export const study = pgTable(
  'study',
  {
    organisationId: organisationId(),
    id: thingId(),
    name: text('name').notNull(),
    ...planned(),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'study_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'study_organisation_fk', columns: [t.organisationId], foreignColumns: [organisation.id] }),
    ...originChecks('study', t),
  ],
);
