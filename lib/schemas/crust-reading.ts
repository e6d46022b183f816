import { z } from 'zod';
import { sproutsMost } from './field-limits';
import { visitSchema } from './observation';
import { crustThicknesses } from './vocabulary';

const sprouts = (which: string) =>
  z
    .number(`Type the ${which} sprouts as a whole number.`)
    .int(`Type the ${which} sprouts as a whole number.`)
    .min(0, `Type the ${which} sprouts as zero or more.`)
    .max(sproutsMost, `More than ${sproutsMost.toLocaleString('en-US')} in one row sample cannot be right.`);

/** What lies below a crust in a row sample. */
export const recordCrustSchema = z.object({
  rowSampleId: z.uuid(),
  visit: visitSchema,
  sproutsSound: sprouts('sound'),
  sproutsDead: sprouts('dead'),
  crust: z.enum(crustThicknesses, 'Choose how thick the crust is.'),
  replacesId: z.uuid().nullable(),
});
export type RecordCrustInput = z.output<typeof recordCrustSchema>;
