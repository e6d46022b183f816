import { requiredNumber } from './required-number';

/**
 * How many bushels per acre pay for this cost?
 *
 * Takes a cost in dollars per acre (0 or more) and the price of corn in dollars a bushel (above 0). Returns bushels per
 * acre. Never insufficient; throws ImpossibleInput outside those limits. Equation: cost per acre / price.
 * It says what is needed, not what is to be had. Example: $11.13 at $4.10: 2.71 bu/ac.
 */
export function breakEvenBushelsPerAcre(costDollarsPerAcre: number, priceDollarsPerBushel: number): number {
  const cost = requiredNumber(costDollarsPerAcre, 'costDollarsPerAcre', { atLeast: 0 });
  return cost / requiredNumber(priceDollarsPerBushel, 'priceDollarsPerBushel', { above: 0 });
}
