import { z } from 'zod';
import { depthsMost } from './field-limits';
import { visitSchema } from './observation';
import type { Reading } from './reading';
import { parseSeedingDepth } from './seeding-depth';
import { depthUnits } from './vocabulary';

/** Seeding depths as they travel: what was typed, plant by plant, in one unit. The numbers are made from it here. */
export const recordDepthSchema = z
  .object({
    rowSampleId: z.uuid(),
    visit: visitSchema,
    unit: z.enum(depthUnits, 'Choose inches or centimeters.'),
    depths: z.array(z.string().max(60)).min(1, 'Type at least one depth.').max(depthsMost, `At most ${depthsMost} depths make one reading.`),
    replacesId: z.uuid().nullable(),
  })
  .transform(({ depths, ...rest }, context) => {
    const read = depths.map((typed, index): Reading | null => {
      const parsed = parseSeedingDepth(typed, rest.unit);
      if (parsed.ok) return parsed.reading;
      context.addIssue({ code: 'custom', path: ['depths', index], message: parsed.message });
      return null;
    });
    return { ...rest, depths: read.filter((depth) => depth !== null) };
  });
export type RecordDepthInput = z.output<typeof recordDepthSchema>;
