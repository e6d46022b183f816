import { z } from 'zod';
import { nameSchema } from './farm';
import { calendarDaySchema } from './operation';
import { earliestYear, intendedStandRule, rowSpacingRule, seedingRateRule } from './planting';
import { readingSchema } from './reading-schema';
import { rowLengthRule, rowSampleLabelSchema } from './row-sample';
import { crops, rowEnds } from './vocabulary';

/** A stand counted without a plan: the field, which may be new, and what the figures need to know of its planting. */
export const startSpotCountSchema = z
  .object({
    farmId: z.uuid(),
    /** A field that stands already is named by its id alone. */
    field: z.object({ id: z.uuid(), name: nameSchema('field').nullable() }),
    plantedOn: calendarDaySchema,
    crop: z.enum(crops, 'Choose the crop.'),
    rowSpacing: readingSchema(rowSpacingRule),
    seedingRate: readingSchema(seedingRateRule),
    intendedStand: readingSchema(intendedStandRule),
  })
  .refine(({ plantedOn }) => Number(plantedOn.slice(0, 4)) >= earliestYear, { path: ['plantedOn'], message: `Give a planting date from ${earliestYear} on.` });
export type StartSpotCountInput = z.output<typeof startSpotCountSchema>;

/** One more place of a spot count: a measured length that lies in no strip. */
export const addSpotPlaceSchema = z.object({
  plantingId: z.uuid(),
  zoneId: z.uuid().nullable(),
  label: rowSampleLabelSchema,
  length: readingSchema(rowLengthRule),
  startEnd: z.enum(rowEnds),
  farEnd: z.enum(rowEnds),
});
export type AddSpotPlaceInput = z.output<typeof addSpotPlaceSchema>;
