import { countingEnded } from './counting-ended';
import { emergenceCurve, lossesByVisit, type CurvePoint, type EmergenceCurve } from './emergence-curve';
import { mergedVisits, type VisitCount } from './merged-visits';
import { insufficient, value, type Outcome } from './outcome';
import { plantsUpAt } from './plants-up-at';

/** Visits to the rows of a strip within four hours of each other are one round (common practice, no source). */
const ROUND_DAYS = 4 / 24;

/**
 * How did the plants of several row samples come up, taken as one?
 *
 * Takes the counts of each row sample (of one strip, or of a planting without strips), each in order of time.
 * Row samples without a count are passed over. Returns one curve, fitted once. Insufficient when no row
 * sample has a count or nothing came up. Throws ImpossibleInput as emergenceCurve does.
 *
 * Method. Same rounds (as many visits in each row, the k-th ones within four hours): counts are added visit
 * by visit at their mean time, and the sum is fitted once. Own rounds: each row's own curve is read, by a
 * straight line between its visits, at the days of all rows and the readings are added. A row counts
 * nothing before its own first visit if that found nothing, and keeps its last count after its last visit. A
 * row whose first visit found plants has no earlier reading, so the added curve begins no earlier than that
 * visit. Where no count falls, both ways give the same answer for equal calendars. Own definition.
 *
 * The pooled spread is wider than the mean of the rows' own spreads when rows differ (rows 0.8 d apart: 3.6
 * against 3.2 days). Example: 10 20 and 12 24 on the same days give 22 44.
 */
export function poolEmergence(rows: readonly (readonly VisitCount[])[]): Outcome<EmergenceCurve> {
  const counted = rows.filter((counts) => counts.length > 0);
  const only = counted[0];
  if (!only) return insufficient('no-counts', '1 count', 'no count');
  if (counted.length === 1) return emergenceCurve(only);
  const calendars = counted.map(mergedVisits);
  const rounds = sameRounds(calendars);
  const points = rounds ? null : pooledByReading(counted);
  const curve = rounds ? emergenceCurve(rounds) : null;
  if (curve?.kind === 'insufficient') return curve;
  const pooledPoints = curve ? curve.value.points : (points ?? []);
  const plantsEmerged = pooledPoints[pooledPoints.length - 1]?.plantsUp ?? 0;
  if (plantsEmerged <= 0) {
    return insufficient('nothing-up', '1 plant up', `0 plants up in ${counted.length} row samples`);
  }
  return value({
    points: pooledPoints,
    plantsEmerged,
    plantsLost: counted.flatMap(lossesByVisit).reduce((sum, lost) => sum + lost, 0),
    countingEnded: counted.every(countingEnded),
    calendar: rounds ? 'same-rounds' : 'own-rounds',
    rowSampleCount: counted.length,
  });
}

function sameRounds(calendars: readonly VisitCount[][]): VisitCount[] | null {
  const visits = calendars[0]?.length ?? 0;
  if (calendars.some((calendar) => calendar.length !== visits)) return null;
  const rounds: VisitCount[] = [];
  for (let visit = 0; visit < visits; visit += 1) {
    const round = calendars.map((calendar) => calendar[visit] as VisitCount);
    const days = round.map((count) => count.days);
    if (Math.max(...days) - Math.min(...days) > ROUND_DAYS) return null;
    rounds.push({
      days: days.reduce((sum, day) => sum + day, 0) / days.length,
      plantsUp: round.reduce((sum, count) => sum + count.plantsUp, 0),
    });
  }
  return rounds;
}

function pooledByReading(rows: readonly (readonly VisitCount[])[]): CurvePoint[] {
  const curves = rows
    .map(emergenceCurve)
    .flatMap((curve) => (curve.kind === 'value' ? [curve.value.points] : []));
  const firstDayWithReadings = Math.max(
    0,
    ...curves.flatMap((points) => (points[0] && points[0].plantsUp > 0 ? [points[0].days] : [])),
  );
  const days = [...new Set(rows.flatMap((counts) => counts.map((count) => count.days)))]
    .filter((day) => day >= firstDayWithReadings)
    .sort((left, right) => left - right);
  return days.map((day) => ({
    days: day,
    plantsUp: curves.reduce((sum, points) => sum + plantsUpAt(points, day), 0),
  }));
}
