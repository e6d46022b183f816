import distributionF from '@stdlib/stats-base-dists-f';
import { requiredNumber } from '../required-number';

/**
 * How likely is an F at least this large when nothing differs?
 *
 * Takes F (0 or more) and its two degrees of freedom (above 0). Returns p, 0 to 1. Never insufficient; throws
 * ImpossibleInput outside those limits.
 * Method: the lower tail of 1/F with the degrees of freedom exchanged, by @stdlib, because 1 minus a number near 1
 * loses the digits of a small p.
 * Example: F = 3.29 on 2 and 6 degrees of freedom: 0.1085.
 */
export function upperTailF(ratio: number, numeratorDf: number, denominatorDf: number): number {
  requiredNumber(ratio, 'ratio', { atLeast: 0 });
  requiredNumber(numeratorDf, 'numeratorDf', { above: 0 });
  requiredNumber(denominatorDf, 'denominatorDf', { above: 0 });
  return ratio === 0 ? 1 : distributionF.cdf(1 / ratio, denominatorDf, numeratorDf);
}
