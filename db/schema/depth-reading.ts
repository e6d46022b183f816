import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { depthsMost } from '@/lib/schemas/field-limits';
import { depthUnits, type DepthUnit } from '@/lib/schemas/vocabulary';
import { oneOf, organisationId, origin, originChecks, thingId } from './columns';
import { rowSample } from './row-sample';
import { visit } from './visit';

/** One row is the seeding depth of several plants of a row sample, read at a visit from white shank to seed. Appended. */
export const depthReading = pgTable(
  'depth_reading',
  {
    organisationId: organisationId(),
    id: thingId(),
    rowSampleId: uuid('row_sample_id').notNull(),
    visitId: uuid('visit_id').notNull(),
    unit: text('unit').$type<DepthUnit>().notNull(),
    depthsTyped: text('depths_typed').array().notNull(),
    /** Thousandths of the unit, one for each plant in the order read. */
    depthsThousandths: integer('depths_thousandths').array().notNull(),
    replacesId: uuid('replaces_id'),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'depth_reading_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'depth_reading_row_sample_fk', columns: [t.organisationId, t.rowSampleId], foreignColumns: [rowSample.organisationId, rowSample.id] }),
    foreignKey({ name: 'depth_reading_visit_fk', columns: [t.organisationId, t.visitId], foreignColumns: [visit.organisationId, visit.id] }),
    foreignKey({ name: 'depth_reading_replaces_fk', columns: [t.organisationId, t.replacesId], foreignColumns: [t.organisationId, t.id] }),
    index('depth_reading_row_sample_index').on(t.organisationId, t.rowSampleId),
    oneOf('depth_reading_unit_known', t.unit, depthUnits),
    check(
      'depth_reading_depths_range',
      sql`cardinality(${t.depthsTyped}) = cardinality(${t.depthsThousandths}) and cardinality(${t.depthsThousandths}) between 1 and ${sql.raw(String(depthsMost))} and 0 <= all (${t.depthsThousandths})`,
    ),
    ...originChecks('depth_reading', t),
  ],
);
