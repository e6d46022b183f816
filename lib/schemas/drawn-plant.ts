import { z } from 'zod';

/** One place of a tape sheet as it is drawn. */
export const drawnPlantSchema = z.object({
  positionInches: z.number(),
  /** Which piece of the tape it lies on; over a cut between two pieces no distance is known. */
  segment: z.number(),
  /** The middle of the visits around its coming up, in days after planting; null where nobody saw it. */
  days: z.number().nullable(),
  late: z.boolean(),
  double: z.boolean(),
  kind: z.enum(['plant', 'missing']),
});
export type DrawnPlant = z.output<typeof drawnPlantSchema>;
