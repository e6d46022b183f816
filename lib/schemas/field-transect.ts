import { z } from 'zod';
import { marksSchema } from './observation';
import { calendarDaySchema } from './operation';

/** Field cover read along one line across the rows. */
export const recordTransectSchema = z
  .object({
    plantingId: z.uuid(),
    stripId: z.uuid().nullable(),
    readOn: calendarDaySchema,
    marksRead: marksSchema('Type how many marks were read, as a whole number.', 1),
    marksCovered: marksSchema('Type how many marks lie on residue, as a whole number.', 0),
    replacesId: z.uuid().nullable(),
  })
  .refine((reading) => reading.marksCovered <= reading.marksRead, { path: ['marksCovered'], message: 'No more marks can lie on residue than were read.' });
export type RecordTransectInput = z.output<typeof recordTransectSchema>;
