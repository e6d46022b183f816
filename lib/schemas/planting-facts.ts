import { z } from 'zod';
import { lateLimitsSchema } from './figures';
import { crops, tillages } from './vocabulary';

/** What a screen of figures says of the planting they belong to. */
export const plantingFactsSchema = z.object({
  plantingId: z.string(),
  farmName: z.string(),
  fieldName: z.string(),
  fieldAcres: z.number().nullable(),
  crop: z.enum(crops),
  plantedOn: z.string(),
  plantedAt: z.string().nullable(),
  previousCrop: z.string().nullable(),
  tillage: z.enum(tillages).nullable(),
  rowSpacingInches: z.number(),
  seedsPerAcre: z.number(),
  intendedPlantsPerAcre: z.number(),
  lateLimits: lateLimitsSchema,
});
export type PlantingFacts = z.output<typeof plantingFactsSchema>;
