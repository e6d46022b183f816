import chisquare from '@stdlib/stats-base-dists-chisquare';
import { requiredNumber } from '../required-number';

/**
 * How likely is a chi-square at most, and at least, this large?
 *
 * Takes the statistic (0 or more) and degrees of freedom (above 0). Returns both tails, 0 to 1. Never insufficient; throws
 * ImpossibleInput outside those limits. Method: @stdlib; the upper tail is 1 less the lower, so below 1e-12 its digits are
 * lost, which no decision here rests on. Example: 3.84146 on 1 degree of freedom: 0.95 and 0.05.
 */
export function chiSquareTails(
  statistic: number,
  degreesOfFreedom: number,
): { lower: number; upper: number } {
  requiredNumber(statistic, 'statistic', { atLeast: 0 });
  requiredNumber(degreesOfFreedom, 'degreesOfFreedom', { above: 0 });
  const lower = chisquare.cdf(statistic, degreesOfFreedom);
  return { lower, upper: 1 - lower };
}
