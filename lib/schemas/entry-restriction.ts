import { z } from 'zod';
import { equipmentCharactersMost, exceptionCharactersMost, productCharactersMost, restrictionHoursMost } from './field-limits';
import { calendarDaySchema, timeOfDaySchema } from './operation';

/** An application in a field, and for how many hours after its end nobody enters without protection. */
export const recordRestrictionSchema = z.object({
  fieldId: z.uuid(),
  product: z.string().trim().min(1, 'Name the product.').max(productCharactersMost, `Use at most ${productCharactersMost} characters.`),
  endedOn: calendarDaySchema,
  endedAt: timeOfDaySchema,
  hours: z
    .number('Type the hours of the interval as a number, as the label says.')
    .positive('Type the hours of the interval as more than zero, as the label says.')
    .max(restrictionHoursMost, `More than ${restrictionHoursMost.toLocaleString('en-US')} hours cannot be right. Check the label.`),
  replacesId: z.uuid().nullable(),
});
export type RecordRestrictionInput = z.output<typeof recordRestrictionSchema>;

/** A person who enters before the interval ends: under which exception, with what protective equipment. */
export const recordExceptionSchema = z.object({
  restrictionId: z.uuid(),
  enteredOn: calendarDaySchema,
  exception: z.string().trim().min(1, 'Name the exception of the label or the law.').max(exceptionCharactersMost, `Use at most ${exceptionCharactersMost} characters.`),
  equipment: z.string().trim().min(1, 'Name the protective equipment that is worn.').max(equipmentCharactersMost, `Use at most ${equipmentCharactersMost} characters.`),
});
export type RecordExceptionInput = z.output<typeof recordExceptionSchema>;
