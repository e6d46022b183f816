import { CORN_STANDARD_MOISTURE_PERCENT } from './corn-bushel';
import { requiredNumber } from './required-number';

/** Grain of more water than this is no grain that a combine could have weighed (from memory). */
export const GRAIN_MOISTURE_PERCENT_MOST = 60;

/**
 * What would this grain weigh at another moisture?
 *
 * Takes a weight in pounds (0 or more), its moisture and the moisture asked for, both in percent of the wet weight (0 to
 * 60). Returns pounds. Never insufficient; throws ImpossibleInput for numbers outside those limits.
 * Equation: weight × (100 − moisture) / (100 − standard); the dry matter stays the same, which is arithmetic and no study.
 * It leaves out what is lost in handling. Dividing by the weight at 15.5 % as if all of it were dry matter gives 9,240
 * where 9,467.5 is right. Example: 10,000 lb at 20 % are 9,467.5 lb at 15.5 %.
 */
export function weightAtMoisturePounds(
  weightPounds: number,
  moisturePercent: number,
  standardMoisturePercent: number = CORN_STANDARD_MOISTURE_PERCENT,
): number {
  const weight = requiredNumber(weightPounds, 'weightPounds', { atLeast: 0 });
  const moisture = requiredMoisture(moisturePercent, 'moisturePercent');
  return (
    (weight * (100 - moisture)) / (100 - requiredMoisture(standardMoisturePercent, 'standardMoisturePercent'))
  );
}

/** Whether this is a moisture that grain can have; returns it, or throws ImpossibleInput naming the field. */
export function requiredMoisture(percent: number, field: string): number {
  return requiredNumber(percent, field, { atLeast: 0, atMost: GRAIN_MOISTURE_PERCENT_MOST });
}
