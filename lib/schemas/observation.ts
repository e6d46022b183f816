import { z } from 'zod';
import { leafCollarsMost, marksMost, plantsMost, tapePlacesMost } from './field-limits';
import { calendarDaySchema, timeOfDaySchema } from './operation';
import { countKinds, importKinds, tapeEntryKinds, tapeReadFroms, tapeUnits, tapeZeros, withdrawableKinds } from './vocabulary';

export { leafCollarsMost, marksMost, plantsMost, tapePlacesMost };
export const importLinesMost = 2_000;
export const importCharactersMost = 1_000_000;

const markerSchema = z.string().trim().min(1, 'Name the marker, or leave it empty.').max(20, 'Use at most 20 characters.');

/** A visit as it travels with what was observed at it. One that stands already is named by its id again. */
export const visitSchema = z.object({
  id: z.uuid(),
  /** Who was there; the sender where it is null. */
  personId: z.uuid().nullable(),
  visitedOn: calendarDaySchema,
  visitedAt: timeOfDaySchema.nullable(),
  marker: markerSchema.nullable(),
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
  typed: z.string().trim().min(1, 'Type the place on the tape.').max(30, 'That is too long for a place on the tape.'),
  kind: z.enum(tapeEntryKinds),
  marker: markerSchema.nullable(),
  /** Leaf collars, such as 2 or 2.5; null where not read. */
  leafStage: z
    .number('Type the leaf collars, such as 2 or 2.5.')
    .min(0, 'Leaf collars cannot be below zero.')
    .max(leafCollarsMost, `More than ${leafCollarsMost} leaf collars cannot be right.`)
    .nullable(),
});

export const recordTapeSheetSchema = z.object({
  rowSampleId: z.uuid(),
  visit: visitSchema,
  tapeUnit: z.enum(tapeUnits),
  places: z.array(tapePlaceSchema).min(1, 'Type at least one place.').max(tapePlacesMost, `More than ${tapePlacesMost.toLocaleString('en-US')} places on one sheet cannot be right.`),
  replacesId: z.uuid().nullable(),
});
export type RecordTapeSheetInput = z.output<typeof recordTapeSheetSchema>;

/** A sheet that says how its tape lay: from which end, what was at its zero, and where it was laid anew after a cut. */
export const recordLaidTapeSheetSchema = recordTapeSheetSchema.extend({
  readFrom: z.enum(tapeReadFroms),
  zeroAt: z.enum(tapeZeros),
  segmentStarts: z.array(z.number().int().min(1).max(tapePlacesMost)).max(tapePlacesMost),
});
export type RecordLaidTapeSheetInput = z.output<typeof recordLaidTapeSheetSchema>;

export const marksSchema = (message: string, least: number) =>
  z.number(message).int(message).min(least, message).max(marksMost, `More than ${marksMost.toLocaleString('en-US')} marks cannot be right.`);

export const recordResidueSchema = z
  .object({
    rowSampleId: z.uuid(),
    readOn: calendarDaySchema,
    marksRead: marksSchema('Type how many marks were read, as a whole number.', 1),
    marksCovered: marksSchema('Type how many marks lie on residue, as a whole number.', 0),
  })
  .refine((reading) => reading.marksCovered <= reading.marksRead, { path: ['marksCovered'], message: 'No more marks can lie on residue than were read.' });
export type RecordResidueInput = z.output<typeof recordResidueSchema>;

export const withdrawSchema = z.object({
  targetKind: z.enum(withdrawableKinds),
  targetId: z.uuid(),
  reason: z.string().trim().min(1, 'Say why.').max(300, 'Use at most 300 characters.'),
});
export type WithdrawInput = z.output<typeof withdrawSchema>;

export const takeImportSchema = z.object({
  plantingId: z.uuid(),
  importKind: z.enum(importKinds),
  fileName: z.string().trim().min(1, 'Name the file.').max(200, 'Use a file name of at most 200 characters.'),
  text: z.string().max(importCharactersMost, 'That file is larger than 2,000 lines can be.'),
});
export type TakeImportInput = z.output<typeof takeImportSchema>;
