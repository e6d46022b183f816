import { z } from 'zod';
import { labelCharactersMost } from './field-limits';
import { rowLengthRule } from './reading-rules';
import { readingSchema } from './reading-schema';
import { rowEnds } from './vocabulary';

export { rowLengthRule };
export const rowSamplesMost = 400;

export const rowSampleLabelSchema = z
  .string()
  .trim()
  .min(1, 'Give the peg a label, such as S7-2.')
  .max(labelCharactersMost, `Use at most ${labelCharactersMost} characters.`)
  .regex(/^[\w .#/-]+$/, 'Use letters, digits and - . / # only.');

export const rowSampleSchema = z.object({
  stripId: z.uuid().nullable(),
  zoneId: z.uuid().nullable(),
  label: rowSampleLabelSchema,
  planterRow: z.number().int().min(1).max(99).nullable(),
  length: readingSchema(rowLengthRule),
  startEnd: z.enum(rowEnds),
  farEnd: z.enum(rowEnds),
});
export type RowSampleInput = z.output<typeof rowSampleSchema>;

export const addRowSamplesSchema = z.object({
  plantingId: z.uuid(),
  samples: z.array(rowSampleSchema.extend({ id: z.uuid() })).min(1).max(rowSamplesMost),
});
export type AddRowSamplesInput = z.output<typeof addRowSamplesSchema>;

export const removeSchema = z.object({});
