import { z } from 'zod';
import { noteCharactersMost } from './field-limits';
import { calendarDaySchema, timeOfDaySchema } from './operation';

/** A note about a row sample, or about the planting where none is named. */
export const recordNoteSchema = z.object({
  plantingId: z.uuid(),
  rowSampleId: z.uuid().nullable(),
  notedOn: calendarDaySchema,
  notedAt: timeOfDaySchema.nullable(),
  text: z.string().trim().min(1, 'Write the note.').max(noteCharactersMost, `Use at most ${noteCharactersMost.toLocaleString('en-US')} characters.`),
});
export type RecordNoteInput = z.output<typeof recordNoteSchema>;
