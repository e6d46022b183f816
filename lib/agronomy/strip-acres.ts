import { INCHES_PER_FOOT, SQUARE_FEET_PER_ACRE } from './constants';
import { requiredCount } from './required-count';
import { requiredNumber } from './required-number';

export type HarvestedStrip = { lengthFeet: number; rowsHarvested: number; rowSpacingInches: number };

/**
 * How many acres were harvested from this strip?
 *
 * Takes the length in feet (above 0), whole rows (1 or more) and the row spacing in inches (above 0). Returns acres.
 * Never insufficient; throws ImpossibleInput outside those limits.
 * Equation: length × rows × spacing / 43,560, all in feet. The rows are those that were cut, not those of the planter;
 * turned headlands and a half row at the edge are for the caller to leave out.
 * Example: 600 ft of 8 rows at 30 in: 0.2755 acres.
 */
export function stripAcres({ lengthFeet, rowsHarvested, rowSpacingInches }: HarvestedStrip): number {
  const length = requiredNumber(lengthFeet, 'lengthFeet', { above: 0 });
  const rows = requiredCount(rowsHarvested, 'rowsHarvested', { atLeast: 1 });
  const spacing = requiredNumber(rowSpacingInches, 'rowSpacingInches', { above: 0 });
  return (length * rows * spacing) / INCHES_PER_FOOT / SQUARE_FEET_PER_ACRE;
}
