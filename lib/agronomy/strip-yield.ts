import { CORN_BUSHEL_POUNDS, CORN_STANDARD_MOISTURE_PERCENT } from './corn-bushel';
import { requiredNumber } from './required-number';
import { weightAtMoisturePounds } from './weight-at-moisture';

export type WeighedStrip = { weightPounds: number; moisturePercent: number; acres: number };

/**
 * What did this strip yield at standard moisture?
 *
 * Takes the weight in pounds (0 or more), its moisture in percent of the wet weight (0 to 60), the acres (above 0), and
 * another standard than 15.5 % where one is kept. Returns bushels of 56 lb per acre. Never insufficient; throws
 * ImpossibleInput outside those limits.
 * Equation: lb / 56 / acres × (100 − moisture) / (100 − 15.5).
 * One strip has no error of its own: settings are told apart by blocks of strips. A scale that is off by one share is off
 * in every strip and leaves ratios alone, one that drifts does not.
 * Example: 10,000 lb at 20 % from one acre: 169.06 bu/ac.
 */
export function stripYieldBushelsPerAcre(
  { weightPounds, moisturePercent, acres }: WeighedStrip,
  standardMoisturePercent: number = CORN_STANDARD_MOISTURE_PERCENT,
): number {
  const standardPounds = weightAtMoisturePounds(weightPounds, moisturePercent, standardMoisturePercent);
  return standardPounds / CORN_BUSHEL_POUNDS / requiredNumber(acres, 'acres', { above: 0 });
}
