import { LAYOUT_BLOCKS_MAX, LAYOUT_SETTINGS_MAX } from '../layout';
import { requiredCount } from '../required-count';
import { requiredNumber } from '../required-number';
import { criticalF, type PlannedTest } from './critical-f';
import { nonCentralUpperTailF } from './non-central-f';

export type PlannedTrial = {
  /** 2 to 24. */
  settings: number;
  /** 2 to 40 complete blocks. */
  blocks: number;
  test: PlannedTest;
  /** Standard deviation of strips within blocks, in the figure's unit, from earlier trials. */
  stripSd: number;
};

/**
 * How likely is the trial to show a difference of this size?
 *
 * Takes the planned layout and test, the strips' standard deviation (above 0) and the true difference between two settings
 * (0 or more), in the figure's unit. Returns a share, 0 to 1. Never insufficient; throws ImpossibleInput outside
 * those limits or for counts that are not whole.
 * Equation: P(F′ > critical F), F′ non-central with λ = blocks × difference² / (2 SD²): for `tukey` and `holm` on 1 and
 * (blocks − 1)(settings − 1) degrees of freedom (the two-sided non-central t of that pair, for two settings the
 * paired t); for `any-difference` on settings − 1, the other settings halfway between the two, where F finds least.
 * What it does not tell: whether the strips of this field vary as those of the earlier trials did. With `holm` it is at least this, because
 * only the dearest step is asked.
 * Example: two settings, 4 blocks, SD 0.35 days: a difference of 1 day is shown in 76 % of trials.
 */
export function trialPower(trial: PlannedTrial, difference: number): number {
  const { settings, blocks, test } = requiredTrial(trial);
  requiredNumber(difference, 'difference', { atLeast: 0 });
  const errorDf = (blocks - 1) * (settings - 1);
  const nonCentrality = (blocks * (difference / trial.stripSd) ** 2) / 2;
  // So far out nothing is missed, and the sum over the mixture would only grow longer.
  if (nonCentrality > 100_000) return 1;
  return nonCentralUpperTailF(
    criticalF(test, settings, errorDf),
    test === 'any-difference' ? settings - 1 : 1,
    errorDf,
    nonCentrality,
  );
}

/** Refuses a trial that cannot be, and returns it. */
export function requiredTrial(trial: PlannedTrial): PlannedTrial {
  requiredCount(trial.settings, 'settings', { atLeast: 2, atMost: LAYOUT_SETTINGS_MAX });
  requiredCount(trial.blocks, 'blocks', { atLeast: 2, atMost: LAYOUT_BLOCKS_MAX });
  requiredNumber(trial.stripSd, 'stripSd', { above: 0 });
  return trial;
}
