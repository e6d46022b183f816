import { LAYOUT_BLOCKS_MAX, smallestAttainableP } from '../layout';
import { insufficient, value } from '../outcome';
import type { Outcome } from '../outcome';
import { requiredNumber } from '../required-number';
import { spokenNumber } from '../spoken-number';
import { USUAL_POWER } from './smallest-difference';
import { trialPower, type PlannedTrial } from './trial-power';

export type BlocksNeeded = {
  blocks: number;
  strips: number;
  /** What so many blocks reach, at or a little above the power wanted. */
  power: number;
  errorDegreesOfFreedom: number;
  smallestAttainableP: number;
};

/**
 * How many blocks show a difference of this size in four trials out of five?
 *
 * Takes the number of settings, the planned test, the strips' standard deviation and the difference worth finding (both
 * above 0, same unit), and the wanted power (0.06 to 0.999, 0.8 unless given). Returns the fewest blocks, 2 to 40.
 * Insufficient when 40 blocks do not show it. Throws ImpossibleInput as trialPower does.
 * Method: trialPower, block by block.
 * What it does not tell: how far the strips' standard deviation of a few earlier trials can be off; see stripSdOfTrials.
 * Example: two settings, strips' SD 0.35 days, a difference of 0.8 days: 6 blocks.
 */
export function blocksNeeded(
  plan: Omit<PlannedTrial, 'blocks'> & { difference: number },
  wantedPower = USUAL_POWER,
): Outcome<BlocksNeeded> {
  const { settings, difference } = plan;
  requiredNumber(difference, 'difference', { above: 0 });
  requiredNumber(wantedPower, 'power', { atLeast: 0.06, atMost: 0.999 });
  let power = 0;
  for (let blocks = 2; blocks <= LAYOUT_BLOCKS_MAX; blocks += 1) {
    power = trialPower({ ...plan, blocks }, difference);
    if (power < wantedPower) continue;
    return value({
      blocks,
      strips: blocks * settings,
      power,
      errorDegreesOfFreedom: (blocks - 1) * (settings - 1),
      smallestAttainableP: smallestAttainableP(settings, blocks),
    });
  }
  return insufficient(
    'difference-too-small',
    `more than ${LAYOUT_BLOCKS_MAX} blocks`,
    `${spokenNumber(100 * power)} % of trials show it in ${LAYOUT_BLOCKS_MAX} blocks`,
  );
}
