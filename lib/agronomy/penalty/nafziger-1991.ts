import { interpolate, isAnchor, type Anchor } from '../interpolate';
import type { LatePattern } from '../late-pattern';
import { insufficient, value, type Outcome } from '../outcome';
import { isEvenStand, requiredLatePlants, type LatePlants } from './late-plants';
import type { Penalty } from './penalty';
import { spokenNumber } from '../spoken-number';

/** Yield in percent of the uniform early stand at 0, 25, 50, 75 and 100 % late plants; 50 % depends on the pattern. */
const yields = {
  tenDays: { at25: 93.2, alternating: 90.7, inGroups: 92.4, at75: 92.4, at100: 94.1 },
  threeWeeks: { at25: 89.0, alternating: 78.0, inGroups: 79.7, at75: 77.1, at100: 88.1 },
} as const;

/** Delay bands as the study gives them; inside a band its values are read as they stand. */
const tenDayBand = { from: 10, to: 12 };
const threeWeekBand = { from: 21, to: 27 };

/** Counts alone do not show the pattern; then both columns are read. */
export type PatternRead = LatePattern['pattern'] | 'not-known';

const columnWords: Record<PatternRead, string> = {
  alternating: 'late plants alternating',
  'in-groups': 'late plants in threes',
  'not-known': 'pattern in the row not known: both columns',
};

/**
 * By Nafziger, Carter and Graham (1991): what do late plants cost?
 *
 * Takes the share of late plants (0 to 1), their mean delay in days (0 or more) and the pattern in the row.
 * Returns the loss in percent of the yield of the even early stand; where the pattern is not known, both
 * columns as low and high. Insufficient beyond 27 days. Throws
 * ImpossibleInput for a share above 1 or a negative delay.
 *
 * Method: Crop Sci. 31:811, seven environments, the means of 25, 50 (alternating, in threes), 75 and 100 %
 * late plants at 10 to 12 and 21 to 27 days. No late plants, or no delay, is the study's even check, 100 %.
 * Straight lines between shares, then between delays, labelled interpolated; inside a delay band the band's
 * own value. The ten-day line is not monotone (93.2, 90.7, 92.4, 94.1) and is kept as measured.
 *
 * Seven environments of the 1980s; late plants never lowered yield below the same stand without them.
 * Example: a quarter 10 to 12 days late: 93.2 % of the even stand, a loss of 6.8 %.
 */
export function nafziger1991(late: LatePlants, pattern: PatternRead): Outcome<Penalty> {
  requiredLatePlants(late);
  const even = isEvenStand(late);
  if (!even && late.delayDays > threeWeekBand.to) {
    return insufficient(
      'beyond-study',
      `a delay up to ${threeWeekBand.to} days`,
      `a mean delay of ${spokenNumber(late.delayDays)} days`,
    );
  }
  const patterns: LatePattern['pattern'][] =
    pattern === 'not-known' ? ['alternating', 'in-groups'] : [pattern];
  const losses = patterns.map((column) => (even ? 0 : 100 - yieldPercent(late, column)));
  const inBand = [tenDayBand, threeWeekBand].some(
    (band) => late.delayDays >= band.from && late.delayDays <= band.to,
  );
  const shareStudied = isAnchor(shareAnchors('tenDays', 'alternating'), late.lateShare);
  return value({
    study: 'nafziger-1991',
    source: 'Nafziger, Carter and Graham 1991, Crop Sci. 31:811',
    reading: 'read',
    lossLow: Math.min(...losses),
    lossHigh: Math.max(...losses),
    unit: 'percent-of-even-stand',
    basis: even || (inBand && shareStudied) ? 'measured' : 'interpolated',
    column: columnWords[pattern],
    domain: '25 to 100 % of plants late, by 10 to 12 or 21 to 27 days, seven environments',
  });
}

function yieldPercent(late: LatePlants, pattern: LatePattern['pattern']): number {
  const atTenDays = interpolate(shareAnchors('tenDays', pattern), late.lateShare);
  const atThreeWeeks = interpolate(shareAnchors('threeWeeks', pattern), late.lateShare);
  const delayAnchors = [
    { at: 0, result: 100 },
    { at: tenDayBand.from, result: atTenDays },
    { at: tenDayBand.to, result: atTenDays },
    { at: threeWeekBand.from, result: atThreeWeeks },
    { at: threeWeekBand.to, result: atThreeWeeks },
  ];
  return interpolate(delayAnchors, late.delayDays);
}

function shareAnchors(delay: keyof typeof yields, pattern: LatePattern['pattern']): Anchor[] {
  const row = yields[delay];
  return [
    { at: 0, result: 100 },
    { at: 0.25, result: row.at25 },
    { at: 0.5, result: pattern === 'alternating' ? row.alternating : row.inGroups },
    { at: 0.75, result: row.at75 },
    { at: 1, result: row.at100 },
  ];
}
