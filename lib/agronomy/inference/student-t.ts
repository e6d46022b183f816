import studentT from '@stdlib/stats-base-dists-t';
import { requiredNumber } from '../required-number';

/**
 * How likely is a t at least this far from zero, either way, when nothing differs?
 *
 * Takes t and the degrees of freedom (above 0). Returns p, 0 to 1. Never insufficient; throws ImpossibleInput for
 * a t that is no number or degrees of freedom that are not positive.
 * Method: the lower tail of Student's distribution twice, by @stdlib, so that a small p keeps its digits.
 * Example: t = 2 on 1 degree of freedom: 0.2952.
 */
export function studentTwoSidedP(t: number, degreesOfFreedom: number): number {
  requiredNumber(degreesOfFreedom, 'degreesOfFreedom', { above: 0 });
  return 2 * studentT.cdf(-Math.abs(requiredNumber(t, 't')), degreesOfFreedom);
}

/**
 * Below which t does this share of Student's distribution lie?
 *
 * Takes a share strictly between 0 and 1 and the degrees of freedom (above 0). Returns t. Never insufficient;
 * throws ImpossibleInput outside those limits. Method: @stdlib. Example: 0.975 on 3 degrees of freedom: 3.1824.
 */
export function studentQuantile(share: number, degreesOfFreedom: number): number {
  requiredNumber(degreesOfFreedom, 'degreesOfFreedom', { above: 0 });
  requiredNumber(share, 'share', { above: 0, atMost: 1 - Number.EPSILON });
  return studentT.quantile(share, degreesOfFreedom);
}
