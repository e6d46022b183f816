import { countingEnded } from './counting-ended';
import { isotonicFit } from './isotonic-fit';
import { mergedVisits, type VisitCount } from './merged-visits';
import { insufficient, value, type Outcome } from './outcome';

export type CurvePoint = { days: number; plantsUp: number };

export type EmergenceCurve = {
  /** Plants that had come up by each visit, never falling. */
  points: CurvePoint[];
  /** The last point: all that emerged so far. */
  plantsEmerged: number;
  /** Plants that stood at one visit and no longer at the next, summed over visits. */
  plantsLost: number;
  /** Two visits with nothing new in every row sample of the curve. */
  countingEnded: boolean;
  /** One row sample, several visited in the same rounds, or several with rounds of their own. */
  calendar: 'one-row-sample' | 'same-rounds' | 'own-rounds';
  rowSampleCount: number;
};

/**
 * How did the plants of one row sample come up, visit by visit?
 *
 * Takes counts in order of time: days since planting (0 or more, parts of days welcome) and all plants up so
 * far, doubtful ones included, for a doubtful plant has come up. Returns the never-falling cumulative curve.
 * Insufficient without a count, or when no plant had come up at any visit. Throws ImpossibleInput for
 * negative counts and visits out of order.
 * Method: pooled adjacent violators on the counts; emergence is not un-happened, so a fall is smoothed here
 * and kept as its own number, `plantsLost`.
 * A count says only that a plant came up since the last visit, and losses hide plants that came and went
 * between two visits.
 * Example: 2 9 17 16 24 23 27 26 on days 5 to 12 becomes 2 9 16.5 16.5 23.5 23.5 26.5 26.5, 3 lost.
 */
export function emergenceCurve(counts: readonly VisitCount[]): Outcome<EmergenceCurve> {
  const visits = mergedVisits(counts);
  if (visits.length === 0) return insufficient('no-counts', '1 count', 'no count');
  const fitted = isotonicFit(
    visits.map((visit) => visit.plantsUp),
    visits.map((visit) => visit.counts),
  );
  const points = visits.map((visit, index) => ({ days: visit.days, plantsUp: fitted[index] as number }));
  const plantsEmerged = points[points.length - 1]?.plantsUp ?? 0;
  if (plantsEmerged <= 0) {
    return insufficient('nothing-up', '1 plant up', `0 plants up at ${visits.length} visits`);
  }
  const plantsLost = lossesByVisit(counts).reduce((sum, lost) => sum + lost, 0);
  return value({
    points,
    plantsEmerged,
    plantsLost,
    countingEnded: countingEnded(counts),
    calendar: 'one-row-sample',
    rowSampleCount: 1,
  });
}

/**
 * How many plants were gone at each visit, against the visit before?
 *
 * Takes counts in order of time, returns one number for each visit after the first (0 where none fell).
 * Never insufficient; throws ImpossibleInput as mergedVisits does. Method: the fall of the count.
 * New plants at the same visit hide losses. Example: 2 9 17 16 24 gives 0 0 1 0.
 */
export function lossesByVisit(counts: readonly VisitCount[]): number[] {
  const visits = mergedVisits(counts);
  return visits.slice(1).map((visit, index) => {
    const before = visits[index];
    return before ? Math.max(0, before.plantsUp - visit.plantsUp) : 0;
  });
}
