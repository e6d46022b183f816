import { foreignKey, index, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import {
  organisationId, origin, originChecks, planned, readingCheck, readingThousandths, readingTyped, readingUnit, thingId,
} from './columns';
import { farm } from './farm';

/** One row is a field of a farm, with its area as it was typed. */
export const field = pgTable(
  'field',
  {
    organisationId: organisationId(),
    id: thingId(),
    farmId: uuid('farm_id').notNull(),
    name: text('name').notNull(),
    areaTyped: readingTyped('area'),
    areaUnit: readingUnit('area'),
    areaThousandths: readingThousandths('area'),
    ...planned(),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'field_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'field_farm_fk', columns: [t.organisationId, t.farmId], foreignColumns: [farm.organisationId, farm.id] }),
    index('field_farm_index').on(t.organisationId, t.farmId),
    readingCheck('field_area_reading', { typed: t.areaTyped, unit: t.areaUnit, thousandths: t.areaThousandths }),
    ...originChecks('field', t),
  ],
);
