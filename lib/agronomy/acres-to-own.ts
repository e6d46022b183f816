import { requiredNumber } from './required-number';

/** `none`: upkeep alone costs as much as hiring, so that no number of acres pays. */
export type AcresToOwn = { kind: 'acres'; acresPerYear: number } | { kind: 'none' };

/**
 * From how many acres a year does owning cost no more than this much per acre?
 *
 * Takes the yearly cost of owning without upkeep in dollars (0 or more), upkeep in dollars per acre (0 or more), and the
 * dollars per acre held against it, such as the price of having it done (above 0). Returns acres a year, or that none pay.
 * Never insufficient; throws ImpossibleInput outside those limits. Equation: yearly cost / (price − upkeep).
 * It leaves out who has the machine on the day it is needed. Example: $2,092.63 a year and $0.85 against $3.00: 973 acres.
 */
export function acresToOwn(
  dollarsPerYear: number,
  upkeepDollarsPerAcre: number,
  againstDollarsPerAcre: number,
): AcresToOwn {
  const yearly = requiredNumber(dollarsPerYear, 'dollarsPerYear', { atLeast: 0 });
  const upkeep = requiredNumber(upkeepDollarsPerAcre, 'upkeepDollarsPerAcre', { atLeast: 0 });
  const against = requiredNumber(againstDollarsPerAcre, 'againstDollarsPerAcre', { above: 0 });
  return against > upkeep ? { kind: 'acres', acresPerYear: yearly / (against - upkeep) } : { kind: 'none' };
}
