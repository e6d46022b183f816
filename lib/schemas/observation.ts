import { z } from 'zod';
import { calendarDaySchema, timeOfDaySchema } from './operation';
import { countKinds, importKinds, tapeEntryKinds, tapeUnits, withdrawableKinds } from './vocabulary';

export const plantsMost = 2_000;
export const tapePlacesMost = 1_000;
export const importLinesMost = 2_000;
export const importCharactersMost = 1_000_000;

/** A visit as it travels with what was observed at it. One that stands already is named by its id again. */
export const visitSchema = z.object({
  id: z.uuid(),
  /** Who was there; the sender where it is null. */
  personId: z.uuid().nullable(),
  visitedOn: calendarDaySchema,
  visitedAt: timeOfDaySchema.nullable(),
  marker: z.string().trim().min(1).max(20).nullable(),
});
export type VisitInput = z.output<typeof visitSchema>;

const wholePlants = (what: string) =>
  z
    .number(`Type ${what} as a whole number.`)
    .int(`Type ${what} as a whole number.`)
    .min(0, `Type ${what} as zero or more.`)
    .max(plantsMost, `More than ${plantsMost} in one row sample cannot be right.`);

export const recordCountSchema = z.object({
  rowSampleId: z.uuid(),
  visit: visitSchema,
  countedAs: z.enum(countKinds),
  plants: wholePlants('the plants'),
  doubtful: wholePlants('the doubtful plants'),
  replacesId: z.uuid().nullable(),
});
export type RecordCountInput = z.output<typeof recordCountSchema>;

export const tapePlaceSchema = z.object({
  typed: z.string().trim().min(1, 'Type the place on the tape.').max(30),
  kind: z.enum(tapeEntryKinds),
  marker: z.string().trim().min(1).max(20).nullable(),
  /** Leaf collars, such as 2 or 2.5; null where not read. */
  leafStage: z.number().min(0).max(20).nullable(),
});

export const recordTapeSheetSchema = z.object({
  rowSampleId: z.uuid(),
  visit: visitSchema,
  tapeUnit: z.enum(tapeUnits),
  places: z.array(tapePlaceSchema).min(1, 'Type at least one place.').max(tapePlacesMost),
  replacesId: z.uuid().nullable(),
});
export type RecordTapeSheetInput = z.output<typeof recordTapeSheetSchema>;

export const recordResidueSchema = z
  .object({
    rowSampleId: z.uuid(),
    readOn: calendarDaySchema,
    marksRead: z.number().int().min(1, 'Type how many marks were read.').max(1_000),
    marksCovered: z.number().int().min(0).max(1_000),
  })
  .refine((reading) => reading.marksCovered <= reading.marksRead, { path: ['marksCovered'], message: 'No more marks can lie on residue than were read.' });
export type RecordResidueInput = z.output<typeof recordResidueSchema>;

export const withdrawSchema = z.object({
  targetKind: z.enum(withdrawableKinds),
  targetId: z.uuid(),
  reason: z.string().trim().min(1, 'Say why.').max(300),
});
export type WithdrawInput = z.output<typeof withdrawSchema>;

export const takeImportSchema = z.object({
  plantingId: z.uuid(),
  importKind: z.enum(importKinds),
  fileName: z.string().trim().min(1).max(200),
  text: z.string().max(importCharactersMost, 'That file is larger than 2,000 lines can be.'),
});
export type TakeImportInput = z.output<typeof takeImportSchema>;
