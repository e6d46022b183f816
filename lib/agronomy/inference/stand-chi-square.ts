import chisquare from '@stdlib/stats-base-dists-chisquare';
import { requiredNumber } from '../required-number';

/**
 * Below which value does this share of the chi-square distribution lie?
 *
 * Takes a share strictly between 0 and 1 and the degrees of freedom (above 0). Returns the quantile. Never
 * insufficient; throws ImpossibleInput outside those limits. Method: @stdlib, checked against R.
 * Example: 0.025 on 62 degrees of freedom is 42.13, twice the lower end of 31 by Poisson.
 */
export function standChiSquareQuantile(share: number, degreesOfFreedom: number): number {
  requiredNumber(share, 'share', { above: 0, atMost: 1 - Number.EPSILON });
  requiredNumber(degreesOfFreedom, 'degreesOfFreedom', { above: 0 });
  return chisquare.quantile(share, degreesOfFreedom);
}
