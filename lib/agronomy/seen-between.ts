import { emergenceCurve } from './emergence-curve';
import type { VisitCount } from './merged-visits';
import { ImpossibleInput, mapOutcome, type Outcome } from './outcome';
import { requiredNumber } from './required-number';
import type { SeenBetween } from './turnbull';

/**
 * Between which visits did how many plants come up?
 *
 * Takes the counts of one row sample in order of time (days since planting above 0, plants so far), and its seeds (above 0)
 * or null. Returns one interval for each visit that found something new, and, with seeds, those not seen by the last visit.
 * Insufficient as emergenceCurve. Throws ImpossibleInput for a visit at planting that found plants and for counts that
 * cannot be.
 * Method: increments of the never-falling curve; the first interval begins at planting, so plants found by a first visit
 * are left-censored there and not placed. With more plants than seeds none is left.
 * Example: 3 12 23 27 29 on days 5 6 8 9 12 of 34 seeds: 3 by day 5, 9 by 6, 11 by 8, 4 by 9, 2 by 12, 5 not seen.
 */
export function seenBetween(counts: readonly VisitCount[], seeds: number | null): Outcome<SeenBetween[]> {
  if (seeds !== null) requiredNumber(seeds, 'seeds', { above: 0 });
  return mapOutcome(emergenceCurve(counts), ({ points, plantsEmerged }) => {
    const seen = points.flatMap(({ days, plantsUp }, index): SeenBetween[] => {
      const before = points[index - 1];
      const plants = plantsUp - (before?.plantsUp ?? 0);
      if (plants <= 0) return [];
      if (days === 0) throw new ImpossibleInput('No plant is up on the moment it is planted.', 'days');
      return [{ afterDays: before?.days ?? 0, byDays: days, plants }];
    });
    const left = seeds === null ? 0 : seeds - plantsEmerged;
    const lastDays = points[points.length - 1]?.days ?? 0;
    return left > 0 ? [...seen, { afterDays: lastDays, byDays: null, plants: left }] : seen;
  });
}
