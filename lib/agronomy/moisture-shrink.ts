import { CORN_STANDARD_MOISTURE_PERCENT } from './corn-bushel';
import { ImpossibleInput } from './outcome';
import { requiredMoisture } from './weight-at-moisture';

/**
 * How much weight does grain lose as water when it is dried?
 *
 * Takes its moisture and the moisture it is dried to, in percent of the wet weight (0 to 60). Returns percent of the wet
 * weight. Never insufficient; throws ImpossibleInput outside those limits and for drying to a higher moisture.
 * Equation: 100 × (moisture − to) / (100 − to). It is the water alone: elevators add a handling shrink of their own.
 * Example: 25 % to 15.5 %: 11.24 % (South Dakota).
 */
export function moistureShrinkPercent(
  moisturePercent: number,
  driedToPercent: number = CORN_STANDARD_MOISTURE_PERCENT,
): number {
  const moisture = requiredMoisture(moisturePercent, 'moisturePercent');
  const driedTo = requiredMoisture(driedToPercent, 'driedToPercent');
  if (driedTo > moisture) throw new ImpossibleInput('Drying does not add water.', 'driedToPercent');
  return (100 * (moisture - driedTo)) / (100 - driedTo);
}
