import { z } from 'zod';
import { fullYieldRule, seedingRateRule } from './planting';
import { calendarDaySchema } from './operation';
import type { ReadingRule } from './reading';
import { readingSchema } from './reading-schema';
import { decisionChoices } from './vocabulary';

const decimalMoney = /^\d+(\.\d{1,4})?$/;

/** Money is a decimal number carried as text, so that no cent is lost on the way; a dollar sign or comma may be typed. */
export const moneySchema = (what: string, most: number) =>
  z
    .string(`Type ${what} in dollars, such as 4.20.`)
    .trim()
    .transform((text) =>
      text
        .replace(/^\$\s*/, '')
        .replace(/,(?=\d{3}(\D|$))/g, '')
        .replace(/^(\d+),(\d{1,2})$/, '$1.$2'),
    )
    .refine((text) => decimalMoney.test(text), `Type ${what} in dollars, such as 4.20.`)
    .refine(
      (text) => !decimalMoney.test(text) || Number(text) <= most,
      `At most ${most.toLocaleString('en-US')} dollars can be taken for ${what}.`,
    );

/** What the crop brings; at nothing there is nothing to weigh. */
const priceSchema = (what: string, most: number) =>
  moneySchema(what, most).refine(
    (text) => !decimalMoney.test(text) || Number(text) > 0,
    `Type ${what} above zero.`,
  );

const percentSchema = (what: string) =>
  z
    .number(`Type ${what} in percent.`)
    .min(0, `Type ${what} as 0 to 100 percent.`)
    .max(100, `Type ${what} as 0 to 100 percent.`);

export const replantStandRule: ReadingRule = { ...seedingRateRule, name: 'stand after replanting' };
export const costLinesMost = 12;
const costLabelSchema = z.string().trim().min(1, 'Name the cost.').max(60, 'Use at most 60 characters.');

const figures = {
  /** Yield at full stand and best date. */
  fullYield: readingSchema(fullYieldRule).nullable(),
  replantOn: calendarDaySchema.nullable(),
  replantStand: readingSchema(replantStandRule).nullable(),
  gapLossPercent: percentSchema('the loss from gaps'),
  unevenLossPercent: percentSchema('the loss from unevenness'),
  /** The chance that the second stand is poor as well, and what it would then yield of a full one. */
  poorSecondStandChancePercent: percentSchema('the chance of a poor second stand'),
  poorSecondStandYieldPercent: percentSchema('what a poor second stand yields').nullable(),
};

const usInputsSchema = z.object({
  typedIn: z.literal('us'),
  ...figures,
  pricePerBushel: priceSchema('the price a bushel', 50).nullable(),
  /** Costs of replanting, dollars an acre, each named by the user. */
  costs: z
    .array(z.object({ label: costLabelSchema, dollarsPerAcre: moneySchema('the cost an acre', 2_000) }))
    .max(costLinesMost),
  extraDryingPerAcre: moneySchema('the drying an acre', 500).nullable(),
  insurancePaymentPerAcre: moneySchema('the insurance payment an acre', 2_000).nullable(),
});

/** The same, typed per tonne and per hectare; the limits are the same amounts, rounded up. */
const metricInputsSchema = z.object({
  typedIn: z.literal('metric'),
  ...figures,
  pricePerTonne: priceSchema('the price a tonne', 2_000).nullable(),
  costs: z
    .array(z.object({ label: costLabelSchema, dollarsPerHectare: moneySchema('the cost a hectare', 5_000) }))
    .max(costLinesMost),
  extraDryingPerHectare: moneySchema('the drying a hectare', 1_250).nullable(),
  insurancePaymentPerHectare: moneySchema('the insurance payment a hectare', 5_000).nullable(),
});

/**
 * The sum behind keep or replant as somebody typed it. Nothing is pre-filled as if it were today's price. Amounts stay in
 * the units they were typed in; a sheet that does not say is in bushels and acres.
 */
export const replantInputsSchema = z.preprocess(
  (sent) =>
    sent !== null && typeof sent === 'object' && !('typedIn' in sent) ? { ...sent, typedIn: 'us' } : sent,
  z.discriminatedUnion('typedIn', [usInputsSchema, metricInputsSchema]),
);
export type ReplantInputs = z.output<typeof replantInputsSchema>;

export const saveReplantSheetSchema = z.object({
  plantingId: z.uuid(),
  zoneId: z.uuid().nullable(),
  inputs: replantInputsSchema,
});
export type SaveReplantSheetInput = z.output<typeof saveReplantSheetSchema>;

export const signDecisionSchema = z.object({
  plantingId: z.uuid(),
  zoneId: z.uuid().nullable(),
  decided: z.enum(decisionChoices),
  signedName: z
    .string()
    .trim()
    .min(1, 'Type your name to sign.')
    .max(100, 'Use at most 100 characters.')
    .refine((name) => !/[\u0000-\u001f\u007f]/.test(name), 'Write the name on one line.'),
  /** The hash of what stood on the screen, so that nobody signs numbers they did not see. */
  basisHash: z.string().length(64),
});
export type SignDecisionInput = z.output<typeof signDecisionSchema>;
