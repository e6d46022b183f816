import { foreignKey, index, jsonb, pgTable, primaryKey, uuid } from 'drizzle-orm/pg-core';
import { organisationId, origin, originChecks, thingId } from './columns';
import { planting } from './planting';
import { plantingZone } from './planting-zone';

/** One row is a version of the sum behind keep or replant: price, costs, dates as somebody typed them. Appended, the newest holds. */
export const replantSheet = pgTable(
  'replant_sheet',
  {
    organisationId: organisationId(),
    id: thingId(),
    plantingId: uuid('planting_id').notNull(),
    /** Null for the whole planting. */
    zoneId: uuid('zone_id'),
    /** The typed inputs, checked by lib/schemas/replant-sheet when written and when read. */
    inputs: jsonb('inputs').notNull(),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'replant_sheet_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'replant_sheet_planting_fk', columns: [t.organisationId, t.plantingId], foreignColumns: [planting.organisationId, planting.id] }),
    foreignKey({ name: 'replant_sheet_zone_fk', columns: [t.organisationId, t.zoneId], foreignColumns: [plantingZone.organisationId, plantingZone.id] }),
    index('replant_sheet_planting_index').on(t.organisationId, t.plantingId),
    ...originChecks('replant_sheet', t),
  ],
);
