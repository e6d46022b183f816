import { interpolate, isAnchor } from '../interpolate';
import { insufficient, value, type Outcome } from '../outcome';
import { requiredNumber } from '../required-number';

export type SkipMadeUp = { madeUpShare: number; basis: 'measured' | 'interpolated' };

const LOWEST = 18_000;
const HIGHEST = 30_000;

const madeUp = [
  { at: LOWEST, result: 0.47 },
  { at: HIGHEST, result: 0.19 },
];

/**
 * By Nafziger (1996): how much of a missing plant do its neighbors make up?
 *
 * Takes the stand in plants per acre (above 0). Returns a share of the missing plant's yield, 0 to 1. Insufficient below
 * 18,000 and above 30,000. Throws ImpossibleInput for a stand that is not above 0.
 * Method: J. Prod. Agric. 9:238, neighbors of a skip make up 47 % of it at 18,000 plants per acre and 19 % at 30,000; a
 * straight line between, labelled interpolated.
 * Skips and doubles act in opposite directions, so a row's SD of spacing alone says little of yield. The stand table charges
 * missing plants already: never add a skip's loss to it. Example: 24,000 plants: 33 %.
 */
export function nafziger1996SkipMadeUp(plantsPerAcre: number): Outcome<SkipMadeUp> {
  requiredNumber(plantsPerAcre, 'plantsPerAcre', { above: 0 });
  if (plantsPerAcre < LOWEST || plantsPerAcre > HIGHEST) {
    return insufficient('beyond-study', '18,000 to 30,000 plants per acre', `${Math.round(plantsPerAcre)}`);
  }
  const basis = isAnchor(madeUp, plantsPerAcre) ? 'measured' : 'interpolated';
  return value({ madeUpShare: interpolate(madeUp, plantsPerAcre), basis });
}
