import { z } from 'zod';
import type { DoublesAndGaps } from '@/lib/agronomy/doubles-and-gaps';
import type { EmergenceCurve } from '@/lib/agronomy/emergence-curve';
import type { EmergenceSpread } from '@/lib/agronomy/emergence-spread';
import type { DaysFigure, Figures, SeedFigure, SeedIntervalFigure, StandFigure } from '@/lib/agronomy/figures';
import type { Placement } from '@/lib/agronomy/kachman-smith';
import type { LateLimits } from '@/lib/agronomy/late-limits';
import type { LatePattern } from '@/lib/agronomy/late-pattern';
import type { LateShare } from '@/lib/agronomy/late-share';
import type { Outcome } from '@/lib/agronomy/outcome';
import { penaltyStudies, type PenaltyStudy } from '@/lib/agronomy/penalty/penalty';
import { SCORE_VERSION, type Score, type ScorePart } from '@/lib/agronomy/score';
import type { StandInterval } from '@/lib/agronomy/stand-interval-shape';
import { outcomeSchema } from './outcome';

/** The figures of a row sample or a group as they travel from the server, field by field; each schema is held to the core's type. */
const number = z.number();

export const lateLimitsSchema: z.ZodType<LateLimits> = z.object({ slowDays: number, lateDays: number, veryLateDays: number });

const intervalMethods = ['binomial-wilson', 'poisson-exact', 't-of-mean', 'ratio-linearized', 'stratified-satterthwaite'] as const;

export const standIntervalSchema: z.ZodType<StandInterval> = z.object({
  plantsPerAcreLower: number,
  plantsPerAcreUpper: number,
  level: z.literal(0.95),
  method: z.enum(intervalMethods),
  basis: z.enum(['counting-only', 'row-samples', 'strips', 'zones']),
  units: number,
  student: z.object({ standardErrorPlantsPerAcre: number, degreesOfFreedom: number }).nullable(),
});

const standSchema: z.ZodType<StandFigure> = z.object({ plantsPerAcre: number, plantsHeld: number, areaAcres: number });
const seedSchema: z.ZodType<SeedFigure> = z.object({ share: number, plantsHeld: number, seeds: number });
const seedIntervalSchema: z.ZodType<SeedIntervalFigure> = z.object({ shareLower: number, shareUpper: number, method: z.enum(intervalMethods) });

const curveSchema: z.ZodType<EmergenceCurve> = z.object({
  points: z.array(z.object({ days: number, plantsUp: number })),
  plantsEmerged: number,
  plantsLost: number,
  countingEnded: z.boolean(),
  calendar: z.enum(['one-row-sample', 'same-rounds', 'own-rounds']),
  rowSampleCount: number,
});

const daysSchema: z.ZodType<DaysFigure> = z.object({ days: number, bound: z.enum(['exact', 'at-latest']) });

const spreadSchema: z.ZodType<EmergenceSpread> = z.object({
  days: number,
  bound: z.enum(['exact', 'at-least']),
  boundReasons: z.array(z.enum(['still-coming', 'first-visit-too-late'])),
});

const lateShareSchema: z.ZodType<LateShare> = z.object({
  share: number,
  latePlants: number,
  plants: number,
  slowShare: number,
  veryLateShare: number,
  plantsUnknown: number,
  lateDelayDaysMean: outcomeSchema(number),
  source: z.enum(['tape-sheet', 'counts']),
  bound: z.enum(['exact', 'at-least']),
  limits: lateLimitsSchema,
});

const latePatternSchema: z.ZodType<LatePattern> = z.object({
  pattern: z.enum(['alternating', 'in-groups']),
  meanRunLength: number,
  runs: number,
  latePlants: number,
});

const placementSharesSchema = z.object({ multiplesShare: number, singlesShare: number, missesShare: number });

const placementSchema: z.ZodType<Placement> = z.object({
  spacings: number,
  regions: z.tuple([number, number, number, number, number]),
  ofSpacings: placementSharesSchema,
  ofPlaces: placementSharesSchema,
  theoreticalPlaces: number,
  precision: outcomeSchema(number),
});

const doublesAndGapsSchema: z.ZodType<DoublesAndGaps> = z.object({
  spacings: number,
  doubles: number,
  doublesShare: number,
  gaps: number,
  gapsShare: number,
  gapLengthsInches: z.array(number),
  gapInchesTotal: number,
});

const partNames = ['stand', 'timing', 'spacing'] as const;

const scorePartSchema: z.ZodType<ScorePart> = z.object({ points: number, bound: z.enum(['exact', 'at-most']) });

const scoreSchema: z.ZodType<Score> = z.object({
  points: number,
  bound: z.enum(['exact', 'at-most']),
  weights: z.object({ stand: number, timing: number, spacing: number }),
  leftOut: z.array(z.enum(partNames)),
  version: z.literal(SCORE_VERSION),
});

export const figuresSchema: z.ZodType<Figures> = z.object({
  plantsPerAcre: outcomeSchema(standSchema),
  plantsPerAcreInterval: outcomeSchema(standIntervalSchema),
  shareOfSeed: outcomeSchema(seedSchema),
  shareOfSeedInterval: outcomeSchema(seedIntervalSchema),
  emergenceCurve: outcomeSchema(curveSchema),
  daysTo10: outcomeSchema(daysSchema),
  daysTo50: outcomeSchema(daysSchema),
  daysTo90: outcomeSchema(daysSchema),
  spreadDays: outcomeSchema(spreadSchema),
  lateShare: outcomeSchema(lateShareSchema),
  lateShareFromCounts: outcomeSchema(lateShareSchema),
  latePattern: outcomeSchema(latePatternSchema),
  spacingInchesMean: outcomeSchema(number),
  spacingInchesSd: outcomeSchema(number),
  spacingCv: outcomeSchema(number),
  theoreticalSpacingInches: outcomeSchema(number),
  placement: outcomeSchema(placementSchema),
  spacingInchesSdSingles: outcomeSchema(number),
  spacingInchesSdFromMissing: outcomeSchema(number),
  doublesAndGaps: outcomeSchema(doublesAndGapsSchema),
  tapeLessCounted: outcomeSchema(number),
  score: outcomeSchema(scoreSchema),
  scoreStand: outcomeSchema(scorePartSchema),
  scoreTiming: outcomeSchema(scorePartSchema),
  scoreSpacing: outcomeSchema(scorePartSchema),
});

/** What a study says of this stand; its name, source and limits stand in the register. */
const saidPenaltySchema = z.object({
  lossLow: number,
  lossHigh: number,
  unit: z.enum(['percent-of-even-stand', 'percent-of-three-plants', 'percent-of-yield', 'bushels-per-acre']),
  basis: z.enum(['measured', 'interpolated', 'formula']),
  column: z.string(),
});
export type SaidPenalty = z.output<typeof saidPenaltySchema>;

export type SaidPenalties = Record<PenaltyStudy, Outcome<SaidPenalty>>;

export const penaltiesSchema: z.ZodType<SaidPenalties> = z.record(z.enum(penaltyStudies), outcomeSchema(saidPenaltySchema));
