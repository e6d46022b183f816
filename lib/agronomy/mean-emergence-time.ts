import { SAME_NUMBER } from './constants';
import type { EmergenceCurve } from './emergence-curve';
import { insufficient, value, type Outcome } from './outcome';

export type MeanEmergenceTime = {
  /** Every plant taken as up on the day it was counted. */
  byCountDays: number;
  /** Every plant taken as up halfway between the visit that missed it and the one that found it. */
  byMidIntervalDays: Outcome<number>;
  /** Of the count days, over plants less one; no measure of how sure the mean is, since plants in a row are not independent. */
  varianceDaysSquared: Outcome<number>;
  plantsEmerged: number;
};

/**
 * On which day did the average plant come up?
 *
 * Takes the never-falling curve of a row sample or strip, days since planting. Returns the mean day by count days and
 * by the middle of each interval, and the variance of the count days. Insufficient where the curve has no plants; the
 * mid-interval mean where the first visit already found plants, for nobody knows when they came; the variance below two
 * plants. Throws nothing of its own.
 * Method: M = Σ nᵢtᵢ / N and Σ nᵢ(tᵢ − M)² / (N − 1), nᵢ the plants new at visit i (Orchard 1977; Ellis and Roberts 1980).
 * By count days it is late by about half the time between visits, so never compare it between plots with other rounds;
 * the mid-interval mean and the days to half up do not have that fault.
 * Example: 0 2 4 15 25 38 45 50 50 50 on days 1 to 10: 5.42 by count days, 4.92 by mid-interval, variance 2.330.
 */
export function meanEmergenceTime(curve: EmergenceCurve): Outcome<MeanEmergenceTime> {
  const total = curve.plantsEmerged;
  if (total <= 0) return insufficient('nothing-up', '1 plant up', '0 plants up');
  const newAt = curve.points.map(({ days, plantsUp }, index) => ({
    days,
    before: curve.points[index - 1]?.days ?? null,
    plants: plantsUp - (curve.points[index - 1]?.plantsUp ?? 0),
  }));
  const mean = newAt.reduce((sum, { days, plants }) => sum + plants * days, 0) / total;
  const squares = newAt.reduce((sum, { days, plants }) => sum + plants * (days - mean) ** 2, 0);
  const foundAtFirst = (newAt[0]?.plants ?? 0) > SAME_NUMBER;
  const middles = newAt.reduce((sum, { days, before, plants }) => sum + (plants * (days + (before ?? days))) / 2, 0);
  return value({
    byCountDays: mean,
    byMidIntervalDays: foundAtFirst
      ? insufficient('no-visit-before-the-first-plants', 'a visit that found nothing up', 'plants up at the first visit')
      : value(middles / total),
    varianceDaysSquared: total >= 2 ? value(squares / (total - 1)) : insufficient('too-few-plants', '2 plants up', `${total} plants up`),
    plantsEmerged: total,
  });
}
