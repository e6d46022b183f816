import { z } from 'zod';
import { nameSchema } from './farm';
import { fieldAreaRule } from './field';
import { calendarDaySchema, timeOfDaySchema } from './operation';
import type { ReadingRule } from './reading';
import { intendedStandRule, rowSpacingRule, seedingRateRule } from './reading-rules';
import { readingSchema } from './reading-schema';
import { crops, tillages } from './vocabulary';

export { intendedStandRule, rowSpacingRule, seedingRateRule };
export const tagGerminationRule: ReadingRule = { unit: 'percent', least: 1, most: 100, name: 'tag germination' };
export const fullYieldRule: ReadingRule = { unit: 'bu/ac', otherUnits: ['t/ha'], least: 1, most: 700, name: 'yield at full stand and best date' };

/** A planting date outside these years is a slip of the finger. */
export const earliestYear = 1990;
const daysAfterPlanting = (what: string) => z.number(`Give ${what} in whole days.`).int(`Give ${what} in whole days.`).min(1, `Give ${what} in whole days.`).max(60, `Give ${what} in days, at most 60.`);

export const plantingSchema = z
  .object({
    plantedOn: calendarDaySchema,
    plantedAt: timeOfDaySchema.nullable(),
    crop: z.enum(crops, 'Choose the crop.'),
    rowSpacing: readingSchema(rowSpacingRule),
    seedingRate: readingSchema(seedingRateRule),
    tagGermination: readingSchema(tagGerminationRule).nullable(),
    intendedStand: readingSchema(intendedStandRule),
    fullYield: readingSchema(fullYieldRule).nullable(),
    previousCrop: z.string().trim().min(1).max(60).nullable(),
    tillage: z.enum(tillages, 'Choose the tillage.').nullable(),
    slowAfterDays: daysAfterPlanting('slow'),
    lateAfterDays: daysAfterPlanting('late'),
    veryLateAfterDays: daysAfterPlanting('very late'),
    zones: z
      .array(z.object({ id: z.uuid(), name: nameSchema('zone'), area: readingSchema({ ...fieldAreaRule, name: 'area of the zone' }) }))
      .max(12, 'At most 12 zones.'),
  })
  .refine((planting) => Number(planting.plantedOn.slice(0, 4)) >= earliestYear, {
    path: ['plantedOn'],
    message: `Give a planting date from ${earliestYear} on.`,
  })
  .refine((planting) => planting.slowAfterDays < planting.lateAfterDays && planting.lateAfterDays < planting.veryLateAfterDays, {
    path: ['lateAfterDays'],
    message: 'Slow, late and very late must rise, such as 2, 7 and 14 days.',
  });
export const addPlantingSchema = plantingSchema.and(z.object({ fieldId: z.uuid() }));
export type PlantingInput = z.output<typeof plantingSchema>;
export type AddPlantingInput = z.output<typeof addPlantingSchema>;
