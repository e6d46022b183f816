import type { Figures } from './figures';
import { insufficient, mapOutcome, type Outcome } from './outcome';
import { spacingPoints, standPoints, timingPoints, wholeScore, type TimingSpread } from './score';

export type ScoreFigures = Pick<Figures, 'score' | 'scoreStand' | 'scoreTiming' | 'scoreSpacing'>;

type ScoreInputs = Pick<Figures, 'plantsPerAcre' | 'spreadDays' | 'spacingInchesSd'> & {
  intendedPlantsPerAcre: number | null;
  /** Used in place of days only when given. */
  spreadDegreeDays?: Outcome<TimingSpread>;
};

/**
 * What is the score of this stand, with its parts?
 *
 * Takes the figures it grades and the intended final stand. Returns the parts and the whole, each insufficient
 * where its own needs are not met. Throws ImpossibleInput as the parts do. Method: see score; timing uses
 * degree days when a spread in degree days is given and days otherwise. The score grades the work, the
 * penalties estimate money; they are never mixed.
 * Example: 28,500 of 30,000, 4.5 days and an SD of 5.116 in: 90, 50, 44.4, whole 64.9.
 */
export function scoreFigures(inputs: ScoreInputs): ScoreFigures {
  const intended = inputs.intendedPlantsPerAcre;
  const scoreStand =
    intended === null
      ? insufficient('intended-stand-not-known', 'the intended final stand', 'none given')
      : mapOutcome(inputs.plantsPerAcre, (stand) => standPoints(stand.plantsPerAcre, intended));
  const spread: Outcome<TimingSpread> =
    inputs.spreadDegreeDays ??
    mapOutcome(inputs.spreadDays, ({ days, bound }) => ({ amount: days, unit: 'days', bound }));
  const scoreTiming = mapOutcome(spread, timingPoints);
  const scoreSpacing = mapOutcome(inputs.spacingInchesSd, spacingPoints);
  return {
    score: wholeScore({ stand: scoreStand, timing: scoreTiming, spacing: scoreSpacing }),
    scoreStand,
    scoreTiming,
    scoreSpacing,
  };
}
