import { requiredNumber } from '../required-number';
import { chanceAbove, type EstimatedDifference } from './chance-above';
import { studentQuantile } from './student-t';

export type PartialBudget = {
  returnDollarsPerAcre: { mean: number; standardError: number; lower: number; upper: number };
  breakEvenBushelsPerAcre: number;
  /** Null where the yield does not rise, so that no price pays for the cost. */
  breakEvenPriceDollarsPerBushel: number | null;
  /** That the return is above zero, as far as this trial alone can say. */
  chanceOfGain: number;
};

/**
 * What does a change return per acre, when it changes yield and costs something?
 *
 * Takes the yield gain in bushels per acre with its standard error (above 0) and degrees of freedom (above 0), the price of
 * corn (above 0) and the added cost in dollars per acre (0 or more). Returns dollars per acre with a 95 % interval, the gain
 * and the price that pay for it, and the chance that it pays. Never insufficient; throws ImpossibleInput outside those limits.
 * Equation: return = gain × price − cost; its error is that of the gain × price; break-even gain = cost / price.
 * The price and the cost are taken as known. Example: 6.2 ± 2.4 bu on 9 degrees of freedom, $4.35 and $11.50: $15.47, from
 * −$8.15 to $39.09.
 */
export function partialBudget(
  gainBushelsPerAcre: EstimatedDifference,
  priceDollarsPerBushel: number,
  addedCostDollarsPerAcre: number,
): PartialBudget {
  const gain = requiredNumber(gainBushelsPerAcre.mean, 'mean');
  const price = requiredNumber(priceDollarsPerBushel, 'priceDollarsPerBushel', { above: 0 });
  const cost = requiredNumber(addedCostDollarsPerAcre, 'addedCostDollarsPerAcre', { atLeast: 0 });
  const chanceOfGain = chanceAbove(gainBushelsPerAcre, cost / price);
  const standardError = gainBushelsPerAcre.standardError * price;
  const reach = studentQuantile(0.975, gainBushelsPerAcre.degreesOfFreedom) * standardError;
  const mean = gain * price - cost;
  return {
    returnDollarsPerAcre: { mean, standardError, lower: mean - reach, upper: mean + reach },
    breakEvenBushelsPerAcre: cost / price,
    breakEvenPriceDollarsPerBushel: gain > 0 ? cost / gain : null,
    chanceOfGain,
  };
}
