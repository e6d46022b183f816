import { foreignKey, pgTable, primaryKey, text } from 'drizzle-orm/pg-core';
import { organisationId, origin, originChecks, planned, thingId } from './columns';
import { organisation } from './organisation';

/** One row is a farm: what growers and scouts are attached to, and where field time is local. */
export const farm = pgTable(
  'farm',
  {
    organisationId: organisationId(),
    id: thingId(),
    name: text('name').notNull(),
    timeZone: text('time_zone').notNull(),
    ...planned(),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'farm_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'farm_organisation_fk', columns: [t.organisationId], foreignColumns: [organisation.id] }),
    ...originChecks('farm', t),
  ],
);
