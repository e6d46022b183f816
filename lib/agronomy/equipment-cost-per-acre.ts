import { requiredNumber } from './required-number';

/**
 * What does a piece of equipment cost on each acre it works in a year?
 *
 * Takes the whole cost in dollars (0 or more) and the acres of one year (above 0). Returns dollars per acre. Never
 * insufficient; throws ImpossibleInput outside those limits. Equation: cost / acres.
 * It charges the whole cost to one year, as simple payback does; the cost of each year of its life is
 * `annualEquipmentCost`. Example: $6,900 on 620 acres: $11.13.
 */
export function equipmentCostPerAcre(costDollars: number, acresPerYear: number): number {
  const cost = requiredNumber(costDollars, 'costDollars', { atLeast: 0 });
  return cost / requiredNumber(acresPerYear, 'acresPerYear', { above: 0 });
}
