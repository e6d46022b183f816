import { NORMAL_QUANTILE_975, SAME_NUMBER } from './constants';
import { insufficient, value, type Outcome } from './outcome';
import { requiredNumber } from './required-number';
import { spokenNumber } from './spoken-number';

export type ShareOfSeed = { share: number; plants: number; seeds: number; interval: Outcome<ShareInterval> };
export type ShareInterval = {
  shareLower: number;
  shareUpper: number;
  level: 0.95;
  method: 'binomial-wilson';
};

/**
 * What share of the seeds in a length stand as plants, and how sure is one count of that?
 *
 * Takes plants (0 or more, halves allowed) and the seeds in the same length (above 0, need not be whole).
 * Returns the share, 1 being all; it is not cut off at 1, since doubles can put more plants than seeds into a
 * length. The 95 % interval is insufficient when there are more plants than seeds: no share of seeds
 * explains that. Throws ImpossibleInput for negative plants or seeds that are not above 0.
 * Method: Wilson's score interval for a binomial share (Wilson 1927).
 * The interval is of the counting in this length alone and treats seeds as independent; neighbors share
 * crust, depth and residue, so the field is less certain than this says.
 * Example: 31 of 34 is 91.2 %, 77.1 to 97.0 %, that is 26 to 33 plants.
 */
export function shareOfSeed(plants: number, seeds: number): ShareOfSeed {
  requiredNumber(plants, 'plants', { atLeast: 0 });
  requiredNumber(seeds, 'seeds', { above: 0 });
  return { share: plants / seeds, plants, seeds, interval: wilsonInterval(plants, seeds) };
}

/**
 * Between which shares does the true one lie, when so many of so many were seen?
 *
 * Takes hits (0 or more) and trials (above 0). Returns the 95 % interval as shares of 1; insufficient when
 * hits exceed trials; throws ImpossibleInput for a negative number of hits or no trials.
 * Method: Wilson's score interval without continuity correction. Same limits as above.
 * Example: 28 of 34 gives 0.665 to 0.917.
 */
export function wilsonInterval(hits: number, trials: number): Outcome<ShareInterval> {
  requiredNumber(hits, 'hits', { atLeast: 0 });
  requiredNumber(trials, 'trials', { above: 0 });
  // Seeds come from rate × area, where decimals make 33.99999999999999 of 34: a full stand is no excess.
  if (hits > trials + SAME_NUMBER) {
    return insufficient(
      'more-plants-than-seeds',
      `at most ${spokenNumber(trials)} plants, one a seed`,
      `${spokenNumber(hits)} plants`,
    );
  }
  const share = Math.min(1, hits / trials);
  const square = NORMAL_QUANTILE_975 ** 2;
  const center = share + square / (2 * trials);
  const reach =
    NORMAL_QUANTILE_975 * Math.sqrt((share * (1 - share)) / trials + square / (4 * trials * trials));
  const scale = 1 + square / trials;
  return value({
    shareLower: hits === 0 ? 0 : Math.max(0, (center - reach) / scale),
    shareUpper: hits >= trials - SAME_NUMBER ? 1 : Math.min(1, (center + reach) / scale),
    level: 0.95,
    method: 'binomial-wilson',
  });
}
