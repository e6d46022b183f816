import { foreignKey, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import {
  organisationId, origin, originChecks, planned, readingCheck, readingThousandths, readingTyped, readingUnit, thingId,
} from './columns';
import { planting } from './planting';

/** One row is a part of a planting that is looked at and decided apart, such as a drowned corner, with its area. */
export const plantingZone = pgTable(
  'planting_zone',
  {
    organisationId: organisationId(),
    id: thingId(),
    plantingId: uuid('planting_id').notNull(),
    name: text('name').notNull(),
    areaTyped: readingTyped('area').notNull(),
    areaUnit: readingUnit('area').notNull(),
    areaThousandths: readingThousandths('area').notNull(),
    ...planned(),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'planting_zone_pk', columns: [t.organisationId, t.id] }),
    foreignKey({
      name: 'planting_zone_planting_fk',
      columns: [t.organisationId, t.plantingId],
      foreignColumns: [planting.organisationId, planting.id],
    }),
    readingCheck('planting_zone_area_reading', { typed: t.areaTyped, unit: t.areaUnit, thousandths: t.areaThousandths }),
    ...originChecks('planting_zone', t),
  ],
);
