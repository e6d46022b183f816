import chisquare from '@stdlib/stats-base-dists-chisquare';
import student from '@stdlib/stats-base-dists-t';
import { requiredNumber } from '../required-number';

/**
 * Which value does Student's t stay below with a given probability?
 *
 * Takes a probability between 0 and 1 and degrees of freedom (above 0, need not be whole). Returns the
 * quantile. Never insufficient; throws ImpossibleInput outside those ranges. Method: the standard library's
 * t distribution, checked against R. Example: 0.975 with 5 degrees of freedom is 2.5706.
 */
export function standStudentQuantile(probability: number, degreesOfFreedom: number): number {
  requiredNumber(probability, 'probability', { above: 0, atMost: 1 - Number.EPSILON });
  requiredNumber(degreesOfFreedom, 'degreesOfFreedom', { above: 0 });
  return student.quantile(probability, degreesOfFreedom);
}

/**
 * The same for chi-square. Example: 0.025 with 62 degrees of freedom is 42.13, twice the lower end for 31.
 */
export function standChiSquareQuantile(probability: number, degreesOfFreedom: number): number {
  requiredNumber(probability, 'probability', { above: 0, atMost: 1 - Number.EPSILON });
  requiredNumber(degreesOfFreedom, 'degreesOfFreedom', { above: 0 });
  return chisquare.quantile(probability, degreesOfFreedom);
}
