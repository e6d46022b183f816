import { SQUARE_FEET_PER_ACRE, SQUARE_INCHES_PER_ACRE } from './constants';
import { requiredNumber } from './required-number';

/**
 * How many square feet does a hoop lie over?
 *
 * Takes its inner diameter in inches (above 0), returns square feet. Never insufficient; throws ImpossibleInput for a
 * diameter that is not positive. Method: π d² / 4 / 144. Example: 30 in lie over 4.909 ft².
 */
export function hoopSquareFeet(diameterInches: number): number {
  requiredNumber(diameterInches, 'diameterInches', { above: 0 });
  return (Math.PI * diameterInches ** 2 * SQUARE_FEET_PER_ACRE) / 4 / SQUARE_INCHES_PER_ACRE;
}

/**
 * How many plants per acre is one plant in a hoop?
 *
 * Takes the inner diameter in inches (above 0), returns plants per acre for every plant. Never insufficient; throws
 * ImpossibleInput for a diameter that is not positive.
 * Method: 43,560 / (π d² / 4 / 144). Purdue's field guide prints the same for 18 to 36 in, made with π = 3.14.
 * What it does not tell: a hoop bent out of round holds less than its widest measure says.
 * Example: 30 in gives 8,874; the guide prints 8,878.
 */
export function hoopFactor(diameterInches: number): number {
  return SQUARE_FEET_PER_ACRE / hoopSquareFeet(diameterInches);
}
