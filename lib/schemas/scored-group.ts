import { z } from 'zod';
import { figuresSchema, penaltiesSchema } from './figures';

const pooledSchema = z.object({
  definition: z.object({
    stand: z.enum(['one-row-sample', 'row-samples-as-places', 'strips-as-places']),
    timing: z.enum(['one-row-sample', 'one-curve', 'mean-of-strips']),
  }),
  rowSamples: z.number(),
  rowSamplesCounted: z.number(),
  rowSamplesWithTape: z.number(),
  strips: z.number(),
  stripsTimed: z.number(),
  rowSamplesOutsideTiming: z.number(),
});
export type PooledFacts = z.output<typeof pooledSchema>;

/** What row samples say together, with how they were taken together. */
export const scoredGroupSchema = z.object({ figures: figuresSchema, penalties: penaltiesSchema, pooled: pooledSchema });
export type ScoredGroup = z.output<typeof scoredGroupSchema>;
