import { z } from 'zod';
import { replantInputsSchema } from './replant-sheet';
import { crops, decisionChoices } from './vocabulary';

/**
 * The wire form of keep or replant. The basis is everything the answer rests on and says, without a unit system: the page
 * shows it, its hash is what a person signs, and a decision freezes it; it is parsed again when it is read back.
 */
const spanSchema = z.object({ lower: z.number(), upper: z.number() });
export type ReplantSpan = z.infer<typeof spanSchema>;

/** The figures somebody has to type, in the order in which the form asks for them. */
export const replantFigures = [
  'fullYield',
  'price',
  'replantOn',
  'replantStand',
  'costs',
  'extraDrying',
  'insurancePayment',
  'poorSecondStandChance',
  'poorSecondStandYield',
] as const;
export type ReplantFigure = (typeof replantFigures)[number];

/** Why there is no answer yet. `names` are zones, or figures of the list above where figures are missing. */
const gapSchema = z.object({
  reason: z.enum([
    'crop-without-table',
    'no-row-samples',
    'zone-not-counted',
    'rest-not-counted',
    'rest-without-area',
    'rest-without-room',
    'figures-missing',
    'replant-not-after-planting',
  ]),
  names: z.array(z.string()),
});
export type ReplantGap = z.infer<typeof gapSchema>;

const tableEnd = z.enum(['stand-below', 'stand-above', 'date-before', 'date-after']);
const readingOfTableSchema = z.discriminatedUnion('kind', [
  z.object({
    kind: z.literal('value'),
    percent: z.number(),
    basis: z.enum(['printed', 'interpolated', 'no-plants']),
    extrapolatedInSource: z.boolean(),
  }),
  z.object({
    kind: z.literal('at-most'),
    percent: z.number(),
    beyond: z.array(tableEnd),
    extrapolatedInSource: z.boolean(),
  }),
]);
export type ReadingOfTable = z.infer<typeof readingOfTableSchema>;

const lineSchema = z.object({
  id: z.enum([
    'maximum-yield',
    'keep-table-share',
    'keep-gap-loss-share',
    'keep-uneven-loss-share',
    'keep-yield',
    'replant-table-share',
    'poor-second-stand-chance',
    'poor-second-stand-yield-share',
    'replant-yield',
    'yield-change',
    'yield-change-value',
    'replant-cost',
    'extra-drying',
    'insurance-payment',
    'gain',
  ]),
  label: z.string().nullable(),
  unit: z.enum(['bushels-per-acre', 'share', 'dollars-per-acre']),
  amount: spanSchema,
});
export type ReplantSumLine = z.infer<typeof lineSchema>;

export const replantRecommendations = ['keep', 'replant', 'too-close', 'cannot-tell'] as const;

const valueSchema = z.object({
  kind: z.literal('value'),
  recommendation: z.enum(replantRecommendations),
  because: z.enum(['within-table-rounding', 'count-reaches-both', 'table-ends']).nullable(),
  isBounded: z.boolean(),
  standsDespiteBound: z.boolean(),
  keepReading: readingOfTableSchema,
  replantReading: readingOfTableSchema,
  keepYieldBushelsPerAcre: spanSchema,
  replantYieldBushelsPerAcre: spanSchema,
  /**
   * What keeping makes between the low and the high end of the count; null where the count has no interval. Below the
   * table the low end is only known to be no more than that.
   */
  keepYieldOverCount: spanSchema.extend({ lowerIsBound: z.boolean() }).nullable(),
  /** What replanting makes between a poor second stand and a good one; null where no chance of a poor one was typed. */
  replantYieldOverSecondStand: spanSchema.nullable(),
  lines: z.array(lineSchema),
  gainDollarsPerAcre: spanSchema,
  gainDollarsField: spanSchema.nullable(),
  tableRoundingDollarsPerAcre: z.number(),
  overInterval: z
    .object({
      standLower: z.number(),
      standUpper: z.number(),
      gainAtLowerDollarsPerAcre: spanSchema,
      gainAtUpperDollarsPerAcre: spanSchema,
      draws: z.object({
        draws: z.number(),
        seed: z.number(),
        keepWinsShare: z.number(),
        replantWinsShare: z.number(),
        openShare: z.number(),
      }),
      anotherCountCouldTurnIt: z.boolean(),
    })
    .nullable(),
  breakEven: z.discriminatedUnion('kind', [
    z.object({
      kind: z.literal('stand'),
      plantsPerAcre: z.number(),
      bound: z.enum(['exact', 'at-most', 'at-least']),
    }),
    z.object({ kind: z.literal('below-table'), plantsPerAcre: z.number() }),
    z.object({ kind: z.literal('none-in-table') }),
    z.object({ kind: z.literal('cannot-tell') }),
  ]),
  terms: z.object({
    maximumYieldBushelsPerAcre: z.number(),
    priceDollarsPerBushel: z.number(),
    replantPlantsPerAcre: z.number(),
  }),
});
export type ReplantValue = z.infer<typeof valueSchema>;

const insufficientSchema = z.object({ kind: z.literal('insufficient'), gaps: z.array(gapSchema) });

const sentencesSchema = z.object({
  first: z.string(),
  /** Said right under the first where the table only bounds. */
  bound: z.string().nullable(),
  /** Zones that say otherwise, one sentence each. */
  zones: z.array(z.string()),
  /** How sure, and what is not in it. */
  sureness: z.array(z.string()),
});
export type ReplantSentencesShown = z.infer<typeof sentencesSchema>;

const countedRowSchema = z.object({
  rowSampleId: z.string(),
  label: z.string(),
  zoneName: z.string().nullable(),
  plantsPerAcre: z.number(),
  plantsHeld: z.number(),
  areaAcres: z.number(),
  lastSeenOn: z.string(),
  /** The counts the stand rests on; empty where the tape sheet had to serve. */
  countIds: z.array(z.string()),
  tapeSheetId: z.string().nullable(),
});
export type CountedRow = z.infer<typeof countedRowSchema>;

export const replantBasisSchema = z.object({
  plantingId: z.string(),
  fieldName: z.string(),
  zone: z.object({ id: z.string(), name: z.string() }).nullable(),
  crop: z.enum(crops),
  plantedOn: z.string(),
  acres: z.number().nullable(),
  countedRows: z.array(countedRowSchema),
  stand: z
    .object({
      plantsPerAcre: z.number(),
      interval: z
        .object({
          lower: z.number(),
          upper: z.number(),
          standardErrorPlantsPerAcre: z.number(),
          degreesOfFreedom: z.number(),
        })
        .nullable(),
      places: z.enum(['row-samples', 'strips', 'zones']),
    })
    .nullable(),
  sheet: z.object({ id: z.string(), ofWholeField: z.boolean(), inputs: replantInputsSchema }).nullable(),
  fullYield: z.object({ bushelsPerAcre: z.number(), from: z.enum(['sheet', 'planting']) }).nullable(),
  answer: z.discriminatedUnion('kind', [valueSchema, insufficientSchema]),
  zoneAnswers: z.array(
    z.object({
      zoneId: z.string(),
      name: z.string(),
      acres: z.number(),
      recommendation: z.enum(replantRecommendations).nullable(),
      gainDollarsPerAcre: spanSchema.nullable(),
    }),
  ),
  sentences: z.object({ us: sentencesSchema, metric: sentencesSchema }).nullable(),
  /** The formulas and the table the answer came from, by their id and version in the register. */
  versions: z.record(z.string(), z.string()),
});
export type ReplantBasis = z.output<typeof replantBasisSchema>;

/** What a decision freezes. The version says how to read it, as long as there are decisions that carry it. */
export const frozenDecisionSchema = z.object({
  version: z.literal(1),
  signedOn: z.string(),
  basis: replantBasisSchema,
});
export type FrozenDecision = z.output<typeof frozenDecisionSchema>;

const decisionSchema = z.object({
  id: z.string(),
  zone: z.object({ id: z.string(), name: z.string() }).nullable(),
  recommended: z.enum(replantRecommendations),
  decided: z.enum(decisionChoices),
  signedName: z.string(),
  personName: z.string(),
  signedOn: z.string(),
  basisHash: z.string(),
  basis: replantBasisSchema,
});
export type SignedDecision = z.output<typeof decisionSchema>;

export const replantSchema = z.object({
  basis: replantBasisSchema,
  basisHash: z.string(),
  zones: z.array(z.object({ id: z.string(), name: z.string(), acres: z.number() })),
  fieldAcres: z.number().nullable(),
  /** Who saved the figures shown; null before anybody did. */
  sheetSavedBy: z.string().nullable(),
  /** Yield at full stand as the plan has it, for the form. */
  plannedFullYield: z.object({ typed: z.string(), unit: z.string() }).nullable(),
  /** Row samples in this planting that nobody has counted yet. */
  uncountedLabels: z.array(z.string()),
  /** All of this planting, newest first. */
  decisions: z.array(decisionSchema),
});
export type ReplantAnswer = z.output<typeof replantSchema>;
