import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { tapeReadFroms, tapeUnits, tapeZeros, type TapeReadFrom, type TapeUnit, type TapeZero } from '@/lib/schemas/vocabulary';
import { oneOf, organisationId, origin, originChecks, thingId } from './columns';
import { rowSample } from './row-sample';
import { visit } from './visit';

/** One row is a whole tape sheet read at a visit: every plant's place, marker, kind and leaf stage, as arrays of equal length in tape order. */
export const tapeSheet = pgTable(
  'tape_sheet',
  {
    organisationId: organisationId(),
    id: thingId(),
    rowSampleId: uuid('row_sample_id').notNull(),
    visitId: uuid('visit_id').notNull(),
    tapeUnit: text('tape_unit').$type<TapeUnit>().notNull(),
    /** From which end of the row the tape was read; the places are as the tape said. */
    readFrom: text('read_from').$type<TapeReadFrom>().notNull().default('start'),
    zeroAt: text('zero_at').$type<TapeZero>().notNull().default('mark'),
    /** Which places, by index, begin a stretch whose tape was laid anew after a cut; never the first. */
    segmentStarts: integer('segment_starts').array().notNull().default([]),
    placesTyped: text('places_typed').array().notNull(),
    /** Thousandths of an inch, or of a centimetre where the tape is in centimetres. */
    placesThousandths: integer('places_thousandths').array().notNull(),
    /** The marker beside the plant, empty where none was read. */
    markers: text('markers').array().notNull(),
    kinds: text('kinds').array().notNull(),
    /** Leaf collars in tenths, -1 where not read. */
    leafStageTenths: integer('leaf_stage_tenths').array().notNull(),
    /** What this sheet alone determines, kept beside it for lists. */
    plants: integer('plants').notNull(),
    replacesId: uuid('replaces_id'),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'tape_sheet_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'tape_sheet_row_sample_fk', columns: [t.organisationId, t.rowSampleId], foreignColumns: [rowSample.organisationId, rowSample.id] }),
    foreignKey({ name: 'tape_sheet_visit_fk', columns: [t.organisationId, t.visitId], foreignColumns: [visit.organisationId, visit.id] }),
    foreignKey({ name: 'tape_sheet_replaces_fk', columns: [t.organisationId, t.replacesId], foreignColumns: [t.organisationId, t.id] }),
    index('tape_sheet_row_sample_index').on(t.organisationId, t.rowSampleId),
    oneOf('tape_sheet_unit_known', t.tapeUnit, tapeUnits),
    oneOf('tape_sheet_read_from_known', t.readFrom, tapeReadFroms),
    oneOf('tape_sheet_zero_at_known', t.zeroAt, tapeZeros),
    check(
      'tape_sheet_segment_starts_range',
      sql`1 <= all (${t.segmentStarts}) and cardinality(${t.placesThousandths}) > all (${t.segmentStarts})`,
    ),
    check(
      'tape_sheet_arrays_match',
      sql`cardinality(${t.placesTyped}) = cardinality(${t.placesThousandths}) and cardinality(${t.markers}) = cardinality(${t.placesThousandths}) and cardinality(${t.kinds}) = cardinality(${t.placesThousandths}) and cardinality(${t.leafStageTenths}) = cardinality(${t.placesThousandths})`,
    ),
    check('tape_sheet_plants_range', sql`${t.plants} between 0 and cardinality(${t.placesThousandths})`),
    ...originChecks('tape_sheet', t),
  ],
);
