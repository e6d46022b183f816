import { foreignKey, pgTable, primaryKey, uuid } from 'drizzle-orm/pg-core';
import { instant, organisationId } from './columns';
import { farm } from './farm';
import { membership } from './membership';

/** One row attaches a grower or a scout to a farm; owners and agronomists see every farm without one. */
export const farmPerson = pgTable(
  'farm_person',
  {
    organisationId: organisationId(),
    farmId: uuid('farm_id').notNull(),
    personId: uuid('person_id').notNull(),
    createdAt: instant('created_at').notNull().defaultNow(),
    removedAt: instant('removed_at'),
  },
  (t) => [
    primaryKey({ name: 'farm_person_pk', columns: [t.organisationId, t.farmId, t.personId] }),
    foreignKey({ name: 'farm_person_farm_fk', columns: [t.organisationId, t.farmId], foreignColumns: [farm.organisationId, farm.id] }),
    foreignKey({
      name: 'farm_person_membership_fk',
      columns: [t.organisationId, t.personId],
      foreignColumns: [membership.organisationId, membership.personId],
    }),
  ],
);
