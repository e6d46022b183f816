import { ImpossibleInput } from './outcome';
import { requiredNumber } from './required-number';

/** What stood in a row sample at one visit: days since planting, all plants up so far. */
export type VisitCount = { days: number; plantsUp: number };

/** The same with the counts made at the very same moment taken together. */
export type MergedVisit = VisitCount & { counts: number };

/**
 * What stood at each moment, when two people may have counted at the same one?
 *
 * Takes counts with days that never fall (0 or more) and plants up so far (0 or more). Returns one visit a
 * moment, with the mean of the counts made then and how many they were. Never insufficient; throws
 * ImpossibleInput for negative counts and for days out of order.
 * Method: arithmetic mean of counts at equal days (common practice, no source). It hides that two people
 * differ: where that matters, show both counts.
 * Example: 20 and 22 plants on day 9 are 21 plants, 2 counts.
 */
export function mergedVisits(counts: readonly VisitCount[]): MergedVisit[] {
  const merged: MergedVisit[] = [];
  for (const { days, plantsUp } of counts) {
    requiredNumber(days, 'days', { atLeast: 0 });
    requiredNumber(plantsUp, 'plantsUp', { atLeast: 0 });
    const before = merged[merged.length - 1];
    if (before && days < before.days) throw new ImpossibleInput('Visits must be in order of time.', 'days');
    if (before && days === before.days) {
      const counted = before.counts + 1;
      const plants = (before.plantsUp * before.counts + plantsUp) / counted;
      merged[merged.length - 1] = { days, plantsUp: plants, counts: counted };
    } else {
      merged.push({ days, plantsUp, counts: 1 });
    }
  }
  return merged;
}
