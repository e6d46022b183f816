import { interpolate, type Anchor } from './interpolate';
import { insufficient, value, type Outcome } from './outcome';
import { requiredNumber } from './required-number';

/** The version of the formulas below; stored with every score that is kept. */
export const SCORE_VERSION = '1';

/** Own choice, printed beside every score. */
export const scoreWeights = { stand: 0.4, timing: 0.4, spacing: 0.2 } as const;

export type ScorePartName = keyof typeof scoreWeights;

/** Points from 0 to 100; `at-most` when the spread behind it is only known as "at least". */
export type ScorePart = { points: number; bound: 'exact' | 'at-most' };

/**
 * How full is the stand, in points?
 *
 * Takes plants per acre (0 or more) and the intended final stand (above 0). Returns 100 at the intended stand
 * or above, 0 at half of it or below, straight between. Never insufficient; throws ImpossibleInput for a
 * negative stand. Method: section "score" of the Methods page, own choice of anchors.
 * It grades the work and says nothing of money. Example: 28,500 of 30,000 is 90 points.
 */
export function standPoints(plantsPerAcre: number, intendedPlantsPerAcre: number): ScorePart {
  requiredNumber(plantsPerAcre, 'plantsPerAcre', { atLeast: 0 });
  requiredNumber(intendedPlantsPerAcre, 'intendedPlantsPerAcre', { above: 0 });
  const anchors = [
    { at: 0.5, result: 0 },
    { at: 1, result: 100 },
  ];
  return { points: interpolate(anchors, plantsPerAcre / intendedPlantsPerAcre), bound: 'exact' };
}

export type TimingSpread = { amount: number; unit: 'days' | 'degree-days'; bound: 'exact' | 'at-least' };

const timingAnchors: Record<TimingSpread['unit'], Anchor[]> = {
  days: [
    { at: 2, result: 100 },
    { at: 7, result: 0 },
  ],
  'degree-days': [
    { at: 25, result: 100 },
    { at: 82, result: 0 },
  ],
};

/**
 * How even was the emergence, in points?
 *
 * Takes the 10 to 90 % spread, in days or, where weather is known, in °F degree days. Returns 100 at 2 days
 * (25 degree days) or less, 0 at 7 days (82 degree days, one leaf collar) or more, straight between. Never
 * insufficient; throws ImpossibleInput for a negative spread.
 * Method: 20 to 25 degree days count as uniform (Illinois, Nafziger 2013; whether first to last plant was
 * meant is not known); the day anchors are our own. A spread of "at least" gives points of "at most".
 * Dead seeds make a stand look even. Example: 4.5 days are 50 points.
 */
export function timingPoints(spread: TimingSpread): ScorePart {
  requiredNumber(spread.amount, 'spread', { atLeast: 0 });
  const points = interpolate(timingAnchors[spread.unit], spread.amount);
  return { points, bound: spread.bound === 'at-least' && points > 0 ? 'at-most' : 'exact' };
}

/**
 * How even is the spacing, in points?
 *
 * Takes the SD of the spacings in inches (0 or more). Returns 100 at 2 in or less (the best to be had), 50 at
 * 4.5 in (mean of 354 Indiana and Ohio fields, Nielsen), 0 at 10 in (the survey's worst), straight between.
 * Never insufficient; throws ImpossibleInput for a negative SD.
 * Missing plants raise the SD, so they weigh here and in the stand. Example: 5.116 in are 44.4 points.
 */
export function spacingPoints(spacingSdInches: number): ScorePart {
  requiredNumber(spacingSdInches, 'spacingSdInches', { atLeast: 0 });
  const anchors = [
    { at: 2, result: 100 },
    { at: 4.5, result: 50 },
    { at: 10, result: 0 },
  ];
  return { points: interpolate(anchors, spacingSdInches), bound: 'exact' };
}

export type Score = {
  points: number;
  bound: ScorePart['bound'];
  /** The weights in use, raised in proportion when a part is left out; 0 for a part left out. */
  weights: Record<ScorePartName, number>;
  leftOut: ScorePartName[];
  version: typeof SCORE_VERSION;
};

/**
 * What is the whole score?
 *
 * Takes the three parts, each in points or insufficient. Returns the weighted mean with the weights used and
 * the parts left out. Insufficient when no part is there. Throws nothing.
 * Method: weights 0.4, 0.4, 0.2; a part that is insufficient is left out and the other weights are divided by
 * their sum. Scores with different parts left out are not comparable: the parts are shown with them.
 * Example: 90, 50 and 44.4 points are 64.9.
 */
export function wholeScore(parts: Record<ScorePartName, Outcome<ScorePart>>): Outcome<Score> {
  const names: ScorePartName[] = ['stand', 'timing', 'spacing'];
  const present = names.flatMap((name) => {
    const part = parts[name];
    return part.kind === 'value' ? [{ name, part: part.value, weight: scoreWeights[name] }] : [];
  });
  if (present.length === 0) {
    return insufficient('no-part', '1 of stand, timing and spacing', 'none of them');
  }
  const total = present.reduce((sum, { weight }) => sum + weight, 0);
  const weights: Score['weights'] = { stand: 0, timing: 0, spacing: 0 };
  for (const { name, weight } of present) weights[name] = weight / total;
  return value({
    points: present.reduce((sum, { part, weight }) => sum + (part.points * weight) / total, 0),
    bound: present.some(({ part }) => part.bound === 'at-most') ? 'at-most' : 'exact',
    weights,
    leftOut: names.filter((name) => parts[name].kind === 'insufficient'),
    version: SCORE_VERSION,
  });
}
