import type { CurvePoint } from './emergence-curve';
import { interpolate } from './interpolate';

/**
 * How many plants had come up by a day between two visits?
 *
 * Takes a never-falling curve in order of time, and days since planting. Returns plants. Never insufficient;
 * throws ImpossibleInput for a curve without points. Method: a straight line between visits, as the
 * percentiles use it; before the first visit its own count is returned, after the last visit the last.
 * Example: 4 up on day 3 and 15 on day 4 are 9.5 on day 3.5.
 */
export function plantsUpAt(points: readonly CurvePoint[], days: number): number {
  return interpolate(
    points.map((point) => ({ at: point.days, result: point.plantsUp })),
    days,
  );
}
