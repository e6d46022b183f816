import { z } from 'zod';
import { nameSchema } from './farm';
import type { ReadingRule } from './reading';
import { readingSchema } from './reading-schema';

export const fieldAreaRule: ReadingRule = { unit: 'acres', otherUnits: ['ha'], least: 0.01, most: 20_000, thousandsComma: true, name: 'area' };

export const fieldSchema = z.object({ name: nameSchema('field'), area: readingSchema(fieldAreaRule).nullable() });
export const addFieldSchema = fieldSchema.extend({ farmId: z.uuid() });
export type FieldInput = z.output<typeof fieldSchema>;
export type AddFieldInput = z.output<typeof addFieldSchema>;
