import { z } from 'zod';
import { markersMost } from './field-limits';
import { calendarDaySchema } from './operation';
import { markerEvents } from './vocabulary';

/** Markers set in a row sample, or taken up again. */
export const recordMarkersSchema = z.object({
  rowSampleId: z.uuid(),
  happenedOn: calendarDaySchema,
  event: z.enum(markerEvents, 'Say whether the markers were set or taken up.'),
  markers: z
    .number('Type the markers as a whole number.')
    .int('Type the markers as a whole number.')
    .min(0, 'Type the markers as zero or more.')
    .max(markersMost, `More than ${markersMost.toLocaleString('en-US')} markers in one row sample cannot be right.`),
  replacesId: z.uuid().nullable(),
});
export type RecordMarkersInput = z.output<typeof recordMarkersSchema>;
