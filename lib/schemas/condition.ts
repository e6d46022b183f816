import { z } from 'zod';
import { calendarDaySchema, timeOfDaySchema } from './operation';
import { parseSoilTemperature, type SoilTemperature } from './soil-temperature';
import { growthStages, soilMoistures, temperatureUnits } from './vocabulary';

const soilTemperatureSchema = z.object({ typed: z.string().max(60), unit: z.enum(temperatureUnits, 'Choose °F or °C.') }).transform(({ typed, unit }, context): SoilTemperature => {
  const parsed = parseSoilTemperature(typed, unit);
  if (parsed.ok) return parsed.temperature;
  context.addIssue({ code: 'custom', path: ['typed'], message: parsed.message });
  return z.NEVER;
});

/** How a planting stands on a day: at least one of growth stage, soil temperature and soil moisture. */
export const recordConditionSchema = z
  .object({
    plantingId: z.uuid(),
    rowSampleId: z.uuid().nullable(),
    observedOn: calendarDaySchema,
    observedAt: timeOfDaySchema.nullable(),
    growthStage: z.enum(growthStages, 'Choose the growth stage.').nullable(),
    soilTemperature: soilTemperatureSchema.nullable(),
    soilMoisture: z.enum(soilMoistures, 'Choose how moist the soil is.').nullable(),
    replacesId: z.uuid().nullable(),
  })
  .refine(({ growthStage, soilTemperature, soilMoisture }) => growthStage !== null || soilTemperature !== null || soilMoisture !== null, {
    path: ['growthStage'],
    message: 'Give the growth stage, the soil temperature or the soil moisture.',
  });
export type RecordConditionInput = z.output<typeof recordConditionSchema>;
