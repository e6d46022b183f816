import { ImpossibleInput } from './outcome';
import { requiredNumber } from './required-number';

/**
 * How many growing degree days for corn did one day bring, in °F?
 *
 * Takes the day's highest and lowest air temperature in °F. Returns degree days, 0 to 36. Never insufficient;
 * throws ImpossibleInput for temperatures that are not finite or a high below the low.
 * Method: 86/50, (Tmax′ + Tmin′) / 2 − 50 with the high capped at 86 and both floored at 50 (Purdue, Nebraska,
 * Ohio AGF-101). Air temperature; soil in a residue-covered row is cooler.
 * Example: 80 and 55 °F are 17.5 degree days; 49 and 30 °F are 0.
 */
export function degreeDaysFahrenheit(highFahrenheit: number, lowFahrenheit: number): number {
  return cappedMean(highFahrenheit, lowFahrenheit, 50, 86);
}

/**
 * The same in °C, with 30 and 10 °C for 86 and 50 °F; multiply by 1.8 for °F degree days.
 *
 * Takes high and low in °C, returns °C degree days, 0 to 20. Throws as above.
 * Example: 30 and 10 °C are 10 degree days, 18 in °F.
 */
export function degreeDaysCelsius(highCelsius: number, lowCelsius: number): number {
  return cappedMean(highCelsius, lowCelsius, 10, 30);
}

function cappedMean(high: number, low: number, base: number, cap: number): number {
  requiredNumber(high, 'high');
  requiredNumber(low, 'low');
  if (high < low) throw new ImpossibleInput('The high is below the low.', 'high');
  // Both readings stay within base and cap: a night above the cap brings no more than the cap either.
  const within = (reading: number) => Math.min(cap, Math.max(base, reading));
  return (within(high) + within(low)) / 2 - base;
}
