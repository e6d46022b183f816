import type { DoublesAndGaps } from './doubles-and-gaps';
import type { EmergenceCurve } from './emergence-curve';
import type { EmergenceSpread } from './emergence-spread';
import type { Placement } from './kachman-smith';
import type { LatePattern } from './late-pattern';
import type { LateShare } from './late-share';
import type { Outcome } from './outcome';
import type { Penalty, PenaltyStudy } from './penalty/penalty';
import type { Score, ScorePart } from './score';
import type { StandInterval } from './stand-interval-shape';

export type StandFigure = { plantsPerAcre: number; plantsHeld: number; areaAcres: number };
export type SeedFigure = { share: number; plantsHeld: number; seeds: number };
export type SeedIntervalFigure = { shareLower: number; shareUpper: number; method: StandInterval['method'] };
export type DaysFigure = { days: number; bound: 'exact' | 'at-latest' };

/** Every figure of a row sample or a group; each key has its entry in the register. */
export type Figures = {
  plantsPerAcre: Outcome<StandFigure>;
  plantsPerAcreInterval: Outcome<StandInterval>;
  /** Shares of 1; not cut off at 1. */
  shareOfSeed: Outcome<SeedFigure>;
  shareOfSeedInterval: Outcome<SeedIntervalFigure>;
  emergenceCurve: Outcome<EmergenceCurve>;
  daysTo10: Outcome<DaysFigure>;
  daysTo50: Outcome<DaysFigure>;
  daysTo90: Outcome<DaysFigure>;
  spreadDays: Outcome<EmergenceSpread>;
  /** From tape sheets where they carry it, otherwise from counts; the answer says which. */
  lateShare: Outcome<LateShare>;
  /** Always from counts alone, to hold beside the tape sheets. */
  lateShareFromCounts: Outcome<LateShare>;
  latePattern: Outcome<LatePattern>;
  spacingInchesMean: Outcome<number>;
  spacingInchesSd: Outcome<number>;
  spacingCv: Outcome<number>;
  theoreticalSpacingInches: Outcome<number>;
  /** Multiples, singles and misses, of spacings and of places. */
  placement: Outcome<Placement>;
  spacingInchesSdSingles: Outcome<number>;
  spacingInchesSdFromMissing: Outcome<number>;
  doublesAndGaps: Outcome<DoublesAndGaps>;
  /** Plants on the tape sheets less plants counted in the same row samples. */
  tapeLessCounted: Outcome<number>;
  score: Outcome<Score>;
  scoreStand: Outcome<ScorePart>;
  scoreTiming: Outcome<ScorePart>;
  scoreSpacing: Outcome<ScorePart>;
};

/** What each published study says; shown side by side, never added up. */
export type Penalties = Record<PenaltyStudy, Outcome<Penalty>>;

export type FigureId = keyof Figures | PenaltyStudy;
