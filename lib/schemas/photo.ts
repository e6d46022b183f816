import { z } from 'zod';
import { photoAccuracyMetersMost, photoBytesMost } from './field-limits';
import { calendarDaySchema, timeOfDaySchema } from './operation';

/** That a photo was taken: of what, when and where. Its file follows by itself, and is held against the hash given here. */
export const recordPhotoSchema = z.object({
  plantingId: z.uuid(),
  rowSampleId: z.uuid().nullable(),
  digId: z.uuid().nullable(),
  takenOn: calendarDaySchema,
  takenAt: timeOfDaySchema.nullable(),
  place: z
    .object({
      latitude: z.number().min(-90).max(90),
      longitude: z.number().min(-180).max(180),
      accuracyMeters: z.number().min(0).max(photoAccuracyMetersMost),
    })
    .nullable(),
  sha256: z.string().regex(/^[0-9a-f]{64}$/, 'Give the hash of the photo as 64 digits.'),
  bytes: z.number().int().min(1, 'The photo is empty.').max(photoBytesMost, 'The photo is larger than 8 MB.'),
});
export type RecordPhotoInput = z.output<typeof recordPhotoSchema>;
