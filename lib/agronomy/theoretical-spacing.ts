import { SQUARE_INCHES_PER_ACRE } from './constants';
import { requiredNumber } from './required-number';

/**
 * How far apart would the seeds lie if every one were dropped evenly?
 *
 * Takes seeds per acre and row spacing in inches, both above 0. Returns inches. Never insufficient; throws
 * ImpossibleInput for a rate or spacing that is not positive.
 * Method: 6,272,640 / (seeds per acre × row spacing). It comes from the seeding rate, not from the plants
 * that came up; the planter may have dropped another rate than it was set to.
 * Example: 32,000 seeds in 30-inch rows lie 6.534 in apart.
 */
export function theoreticalSpacingInches(seedsPerAcre: number, rowSpacingInches: number): number {
  requiredNumber(seedsPerAcre, 'seedsPerAcre', { above: 0 });
  requiredNumber(rowSpacingInches, 'rowSpacingInches', { above: 0 });
  return SQUARE_INCHES_PER_ACRE / (seedsPerAcre * rowSpacingInches);
}
