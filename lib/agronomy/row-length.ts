import { INCHES_PER_FOOT, SQUARE_FEET_PER_ACRE, SQUARE_METERS_PER_HECTARE } from './constants';
import { requiredNumber } from './required-number';

/**
 * How long a piece of row holds one thousandth of an acre?
 *
 * Takes the row spacing in inches (above 0). Returns feet. Never insufficient; throws ImpossibleInput for a
 * row spacing that is not a positive number.
 * Method: 43,560 / 1000 / row spacing in feet, that is 522.72 / row spacing in inches; the lengths printed
 * by the Tennessee, Missouri, Wisconsin, Nebraska and North Dakota extension services follow it.
 * It is a suggestion for how far to unroll the tape: a stand is always figured from the length measured.
 * Example: 30 inches gives 17.424 feet, 17 ft 5 in.
 */
export function rowLengthFeet(rowSpacingInches: number): number {
  requiredNumber(rowSpacingInches, 'rowSpacingInches', { above: 0 });
  return SQUARE_FEET_PER_ACRE / 1000 / (rowSpacingInches / INCHES_PER_FOOT);
}

/**
 * The same in metric: how long a piece of row holds one thousandth of a hectare?
 *
 * Takes the row spacing in meters (above 0), returns meters. Never insufficient; throws ImpossibleInput for a
 * spacing that is not positive. Method: 10 / row spacing. A suggestion only, as above.
 * Example: 0.75 m gives 13.33 m.
 */
export function rowLengthMeters(rowSpacingMeters: number): number {
  requiredNumber(rowSpacingMeters, 'rowSpacingMeters', { above: 0 });
  return SQUARE_METERS_PER_HECTARE / 1000 / rowSpacingMeters;
}
