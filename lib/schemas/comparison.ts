import { z } from 'zod';
import type { ComparisonFinding } from '@/lib/agronomy/comparison-finding';
import { drawnPlantSchema } from './drawn-plant';
import { outcomeSchema } from './outcome';
import { plantingFactsSchema } from './planting-facts';
import { scoredGroupSchema } from './scored-group';
import { comparisonRules, mainFigures, rowEnds } from './vocabulary';

/** The comparison of a trial's settings as it travels. */
const number = z.number();

/** The figures of a strip that settings are compared by; the main figure is one of the first six. */
export const comparedFigures = [...mainFigures, 'share-of-seed', 'spacing-cv', 'in-row-cover'] as const;
export type ComparedFigure = (typeof comparedFigures)[number];

const analysisSchema = z.object({
  blocks: number,
  strips: number,
  missingStrips: number,
  errorSd: number,
  errorDegreesOfFreedom: number,
  settingDegreesOfFreedom: number,
  fRatio: number,
  p: number,
});

const meanSchema = z.object({
  settingId: z.string(),
  strips: number,
  mean: number,
  /** Least-squares means have one; a plain mean of strips, where nothing could be analyzed, has none. */
  standardError: number.nullable(),
  least: number,
  most: number,
  /** Tukey's letters, of the main figure only and only where that rule was planned. */
  letters: z.string().nullable(),
});
export type SettingMeanFigure = z.output<typeof meanSchema>;

/** `first` less `second`. */
const differenceSchema = z.object({
  first: z.string(),
  second: z.string(),
  difference: number,
  lower: number,
  upper: number,
  p: number,
  toldApart: z.boolean(),
});
export type SettingDifferenceFigure = z.output<typeof differenceSchema>;

const stripValueSchema = z.object({
  stripId: z.string(),
  number,
  blockNumber: number,
  settingId: z.string(),
  value: outcomeSchema(z.object({ figure: number, isBound: z.boolean() })),
});
export type StripValue = z.output<typeof stripValueSchema>;

const comparedFigureSchema = z.object({
  figure: z.enum(comparedFigures),
  strips: z.array(stripValueSchema),
  means: z.array(meanSchema),
  analysis: outcomeSchema(analysisSchema),
  differences: z.array(differenceSchema),
});
export type FigureComparison = z.output<typeof comparedFigureSchema>;

const insufficientSchema = z.object({ kind: z.literal('insufficient'), reason: z.string(), needed: z.string(), had: z.string() });
const toldApart = { setting: z.string(), comparedWith: z.string(), difference: number, lower: number, upper: number, better: z.boolean() };
const findingCommon = {
  figure: z.enum(mainFigures),
  reference: z.string(),
  rule: z.enum(comparisonRules),
  blocks: number,
  errorDegreesOfFreedom: number,
  isLittle: z.boolean(),
  leftOut: z.array(z.string()),
  cannotTell: z.array(z.object({ first: z.string(), second: z.string() })),
  alsoSeen: z.array(z.object(toldApart)),
};
const findingSchema: z.ZodType<ComparisonFinding> = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('difference'), ...findingCommon, ...toldApart }),
  z.object({
    kind: z.literal('no-difference-shown'),
    ...findingCommon,
    notRuledOutUpTo: number,
    intervalAloneExcludesZero: z.array(z.string()),
  }),
  z.object({
    kind: z.literal('nothing-to-compare'),
    figure: z.enum(mainFigures),
    reference: z.string(),
    because: insufficientSchema,
  }),
]);

const typicalRowSchema = z.object({
  rowSampleId: z.string(),
  label: z.string(),
  stripNumber: number,
  lengthInches: number,
  startEnd: z.enum(rowEnds),
  farEnd: z.enum(rowEnds),
  plants: z.array(drawnPlantSchema),
  spreadDays: number.nullable(),
  plantsPerAcre: number,
  /** Among how many row samples with a tape sheet it was chosen. */
  chosenAmong: number,
  chosenBy: z.enum(['stand-and-spread', 'stand']),
});
export type TypicalRow = z.output<typeof typicalRowSchema>;

const comparedSettingSchema = z.object({
  settingId: z.string(),
  name: z.string(),
  phrase: z.string(),
  seriesIndex: number,
  isReference: z.boolean(),
  /** Strips that ran it and were not lost. */
  strips: number,
  rowSamples: number,
  curve: outcomeSchema(
    z.object({ points: z.array(z.object({ days: number, plantsPerAcre: number })), plantsLost: number, countingEnded: z.boolean() }),
  ),
  /** All its row samples together: what the penalties and the interval of the stand are read from. */
  scored: scoredGroupSchema,
  typicalRow: typicalRowSchema.nullable(),
  coverReadings: number,
});
export type ComparedSetting = z.output<typeof comparedSettingSchema>;

const randomizationSchema = z.discriminatedUnion('method', [
  z.object({ method: z.literal('exact'), arrangements: number, asExtreme: number, p: number, smallestAttainableP: number }),
  z.object({
    method: z.literal('sampled'),
    arrangements: number,
    sampled: number,
    seed: number,
    p: number,
    pStandardError: number,
    smallestAttainableP: number,
  }),
]);

const notesSchema = z.object({
  stripsTotal: number,
  stripsCompared: number,
  /** By strip number. */
  stillCounting: z.array(number),
  notCounted: z.array(number),
  visitsLeast: number,
  visitsMost: number,
  lastVisitLeast: z.string().nullable(),
  lastVisitMost: z.string().nullable(),
  plantedOtherwise: z.array(z.object({ number, plannedId: z.string(), settingId: z.string(), reason: z.string().nullable() })),
  asPlannedOnly: number,
  lost: z.array(z.object({ number, reason: z.string().nullable(), rowSamples: number })),
  rowSamplesNotCounted: z.array(z.string()),
  rowSamplesImpossible: z.array(z.string()),
  rowSamplesOutsideStrips: number,
  /** Blocks not run as they were dealt; the randomization test leaves them out. */
  blocksNotAsDealt: z.array(number),
});
export type ComparisonNotes = z.output<typeof notesSchema>;

const trialComparisonSchema = z.object({
  kind: z.literal('trial'),
  planting: plantingFactsSchema,
  trial: z.object({
    trialId: z.string(),
    mainFigure: z.enum(mainFigures),
    rule: z.enum(comparisonRules),
    referenceSettingId: z.string(),
    blocks: number,
    isLocked: z.boolean(),
    lockedAt: z.string().nullable(),
  }),
  settings: z.array(comparedSettingSchema),
  figures: z.array(comparedFigureSchema),
  finding: findingSchema,
  randomization: outcomeSchema(randomizationSchema),
  notes: notesSchema,
});
export type TrialComparison = z.output<typeof trialComparisonSchema>;

export const comparisonSchema = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('no-trial'), planting: plantingFactsSchema }),
  trialComparisonSchema,
]);
export type Comparison = z.output<typeof comparisonSchema>;
