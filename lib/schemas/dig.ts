import { z } from 'zod';
import { digNoteCharactersMost, digPlaceCharactersMost } from './field-limits';
import { visitSchema } from './observation';
import type { Reading } from './reading';
import { parseSeedingDepth } from './seeding-depth';
import { crustThicknesses, depthUnits, digFindings, digPlaces, digPlants, digResidues, soilMoistures } from './vocabulary';

const digDepthSchema = z.object({ typed: z.string().max(60), unit: z.enum(depthUnits, 'Choose inches or centimeters.') }).transform(({ typed, unit }, context): Reading => {
  const parsed = parseSeedingDepth(typed, unit);
  if (parsed.ok) return parsed.reading;
  context.addIssue({ code: 'custom', path: ['typed'], message: parsed.message });
  return z.NEVER;
});

/** What one dug plant, or the place of a missing one, showed. */
export const recordDigSchema = z
  .object({
    rowSampleId: z.uuid(),
    visit: visitSchema,
    /** One id for a late plant and its neighbor, so that they are read side by side. */
    pairId: z.uuid(),
    plant: z.enum(digPlants, 'Say which plant was dug.'),
    where: z.enum(digPlaces, 'Say where it was dug.'),
    placeTyped: z.string().trim().min(1, 'Type the place on the tape, or leave it empty.').max(digPlaceCharactersMost, 'That is too long for a place on the tape.').nullable(),
    depth: digDepthSchema.nullable(),
    residue: z.enum(digResidues, 'Choose where the residue lay.').nullable(),
    moisture: z.enum(soilMoistures, 'Choose how moist the soil was.').nullable(),
    crust: z.enum(crustThicknesses, 'Choose how thick the crust was.').nullable(),
    found: z.array(z.enum(digFindings, 'Choose what was found from the list.')).max(digFindings.length, 'Name each finding once.'),
    note: z.string().trim().min(1, 'Write the note, or leave it empty.').max(digNoteCharactersMost, `Use at most ${digNoteCharactersMost} characters.`).nullable(),
    replacesId: z.uuid().nullable(),
  })
  .refine(({ found }) => new Set(found).size === found.length, { path: ['found'], message: 'Name each finding once.' });
export type RecordDigInput = z.output<typeof recordDigSchema>;
