import { capitalRecoveryShare } from './capital-recovery';
import { requiredNumber } from './required-number';

export type OwnedEquipment = {
  priceDollars: number;
  remainingValueDollars: number;
  years: number;
  interestShare: number;
  acresPerYear: number;
  upkeepDollarsPerAcre: number;
};

export type AnnualEquipmentCost = { dollarsPerYear: number; dollarsPerAcre: number };

/**
 * What does owning a piece of equipment cost each year, and each acre?
 *
 * Takes the price paid, what it will still be worth (0 up to the price), whole years of use, yearly interest as a share,
 * acres a year (above 0) and upkeep in dollars per acre (0 or more). Returns dollars a year without upkeep, and dollars per
 * acre with it. Never insufficient; throws ImpossibleInput outside those limits.
 * Equation: (price − remaining) × capital recovery + remaining × interest (ASABE EP496); / acres + upkeep.
 * Taxes, insurance and shelter are left out. Example: $14,500, $4,000 left after 8 years, 7.5 %, 900 acres, $0.85 upkeep:
 * $2,092.63 a year, $3.18 an acre.
 */
export function annualEquipmentCost(owned: OwnedEquipment): AnnualEquipmentCost {
  const price = requiredNumber(owned.priceDollars, 'priceDollars', { atLeast: 0 });
  const left = requiredNumber(owned.remainingValueDollars, 'remainingValueDollars', {
    atLeast: 0,
    atMost: price,
  });
  const acres = requiredNumber(owned.acresPerYear, 'acresPerYear', { above: 0 });
  const upkeep = requiredNumber(owned.upkeepDollarsPerAcre, 'upkeepDollarsPerAcre', { atLeast: 0 });
  const recovered = (price - left) * capitalRecoveryShare(owned.interestShare, owned.years);
  const dollarsPerYear = recovered + left * owned.interestShare;
  return { dollarsPerYear, dollarsPerAcre: dollarsPerYear / acres + upkeep };
}
