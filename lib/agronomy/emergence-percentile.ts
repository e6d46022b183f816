import { SAME_NUMBER } from './constants';
import type { EmergenceCurve } from './emergence-curve';
import { insufficient, value, type Outcome } from './outcome';
import { requiredNumber } from './required-number';

export type EmergenceDays = {
  days: number;
  /** `at-latest`: the plants were up at the first visit, so this is that visit's day and no later. */
  bound: 'exact' | 'at-latest';
  /** The two visits between which it fell; null before the first visit. */
  afterDays: number | null;
  byDays: number;
};

/**
 * On which day was a given share of the emerged stand up?
 *
 * Takes a fitted curve and a share above 0 and at most 1. Returns days since planting, with the visits
 * around it. Insufficient only where the curve has no plants. Throws ImpossibleInput for a share out of range.
 *
 * Method: Farooq et al. 2005, J. Integr. Plant Biol. 47:187, t_i + (pN − c_i)(t_j − t_i)/(c_j − c_i), N being
 * the plants emerged. A cumulative count equal to pN is that count's day. When the first visit already found
 * that many, nothing is interpolated from planting day: the answer is "by that day at the latest".
 *
 * It is a day of the plants that came up, not of the seeds sown; until counting has ended it is of the
 * plants up so far and moves later. Between visits it assumes plants came up evenly in time.
 * Example: 0 2 4 15 25 38 45 50 50 50 on days 1 to 10: half were up on day 5, a tenth on day 3.09.
 */
export function emergencePercentile(curve: EmergenceCurve, share: number): Outcome<EmergenceDays> {
  requiredNumber(share, 'share', { above: 0, atMost: 1 });
  const target = share * curve.plantsEmerged;
  const tolerance = SAME_NUMBER * Math.max(1, curve.plantsEmerged);
  const index = curve.points.findIndex((point) => point.plantsUp >= target - tolerance);
  const reached = curve.points[index];
  if (!reached || curve.plantsEmerged <= 0) return insufficient('nothing-up', '1 plant up', '0 plants up');
  const before = curve.points[index - 1];
  if (!before) {
    return value({ days: reached.days, bound: 'at-latest', afterDays: null, byDays: reached.days });
  }
  const around = { afterDays: before.days, byDays: reached.days };
  // Kept apart from the line below, whose division could leave a hair's breadth off the day of a tie.
  if (Math.abs(reached.plantsUp - target) <= tolerance) {
    return value({ days: reached.days, bound: 'exact', ...around });
  }
  const part = (target - before.plantsUp) / (reached.plantsUp - before.plantsUp);
  return value({ days: before.days + part * (reached.days - before.days), bound: 'exact', ...around });
}
