import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, pgTable, primaryKey, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import { rowEnds, type RowEnd } from '@/lib/schemas/vocabulary';
import {
  oneOf, organisationId, origin, originChecks, planned, readingCheck, readingThousandths, readingTyped, readingUnit, thingId,
} from './columns';
import { planting } from './planting';
import { plantingZone } from './planting-zone';
import { strip } from './strip';

/** One row is a place: a measured length of one planter row, in a strip of a trial or free in the field. */
export const rowSample = pgTable(
  'row_sample',
  {
    organisationId: organisationId(),
    id: thingId(),
    plantingId: uuid('planting_id').notNull(),
    stripId: uuid('strip_id'),
    zoneId: uuid('zone_id'),
    /** What stands on the peg, such as "S7-2"; unique in the planting, and how a paper sheet or a file names the place. */
    label: text('label').notNull(),
    planterRow: integer('planter_row'),
    lengthTyped: readingTyped('length').notNull(),
    lengthUnit: readingUnit('length').notNull(),
    lengthThousandths: readingThousandths('length').notNull(),
    startEnd: text('start_end').$type<RowEnd>().notNull(),
    farEnd: text('far_end').$type<RowEnd>().notNull(),
    ...planned(),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'row_sample_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'row_sample_planting_fk', columns: [t.organisationId, t.plantingId], foreignColumns: [planting.organisationId, planting.id] }),
    foreignKey({ name: 'row_sample_strip_fk', columns: [t.organisationId, t.stripId], foreignColumns: [strip.organisationId, strip.id] }),
    foreignKey({ name: 'row_sample_zone_fk', columns: [t.organisationId, t.zoneId], foreignColumns: [plantingZone.organisationId, plantingZone.id] }),
    index('row_sample_planting_index').on(t.organisationId, t.plantingId),
    uniqueIndex('row_sample_label_unique').on(t.organisationId, t.plantingId, t.label).where(sql`${t.removedAt} is null`),
    oneOf('row_sample_start_end_known', t.startEnd, rowEnds),
    oneOf('row_sample_far_end_known', t.farEnd, rowEnds),
    check('row_sample_planter_row_positive', sql`${t.planterRow} > 0`),
    check('row_sample_length_positive', sql`${t.lengthThousandths} > 0`),
    readingCheck('row_sample_length_reading', { typed: t.lengthTyped, unit: t.lengthUnit, thousandths: t.lengthThousandths }),
    ...originChecks('row_sample', t),
  ],
);
