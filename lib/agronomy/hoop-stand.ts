import { SQUARE_FEET_PER_ACRE } from './constants';
import { hoopSquareFeet } from './hoop-factor';
import { insufficient, value, type Outcome } from './outcome';
import { requiredNumber } from './required-number';

export type HoopStand = {
  plantsPerAcre: number;
  plantsPerSquareFoot: number;
  /** Every throw with its plants and area, as standInterval takes places. */
  throws: { plantsHeld: number; areaAcres: number }[];
};

/**
 * What stand do the plants counted in a hoop make?
 *
 * Takes the plants of every throw (0 or more; halves for doubtful ones) and the inner diameter in inches (above 0).
 * Returns plants per acre and per square foot over all throws, and the throws as places for an interval. Insufficient
 * without a throw. Throws ImpossibleInput for negative plants or a diameter that is not positive.
 * Method: plants / (throws × area), area = π d² / 4.
 * For drilled crops; in wide rows a hoop takes in one row or two by chance. A throw that is aimed is not a sample, and
 * one throw says nothing about the rest of the field.
 * Example: 36 plants in a 30-in hoop are 7.33 per square foot, 319,500 per acre.
 */
export function hoopStand(plants: readonly number[], diameterInches: number): Outcome<HoopStand> {
  const squareFeet = hoopSquareFeet(diameterInches);
  const sum = plants.reduce((total, each) => total + requiredNumber(each, 'plants', { atLeast: 0 }), 0);
  if (plants.length === 0) return insufficient('no-throws', '1 throw of the hoop', 'none');
  const plantsPerSquareFoot = sum / (plants.length * squareFeet);
  const areaAcres = squareFeet / SQUARE_FEET_PER_ACRE;
  return value({
    plantsPerAcre: plantsPerSquareFoot * SQUARE_FEET_PER_ACRE,
    plantsPerSquareFoot,
    throws: plants.map((plantsHeld) => ({ plantsHeld, areaAcres })),
  });
}
