import { z } from 'zod';
import { nameSchema } from './farm';
import type { ReadingRule } from './reading';
import { readingSchema } from './reading-schema';
import { adjustedFromPlaces, cleanerKinds, pressureDirections, wheelKinds } from './vocabulary';

export const pressureRule: ReadingRule = { unit: 'lbf', otherUnits: ['psi', 'N', 'kPa'], least: 0, most: 1_000, name: 'pressure' };
export const workingDepthRule: ReadingRule = { unit: 'in', otherUnits: ['cm', 'mm'], least: 0, most: 6, name: 'working depth' };

export const settingSchema = z.object({
  name: nameSchema('setting'),
  /** How a sentence says it after "with": "the cleaners floating, light down". */
  phrase: z.string().trim().min(1, 'Write how a sentence says it after "with", such as: the cleaners raised.').max(120),
  cleaner: z.enum(cleanerKinds, 'Choose the row cleaner.'),
  wheels: z.enum(wheelKinds).nullable(),
  pressureDirection: z.enum(pressureDirections).nullable(),
  pressure: readingSchema(pressureRule).nullable(),
  workingDepth: readingSchema(workingDepthRule).nullable(),
  adjustedFrom: z.enum(adjustedFromPlaces).nullable(),
  note: z.string().trim().min(1).max(500).nullable(),
});
export type SettingInput = z.output<typeof settingSchema>;
