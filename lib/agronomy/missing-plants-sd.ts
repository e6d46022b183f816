import { insufficient, value, type Outcome } from './outcome';
import { requiredNumber } from './required-number';

/**
 * How uneven would the spacing be from missing plants alone, every seed placed perfectly?
 *
 * Takes the theoretical spacing in inches (above 0) and the share of seeds that stand as plants (0 or more;
 * above 1 counts as 1). Returns the SD in inches. Insufficient when nothing stands. Throws ImpossibleInput
 * for a spacing that is not positive or a negative share.
 * Method: own derivation. If each seed is missing by chance with share q, independent of its neighbors, the
 * number of places to the next plant is geometric and its SD is √q / (1 − q) places.
 * Plants missing in clumps (crust, water) raise the SD further, so this is the least that missing plants do.
 * Example: seeds 6.15 in apart with 96 % up give 1.28 in.
 */
export function missingPlantsSdInches(
  theoreticalSpacingInches: number,
  shareStanding: number,
): Outcome<number> {
  requiredNumber(theoreticalSpacingInches, 'theoreticalSpacingInches', { above: 0 });
  const standing = Math.min(1, requiredNumber(shareStanding, 'shareStanding', { atLeast: 0 }));
  if (standing === 0) return insufficient('nothing-up', '1 plant up', '0 plants up');
  return value((theoreticalSpacingInches * Math.sqrt(1 - standing)) / standing);
}
