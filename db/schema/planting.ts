import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { crops, tillages, type Crop, type Tillage } from '@/lib/schemas/vocabulary';
import {
  calendarDay, oneOf, organisationId, origin, originChecks, planned, readingCheck, readingThousandths, readingTyped,
  readingUnit, thingId,
} from './columns';
import { field } from './field';

/** One row is a field planted on a date: the facts every figure of its stand is computed against. */
export const planting = pgTable(
  'planting',
  {
    organisationId: organisationId(),
    id: thingId(),
    fieldId: uuid('field_id').notNull(),
    plantedOn: calendarDay('planted_on').notNull(),
    /** The wall time planting was done, where it is known; timing is then in fractional days. */
    plantedAt: text('planted_at'),
    crop: text('crop').$type<Crop>().notNull(),
    rowSpacingTyped: readingTyped('row_spacing').notNull(),
    rowSpacingUnit: readingUnit('row_spacing').notNull(),
    rowSpacingThousandths: readingThousandths('row_spacing').notNull(),
    seedingRateTyped: readingTyped('seeding_rate').notNull(),
    seedingRateUnit: readingUnit('seeding_rate').notNull(),
    seedingRateThousandths: readingThousandths('seeding_rate').notNull(),
    tagGerminationTyped: readingTyped('tag_germination'),
    tagGerminationUnit: readingUnit('tag_germination'),
    tagGerminationThousandths: readingThousandths('tag_germination'),
    intendedStandTyped: readingTyped('intended_stand').notNull(),
    intendedStandUnit: readingUnit('intended_stand').notNull(),
    intendedStandThousandths: readingThousandths('intended_stand').notNull(),
    /** Yield at a full stand planted on the best date: what the replant grid's 100 % stands for. */
    fullYieldTyped: readingTyped('full_yield'),
    fullYieldUnit: readingUnit('full_yield'),
    fullYieldThousandths: readingThousandths('full_yield'),
    previousCrop: text('previous_crop'),
    tillage: text('tillage').$type<Tillage>(),
    slowAfterDays: integer('slow_after_days').notNull().default(2),
    lateAfterDays: integer('late_after_days').notNull().default(7),
    veryLateAfterDays: integer('very_late_after_days').notNull().default(14),
    ...planned(),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'planting_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'planting_field_fk', columns: [t.organisationId, t.fieldId], foreignColumns: [field.organisationId, field.id] }),
    index('planting_field_index').on(t.organisationId, t.fieldId),
    oneOf('planting_crop_known', t.crop, crops),
    oneOf('planting_tillage_known', t.tillage, tillages),
    check('planting_planted_at_time', sql`${t.plantedAt} ~ '^([01][0-9]|2[0-3]):[0-5][0-9]$'`),
    check('planting_limits_rise', sql`0 < ${t.slowAfterDays} and ${t.slowAfterDays} < ${t.lateAfterDays} and ${t.lateAfterDays} < ${t.veryLateAfterDays}`),
    readingCheck('planting_row_spacing_reading', { typed: t.rowSpacingTyped, unit: t.rowSpacingUnit, thousandths: t.rowSpacingThousandths }),
    readingCheck('planting_seeding_rate_reading', { typed: t.seedingRateTyped, unit: t.seedingRateUnit, thousandths: t.seedingRateThousandths }),
    readingCheck('planting_tag_germination_reading', { typed: t.tagGerminationTyped, unit: t.tagGerminationUnit, thousandths: t.tagGerminationThousandths }),
    readingCheck('planting_intended_stand_reading', { typed: t.intendedStandTyped, unit: t.intendedStandUnit, thousandths: t.intendedStandThousandths }),
    readingCheck('planting_full_yield_reading', { typed: t.fullYieldTyped, unit: t.fullYieldUnit, thousandths: t.fullYieldThousandths }),
    ...originChecks('planting', t),
  ],
);
