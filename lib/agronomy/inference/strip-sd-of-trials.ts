import { insufficient, value } from '../outcome';
import type { Outcome } from '../outcome';
import { requiredNumber } from '../required-number';
import { standChiSquareQuantile } from './stand-chi-square';

export type StripSd = { stripSd: number; degreesOfFreedom: number; lower: number; upper: number };

/**
 * How far do strips vary within blocks, by earlier trials?
 *
 * Takes per trial the error mean square (0 or more, the figure's unit squared) and its degrees of freedom (above 0), as
 * blockAnalysis gives them. Returns the standard deviation of a strip with its 95 % interval, in the figure's unit.
 * Insufficient without a trial, or when none of them varied. Throws ImpossibleInput outside those limits.
 * Equation: SD = √(Σ df × mean square / Σ df); interval by χ² on Σ df, as if the trials shared one SD.
 * What it does not tell: whether this field varies alike. Few degrees of freedom leave a wide interval: plan with its
 * upper end where a missed difference is costly.
 * Example: mean squares of 162.9 and 198.0 on 20 each: SD 13.4, interval 11.0 to 17.2.
 */
export function stripSdOfTrials(
  trials: readonly { meanSquareError: number; errorDegreesOfFreedom: number }[],
): Outcome<StripSd> {
  if (trials.length === 0) return insufficient('no-earlier-trial', '1 analyzed trial', 'none');
  let squares = 0;
  let degreesOfFreedom = 0;
  for (const { meanSquareError, errorDegreesOfFreedom } of trials) {
    requiredNumber(meanSquareError, 'meanSquareError', { atLeast: 0 });
    requiredNumber(errorDegreesOfFreedom, 'errorDegreesOfFreedom', { above: 0 });
    squares += meanSquareError * errorDegreesOfFreedom;
    degreesOfFreedom += errorDegreesOfFreedom;
  }
  if (squares === 0)
    return insufficient('no-variation', 'strips that vary within a setting', 'an error of zero');
  return value({
    stripSd: Math.sqrt(squares / degreesOfFreedom),
    degreesOfFreedom,
    lower: Math.sqrt(squares / standChiSquareQuantile(0.975, degreesOfFreedom)),
    upper: Math.sqrt(squares / standChiSquareQuantile(0.025, degreesOfFreedom)),
  });
}
