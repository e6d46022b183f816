import { z } from 'zod';
import { timeZoneSchema } from './operation';

export const nameLengthMost = 100;

/** A name as people give it: trimmed, not empty, one line. */
export const nameSchema = (what: string) =>
  z
    .string()
    .trim()
    .min(1, `Name the ${what}.`)
    .max(nameLengthMost, `Use at most ${nameLengthMost} characters.`)
    .refine((name) => !/[\u0000-\u001f\u007f]/.test(name), 'Write the name on one line.');

export const farmSchema = z.object({ name: nameSchema('farm'), timeZone: timeZoneSchema });
export type FarmInput = z.infer<typeof farmSchema>;
