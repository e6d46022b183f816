import { mapOutcome, insufficient, type Outcome } from '../outcome';
import { requiredNumber } from '../required-number';
import { meanInterval, type MeanInterval } from './mean-interval';

/** Grain of one late plant and the mean of its on-time neighbors, weighed at one moisture, pounds a plant. */
export type WeighedPair = { latePounds: number; neighborPounds: number };

export type LatePlantsWeighed = {
  pairs: number;
  /** Late less neighbor, pounds a plant: below zero where late plants made less. */
  differencePounds: MeanInterval;
  latePoundsMean: number;
  neighborPoundsMean: number;
  /** Late plants' grain as a share of their neighbors', 0 for barren ones. */
  lateShareOfNeighbor: number;
};

/**
 * What does a late plant make against its neighbors, weighed?
 *
 * Takes pairs, each the grain of one late plant and the mean grain of the on-time plants beside it, in pounds (0 or more)
 * at one moisture; a barren plant is 0. Returns the mean difference with its 95 % t interval and the share. Insufficient
 * with fewer than two pairs, with pairs that all differ by the same, and where no neighbor made grain. Throws
 * ImpossibleInput for negative or infinite weights.
 * Method: paired differences, the pair as the unit; mean ± t(n − 1) SD / √n.
 * Neighbors of a late plant take some of what it leaves, so the difference overstates what the late plant costs the row;
 * late plants gave no less than no plants in Nafziger, Carter and Graham 1991. Pairs of one strip speak for that strip.
 * Example: 0.20 and 0.30 against 0.40 and 0.40 lb: 0.15 lb less.
 */
export function latePlantsWeighed(pairs: readonly WeighedPair[]): Outcome<LatePlantsWeighed> {
  pairs.forEach((pair, index) => {
    requiredNumber(pair.latePounds, `${index}.latePounds`, { atLeast: 0 });
    requiredNumber(pair.neighborPounds, `${index}.neighborPounds`, { atLeast: 0 });
  });
  const latePounds = pairs.reduce((sum, pair) => sum + pair.latePounds, 0);
  const neighborPounds = pairs.reduce((sum, pair) => sum + pair.neighborPounds, 0);
  if (pairs.length >= 2 && neighborPounds === 0) {
    return insufficient('no-grain-beside', 'neighbors that made grain', 'none');
  }
  const differences = pairs.map((pair) => pair.latePounds - pair.neighborPounds);
  return mapOutcome(meanInterval(differences, 'pairs'), (differencePounds) => ({
    pairs: pairs.length,
    differencePounds,
    latePoundsMean: latePounds / pairs.length,
    neighborPoundsMean: neighborPounds / pairs.length,
    lateShareOfNeighbor: latePounds / neighborPounds,
  }));
}
