import { ACRES_PER_HECTARE, SQUARE_INCHES_PER_ACRE } from './constants';
import { requiredNumber } from './required-number';

export type MeasuredRow = {
  /** Plants the length holds, ends and doubtful plants already settled. */
  plantsHeld: number;
  lengthInches: number;
  rowSpacingInches: number;
  /** Rows counted over the same length, 1 unless given. */
  rowsCounted?: number;
};

/**
 * What part of an acre does a measured piece of row stand for?
 *
 * Takes a length and a row spacing in inches (both above 0) and the rows counted (1 unless given); returns
 * acres. Never insufficient; throws ImpossibleInput for a length or spacing that is not positive.
 * Method: length × row spacing × rows / 6,272,640. Example: 209.088 in of a 30-inch row is 0.001 acre.
 */
export function rowAreaAcres(lengthInches: number, rowSpacingInches: number, rowsCounted = 1): number {
  requiredNumber(lengthInches, 'lengthInches', { above: 0 });
  requiredNumber(rowSpacingInches, 'rowSpacingInches', { above: 0 });
  requiredNumber(rowsCounted, 'rowsCounted', { above: 0 });
  return (lengthInches * rowSpacingInches * rowsCounted) / SQUARE_INCHES_PER_ACRE;
}

/**
 * How many plants per acre stand in one measured piece of row?
 *
 * Takes the plants the length holds (0 or more), length and row spacing in inches (above 0) and the rows
 * counted. Returns plants per acre, not rounded. Never insufficient; throws ImpossibleInput for negative
 * plants or a length or spacing that is not positive.
 * Method: plants × 43,560 / (row length ft × row spacing ft × rows counted), the formula of every extension
 * service. Always from the length measured, never from the 1/1000 acre it was meant to be.
 * One row sample says nothing about the rest of the field.
 * Example: 10 plants held in 68 in of a 30-inch row are 30,748 per acre.
 */
export function plantsPerAcre(row: MeasuredRow): number {
  requiredNumber(row.plantsHeld, 'plantsHeld', { atLeast: 0 });
  return row.plantsHeld / rowAreaAcres(row.lengthInches, row.rowSpacingInches, row.rowsCounted);
}

/**
 * The same per hectare.
 *
 * Takes plants per acre (0 or more), returns plants per hectare. Never insufficient; throws ImpossibleInput
 * for a negative stand. Method: international foot. Example: 31,000 per acre are 76,602.67 per hectare.
 */
export function plantsPerHectare(plantsEachAcre: number): number {
  return requiredNumber(plantsEachAcre, 'plantsPerAcre', { atLeast: 0 }) * ACRES_PER_HECTARE;
}
