import { smallestAttainableP } from '../layout';
import { insufficient, value } from '../outcome';
import type { Outcome } from '../outcome';
import { requiredNumber } from '../required-number';
import { bisected } from './bisected';
import { requiredTrial, trialPower, type PlannedTrial } from './trial-power';

/** Four trials in five show it (common practice, no source). */
export const USUAL_POWER = 0.8;

export type SmallestDifference = {
  /** In the unit of the strips' standard deviation. */
  difference: number;
  power: number;
  errorDegreesOfFreedom: number;
  /** Of the exact randomization test on this layout; above 0.05 that check cannot confirm any difference. */
  smallestAttainableP: number;
  method: 'non-central t' | 'non-central F';
};

/**
 * Which difference between two settings can this layout show in four trials out of five?
 *
 * Takes the planned trial and the wanted power (0.06 to 0.999, 0.8 unless given). Returns the smallest true difference that is
 * shown with that power, in the figure's unit. Insufficient for one block, which shows no error. Throws
 * ImpossibleInput as trialPower does.
 * Method: trialPower solved for the difference by halving; non-central t for a pair, non-central F for any difference.
 * What it does not tell: that a smaller difference is absent, or that one of this size is worth money.
 * Example: two settings in 4 blocks, strips' SD 0.35 days: 1.05 days.
 */
export function smallestDifference(trial: PlannedTrial, power = USUAL_POWER): Outcome<SmallestDifference> {
  if (trial.blocks === 1) return insufficient('one-block', '2 blocks', '1 block');
  const { settings, blocks, test, stripSd } = requiredTrial(trial);
  requiredNumber(power, 'power', { atLeast: 0.06, atMost: 0.999 });
  const inStripSds = { ...trial, stripSd: 1 };
  return value({
    difference: stripSd * bisected((difference) => trialPower(inStripSds, difference) >= power, 1e-6, 1),
    power,
    errorDegreesOfFreedom: (blocks - 1) * (settings - 1),
    smallestAttainableP: smallestAttainableP(settings, blocks),
    method: test === 'any-difference' ? 'non-central F' : 'non-central t',
  });
}
