import { sql } from 'drizzle-orm';
import { bigint, check, foreignKey, index, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { soilCelsiusLeast, soilCelsiusMost, soilFahrenheitLeast, soilFahrenheitMost } from '@/lib/schemas/field-limits';
import { growthStages, soilMoistures, temperatureUnits, type GrowthStage, type SoilMoisture, type TemperatureUnit } from '@/lib/schemas/vocabulary';
import { calendarDay, oneOf, organisationId, origin, originChecks, thingId } from './columns';
import { planting } from './planting';
import { rowSample } from './row-sample';

const thousandths = (degrees: number) => sql.raw(String(degrees * 1000));

/** One row is how a planting stood on a day, at a row sample or in general: growth stage, soil temperature, soil moisture, at least one of them. Appended. */
export const condition = pgTable(
  'condition',
  {
    organisationId: organisationId(),
    id: thingId(),
    plantingId: uuid('planting_id').notNull(),
    rowSampleId: uuid('row_sample_id'),
    observedOn: calendarDay('observed_on').notNull(),
    observedAt: text('observed_at'),
    timeZone: text('time_zone').notNull(),
    growthStage: text('growth_stage').$type<GrowthStage>(),
    /** A temperature may lie below zero, so it does not share the check of the other readings. */
    soilTemperatureTyped: text('soil_temperature_typed'),
    soilTemperatureUnit: text('soil_temperature_unit').$type<TemperatureUnit>(),
    soilTemperatureThousandths: bigint('soil_temperature_thousandths', { mode: 'number' }),
    soilMoisture: text('soil_moisture').$type<SoilMoisture>(),
    replacesId: uuid('replaces_id'),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'condition_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'condition_planting_fk', columns: [t.organisationId, t.plantingId], foreignColumns: [planting.organisationId, planting.id] }),
    foreignKey({ name: 'condition_row_sample_fk', columns: [t.organisationId, t.rowSampleId], foreignColumns: [rowSample.organisationId, rowSample.id] }),
    foreignKey({ name: 'condition_replaces_fk', columns: [t.organisationId, t.replacesId], foreignColumns: [t.organisationId, t.id] }),
    index('condition_planting_index').on(t.organisationId, t.plantingId),
    check('condition_time_of_day', sql`${t.observedAt} ~ '^([01][0-9]|2[0-3]):[0-5][0-9]$'`),
    oneOf('condition_growth_stage_known', t.growthStage, growthStages),
    oneOf('condition_soil_moisture_known', t.soilMoisture, soilMoistures),
    oneOf('condition_soil_temperature_unit_known', t.soilTemperatureUnit, temperatureUnits),
    check(
      'condition_soil_temperature_reading',
      sql`num_nonnulls(${t.soilTemperatureTyped}, ${t.soilTemperatureUnit}, ${t.soilTemperatureThousandths}) in (0, 3) and (${t.soilTemperatureUnit} is null or (${t.soilTemperatureUnit} = 'F' and ${t.soilTemperatureThousandths} between ${thousandths(soilFahrenheitLeast)} and ${thousandths(soilFahrenheitMost)}) or (${t.soilTemperatureUnit} = 'C' and ${t.soilTemperatureThousandths} between ${thousandths(soilCelsiusLeast)} and ${thousandths(soilCelsiusMost)}))`,
    ),
    check('condition_says_something', sql`num_nonnulls(${t.growthStage}, ${t.soilTemperatureTyped}, ${t.soilMoisture}) > 0`),
    ...originChecks('condition', t),
  ],
);
