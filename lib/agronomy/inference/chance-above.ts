import { requiredNumber } from '../required-number';
import { studentTwoSidedP } from './student-t';

/** A difference with its error, as an analysis of strips or blocks gives it; one unit throughout. */
export type EstimatedDifference = { mean: number; standardError: number; degreesOfFreedom: number };

/**
 * How likely is the true difference above this limit, as far as this trial alone can say?
 *
 * Takes the mean difference with its standard error (above 0) and degrees of freedom (above 0), and the limit, in one unit.
 * Returns a probability, 0 to 1. Never insufficient; throws ImpossibleInput for numbers outside those limits.
 * Method: the upper tail of Student's t at (limit − mean) / standard error. It reads the t interval as a distribution of
 * the true difference, which holds when nothing was known beforehand; other trials of the same thing are not in it.
 * Example: a mean of 0 lies above 0 with 0.5; 6.2 ± 2.4 on 9 degrees of freedom lies above 2.644 with 0.914.
 */
export function chanceAbove(difference: EstimatedDifference, limit: number): number {
  const mean = requiredNumber(difference.mean, 'mean');
  const error = requiredNumber(difference.standardError, 'standardError', { above: 0 });
  const t = (requiredNumber(limit, 'limit') - mean) / error;
  const outside = studentTwoSidedP(t, difference.degreesOfFreedom) / 2;
  return t > 0 ? outside : 1 - outside;
}
