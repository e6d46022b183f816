import { z } from 'zod';
import { fullYieldRule, seedingRateRule } from './planting';
import { calendarDaySchema } from './operation';
import { readingSchema } from './reading-schema';
import { decisionChoices } from './vocabulary';

/** Money is a decimal number carried as text, so that no cent is lost on the way; a dollar sign or comma may be typed. */
export const moneySchema = (what: string, most: number) =>
  z
    .string()
    .trim()
    .transform((text) => text.replace(/^\$\s*/, '').replace(/,(?=\d{3}(\D|$))/g, '').replace(/^(\d+),(\d{1,2})$/, '$1.$2'))
    .refine((text) => /^\d+(\.\d{1,4})?$/.test(text), `Type ${what} in dollars, such as 4.20.`)
    .refine((text) => !/^\d+(\.\d{1,4})?$/.test(text) || Number(text) <= most, `${most} dollars is the most that can be taken for ${what}.`);

const percentSchema = (what: string) => z.number(`Type ${what} in percent.`).min(0, `Type ${what} as 0 to 100 percent.`).max(100, `Type ${what} as 0 to 100 percent.`);

/** The sum behind keep or replant as somebody typed it. Nothing is pre-filled as if it were today's price. */
export const replantInputsSchema = z.object({
  /** Yield at full stand and best date. */
  fullYield: readingSchema(fullYieldRule).nullable(),
  pricePerBushel: moneySchema('the price a bushel', 50).nullable(),
  replantOn: calendarDaySchema.nullable(),
  replantStand: readingSchema({ ...seedingRateRule, name: 'stand after replanting' }).nullable(),
  /** Costs of replanting, dollars an acre, each named by the user. */
  costs: z
    .array(z.object({ label: z.string().trim().min(1, 'Name the cost.').max(60), dollarsPerAcre: moneySchema('the cost an acre', 2_000) }))
    .max(12),
  extraDryingPerAcre: moneySchema('the drying an acre', 500).nullable(),
  insurancePaymentPerAcre: moneySchema('the insurance payment an acre', 2_000).nullable(),
  gapLossPercent: percentSchema('the loss from gaps'),
  unevenLossPercent: percentSchema('the loss from unevenness'),
  /** The chance that the second stand is poor as well, and what it would then yield of a full one. */
  poorSecondStandChancePercent: percentSchema('the chance of a poor second stand'),
  poorSecondStandYieldPercent: percentSchema('what a poor second stand yields').nullable(),
});
export type ReplantInputs = z.output<typeof replantInputsSchema>;

export const saveReplantSheetSchema = z.object({ plantingId: z.uuid(), zoneId: z.uuid().nullable(), inputs: replantInputsSchema });
export type SaveReplantSheetInput = z.output<typeof saveReplantSheetSchema>;

export const signDecisionSchema = z.object({
  plantingId: z.uuid(),
  zoneId: z.uuid().nullable(),
  decided: z.enum(decisionChoices),
  signedName: z.string().trim().min(1, 'Type your name to sign.').max(100),
  /** The hash of what stood on the screen, so that nobody signs numbers they did not see. */
  basisHash: z.string().length(64),
});
export type SignDecisionInput = z.output<typeof signDecisionSchema>;
